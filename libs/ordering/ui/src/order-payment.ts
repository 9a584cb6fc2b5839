import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import { Chip, type ChipTone } from '@seamwright/shared/ui';
import { formatMoney, minorUnits, type CurrencyCode } from '@seamwright/shared/util';

/** How the card stands for an order. Amounts are whole minor units. */
export interface ShownPayment {
  readonly state: string;
  readonly holdMinor: number;
  readonly capturedMinor: number;
  readonly declineCode: string | null;
}

interface PaymentWords {
  readonly tone: ChipTone;
  readonly word: string;
  readonly text: string;
}

/** How a card stands, in words that a buyer can act on; null stands for an order on account. */
export function paymentWords(payment: ShownPayment | null, currency: CurrencyCode, locale: string): PaymentWords {
  if (payment === null)
    return {
      tone: 'plain',
      word: $localize`:@@order.payment.account:On account`,
      text: $localize`:@@order.payment.account.text:The invoice is for the real weight.`,
    };
  const money = (minor: number) => formatMoney(minorUnits(minor), currency, locale);
  const held = money(payment.holdMinor);
  switch (payment.state) {
    case 'pre-authorised':
      return {
        tone: 'ok',
        word: $localize`:@@order.payment.held:Card held`,
        text: $localize`:@@order.payment.held.text:${held}:amount: is held on the card. The real weight is charged, the rest is let go.`,
      };
    case 'captured':
      return {
        tone: 'ok',
        word: $localize`:@@order.payment.captured:Paid by card`,
        text: $localize`:@@order.payment.captured.text:${money(payment.capturedMinor)}:amount: was charged for the real weight.`,
      };
    case 'capturing':
      return {
        tone: 'info',
        word: $localize`:@@order.payment.capturing:Being charged`,
        text: $localize`:@@order.payment.capturing.text:The order is packed, and the real weight is being charged to the card.`,
      };
    case 'releasing':
    case 'released':
      return {
        tone: 'plain',
        word: $localize`:@@order.payment.released:Hold let go`,
        text: $localize`:@@order.payment.released.text:Nothing was charged.`,
      };
    case 'declined':
      return {
        tone: 'bad',
        word: $localize`:@@order.payment.declined:Card declined`,
        text: $localize`:@@order.payment.declined.text:The bank declined to hold ${held}:amount:. Nothing was charged, and the order waits until another card is held.`,
      };
    case 'failed':
      return {
        tone: 'bad',
        word: $localize`:@@order.payment.failed:Card not held`,
        text: $localize`:@@order.payment.failed.text:The card could not be held or charged. If the order can’t be paid with another card, the desk settles it another way.`,
      };
    case 'needs-action':
      return {
        tone: 'eye',
        word: $localize`:@@order.payment.confirm:Bank asks`,
        text: $localize`:@@order.payment.confirm.text:The bank asks the card holder to confirm ${held}:amount:. The order waits for that.`,
      };
    default:
      return {
        tone: 'eye',
        word: $localize`:@@order.payment.started:Card being asked`,
        text: $localize`:@@order.payment.started.text:The bank has not answered yet. ${held}:amount: will be held; the order is confirmed once it is.`,
      };
  }
}

/** How an order is paid, in words. */
@Component({
  selector: 'sw-order-payment',
  imports: [Chip],
  template: `<sw-chip [tone]="words().tone">{{ words().word }}</sw-chip>
    <p class="sw-muted sw-small">{{ words().text }}</p>`,
  styles: `
    p {
      margin-block-start: 8px;
      max-inline-size: 60ch;
      text-wrap: pretty;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderPayment {
  readonly payment = input.required<ShownPayment | null>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly words = computed(() => paymentWords(this.payment(), this.currency(), this.locale));
}
