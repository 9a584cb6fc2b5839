import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { ErrorState, type ProblemText } from '@seamwright/shared/ui';
import { CardPicker, type ShownCard } from './card-picker';
import { declineWords } from './payment-words';

/** What the buyer can do about the card of an order: confirm it with the bank, or pay with another one. */
@Component({
  selector: 'sw-order-card',
  imports: [CardPicker, ErrorState, MatButton],
  templateUrl: './order-card.html',
  styles: `
    :host {
      display: grid;
      gap: 16px;
      justify-items: start;
    }

    :host:empty {
      display: none;
    }

    .sw-note,
    sw-card-picker,
    sw-error {
      inline-size: 100%;
      max-inline-size: 640px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderCard {
  /** Where the bank asks the holder to confirm; empty when it does not. */
  readonly confirmAt = input('');
  /** Why the last card was declined, by the processor's code. */
  readonly declineCode = input<string | null>(null);
  /** Whether another card may be tried now. */
  readonly mayTry = input.required<boolean>();
  readonly cards = input.required<readonly ShownCard[]>();
  /** Where to come back to once a card was added: "/orders/…". */
  readonly back = input.required<string>();
  readonly busy = input(false);
  readonly problem = input<ProblemText | null>(null);
  readonly chosen = output<string>();

  protected readonly cardId = signal<string | null>(null);
  protected readonly why = computed(() => {
    const code = this.declineCode();
    return code === null ? '' : declineWords(code);
  });

  protected send(): void {
    const cardId = this.cardId();
    if (cardId !== null) this.chosen.emit(cardId);
  }
}
