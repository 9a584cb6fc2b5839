import { ChangeDetectionStrategy, Component, ElementRef, inject, input, signal, viewChild } from '@angular/core';
import { FrameIcon } from '../icons/frame-icon';
import type { FrameIconName } from '../icons/frame-icon-shapes';

let made = 0;

/**
 * A button in the bar that opens a panel of links or acts below it. It closes by Escape, by a press elsewhere, when
 * focus leaves it, and when something in it was chosen.
 */
@Component({
  selector: 'sw-disclosure',
  imports: [FrameIcon],
  template: `
    <button
      #button
      type="button"
      [attr.aria-expanded]="open()"
      [attr.aria-controls]="panelId"
      [attr.aria-label]="wordless() ? label() : null"
      (click)="open.set(!open())"
    >
      <sw-icon [name]="icon()" [size]="24" />
      @if (!wordless()) {
        <span>{{ label() }}</span>
      }
    </button>
    <div #panel class="panel" [id]="panelId" [hidden]="!open()"><ng-content /></div>
  `,
  styleUrl: './disclosure.scss',
  host: {
    '(document:pointerdown)': 'closeFrom($event.target)',
    '(focusout)': 'closeFrom($event.relatedTarget)',
    '(click)': 'closeChosen($event.target)',
    '(keydown.escape)': 'closeByKey()',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Disclosure {
  readonly label = input.required<string>();
  readonly icon = input.required<FrameIconName>();
  /** Shows the icon alone; the label is still read out. */
  readonly wordless = input(false);

  protected readonly open = signal(false);
  protected readonly panelId = `sw-disclosure-${++made}`;
  private readonly panel = viewChild.required<ElementRef<HTMLElement>>('panel');
  private readonly button = viewChild.required<ElementRef<HTMLElement>>('button');
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  /** Closes when something in the panel was chosen. */
  protected closeChosen(target: EventTarget | null): void {
    if (target instanceof Node && this.panel().nativeElement.contains(target)) {
      this.open.set(false);
    }
  }

  protected closeByKey(): void {
    if (this.open()) {
      this.open.set(false);
      this.button().nativeElement.focus();
    }
  }

  /** Closes unless what was pressed or focused lies inside; focus that goes nowhere (a lost window) closes nothing. */
  protected closeFrom(target: EventTarget | null): void {
    if (target instanceof Node && !this.host.nativeElement.contains(target)) {
      this.open.set(false);
    }
  }
}
