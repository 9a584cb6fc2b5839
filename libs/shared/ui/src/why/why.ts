import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  Injector,
  input,
  signal,
} from '@angular/core';
import type { WhyAnswer, WhyPart } from './why-answer';
import type { WhyPanelRef } from './why.panel';

export type { WhyPart } from './why-answer';

/**
 * Answers "why?" of a number: a button that opens its parts beside it, or from the foot of a phone's screen. The panel's
 * code is fetched with the first question.
 */
@Component({
  selector: 'sw-why',
  template: `
    <button type="button" class="ask" aria-haspopup="dialog" [attr.aria-expanded]="open()" (click)="show()">
      {{ label() }}<span class="cdk-visually-hidden"> {{ heading() }}</span>
    </button>
  `,
  styleUrl: './why.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Why {
  /** What is explained, the panel's heading: "Your price". */
  readonly heading = input.required<string>();
  readonly parts = input.required<readonly WhyPart[]>();
  /** What stands on the button. */
  readonly label = input($localize`:@@ui.why.label:why?`);
  /** A closing sentence under the parts. */
  readonly note = input('');

  protected readonly open = signal(false);

  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly answer = computed<WhyAnswer>(() => ({
    heading: this.heading(),
    parts: this.parts(),
    note: this.note(),
  }));
  private panel: WhyPanelRef | undefined;
  private gone = false;

  constructor() {
    inject(DestroyRef).onDestroy(() => {
      this.gone = true;
      this.panel?.close();
    });
  }

  protected async show(): Promise<void> {
    const { openWhyPanel } = await import('./why.panel');
    if (this.gone || this.open()) {
      return;
    }
    this.open.set(true);
    this.panel = openWhyPanel(this.injector, this.host, this.answer, () => {
      this.open.set(false);
      this.host.nativeElement.querySelector('button')?.focus();
    });
  }
}
