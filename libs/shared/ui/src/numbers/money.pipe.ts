import { inject, LOCALE_ID, Pipe, type PipeTransform } from '@angular/core';
import { formatMoney, minorUnits, type CurrencyCode } from '@seamwright/shared/util';

/** Whole minor units as money of the document's currency; nothing for an amount that is not known. */
@Pipe({ name: 'swMoney' })
export class MoneyPipe implements PipeTransform {
  private readonly locale = inject(LOCALE_ID);

  transform(minor: number | null | undefined, currency: CurrencyCode): string {
    return minor == null ? '' : formatMoney(minorUnits(minor), currency, this.locale);
  }
}
