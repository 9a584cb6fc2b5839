import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import type { PriceAnswer } from '@seamwright/pricing/domain';
import { Why } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';
import { priceWhyParts } from './price-why-parts';

/** Answers "why this price?" with its parts and with every price that was not used. */
@Component({
  selector: 'sw-price-why',
  imports: [Why],
  template: `<sw-why [heading]="heading()" [label]="label()" [parts]="parts()" [note]="note" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PriceWhy {
  readonly price = input.required<PriceAnswer>();
  readonly currency = input<CurrencyCode>('GBP');
  readonly heading = input($localize`:@@pricing.why.heading:Your price`);
  readonly label = input($localize`:@@pricing.why.label:why this price?`);

  private readonly locale = inject(LOCALE_ID);
  protected readonly parts = computed(() =>
    priceWhyParts(this.price(), { currency: this.currency(), locale: this.locale }),
  );
  protected readonly note = $localize`:@@pricing.why.note:The most specific price in force on the delivery day is used: an agreement, then the customer's list, the group's, the base list.`;
}
