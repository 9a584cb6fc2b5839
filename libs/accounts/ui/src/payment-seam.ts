import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import type { PaymentState } from '@seamwright/accounts/domain';
import { SeamLine, type SeamStage } from '@seamwright/shared/ui';
import { formatMoney, minorUnits, type CurrencyCode } from '@seamwright/shared/util';
import { instantWords } from './instant-words';
import { paymentStateWords } from './payment-words';

/** What the seam tells of a card payment. Amounts in minor units, instants ISO 8601. */
export interface PaymentLife {
  readonly state: PaymentState;
  readonly holdMinor: number;
  readonly capturedMinor: number;
  readonly createdAt: string;
  readonly capturedAt: string | null;
}

/** A card payment's stages: asked, held, taken; or where it ended. */
export function paymentStages(payment: PaymentLife, currency: CurrencyCode, locale: string): SeamStage[] {
  const money = (minor: number) => formatMoney(minorUnits(minor), currency, locale);
  const { state } = payment;
  const asked = (at: SeamStage['state']): SeamStage => ({
    label: $localize`:@@accounts.seam.asked:Asked`,
    note: instantWords(payment.createdAt, locale),
    state: at,
  });
  const held = (at: SeamStage['state']): SeamStage => ({
    label: $localize`:@@accounts.seam.held:Held`,
    note: money(payment.holdMinor),
    state: at,
  });
  const taken = (at: SeamStage['state'], note = ''): SeamStage => ({
    label: $localize`:@@accounts.seam.taken:Taken`,
    note,
    state: at,
  });
  const here: SeamStage = { label: paymentStateWords(state).word, state: 'now' };
  switch (state) {
    case 'started':
      return [asked('now'), held('ahead'), taken('ahead')];
    case 'needs-action':
      return [asked('passed'), here, held('ahead'), taken('ahead')];
    case 'pre-authorised':
      return [asked('passed'), held('now'), taken('ahead')];
    case 'capturing':
      return [asked('passed'), held('passed'), here];
    case 'captured': {
      const at = payment.capturedAt === null ? '' : `, ${instantWords(payment.capturedAt, locale)}`;
      return [asked('passed'), held('passed'), taken('passed', `${money(payment.capturedMinor)}${at}`)];
    }
    case 'releasing':
    case 'released':
      return [asked('passed'), held('passed'), { ...here, note: money(payment.holdMinor) }];
    case 'declined':
    case 'failed':
      return [asked('passed'), here];
  }
}

/** Where a card payment stands between being asked for and being taken. */
@Component({
  selector: 'sw-payment-seam',
  imports: [SeamLine],
  template: `<sw-seam-line [stages]="stages()" [label]="label" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PaymentSeam {
  readonly payment = input.required<PaymentLife>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly stages = computed(() => paymentStages(this.payment(), this.currency(), this.locale));
  protected readonly label = $localize`:@@accounts.seam.label:Stages of the card payment`;
}
