import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, signal, type Type } from '@angular/core';

/** Keeps the bar's place for the next delivery day: what asks for it loads after the first page, as a chunk of its own. */
@Component({
  selector: 'sw-next-delivery-slot',
  imports: [NgComponentOutlet],
  template: `<ng-container *ngComponentOutlet="content()" />`,
  styles: `
    :host {
      display: flex;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NextDeliverySlot {
  protected readonly content = signal<Type<unknown> | null>(null);

  constructor() {
    void import('@seamwright/ordering/feature-next-delivery').then((m) => this.content.set(m.NextDelivery));
  }
}
