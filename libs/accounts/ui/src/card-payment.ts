import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import { MoneyPipe } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';
import { instantWords } from './instant-words';
import { PaymentSeam, type PaymentLife } from './payment-seam';
import { PaymentStateChip } from './payment-state';
import { declineWords } from './payment-words';

/** All that is known of a card payment. */
export interface ShownCardPayment extends PaymentLife {
  /** Held and let go again; null while that is not decided. */
  readonly letGoMinor: number | null;
  readonly holdEndsAt: string | null;
  readonly declineCode: string | null;
  readonly actionUrl: string | null;
}

/** A card payment: its seam, what was held, taken and let go, and what its holder still has to do. */
@Component({
  selector: 'sw-card-payment',
  imports: [MoneyPipe, PaymentSeam, PaymentStateChip],
  templateUrl: './card-payment.html',
  styleUrl: './facts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CardPayment {
  readonly payment = input.required<ShownCardPayment>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly why = computed(() => {
    const { declineCode } = this.payment();
    return declineCode === null ? '' : declineWords(declineCode);
  });
  protected readonly ends = computed(() => {
    const { state, holdEndsAt } = this.payment();
    return state === 'pre-authorised' && holdEndsAt !== null ? instantWords(holdEndsAt, this.locale) : '';
  });
}
