import { inject, LOCALE_ID, Pipe, type PipeTransform } from '@angular/core';
import { formatPercent, ppm } from '@seamwright/shared/util';

/** A whole number over 1,000,000 in per cent; nothing for a rate that is not known. */
@Pipe({ name: 'swPercent' })
export class PercentPipe implements PipeTransform {
  private readonly locale = inject(LOCALE_ID);

  transform(rate: number | null | undefined, decimals?: number): string {
    return rate == null ? '' : formatPercent(ppm(rate), this.locale, decimals);
  }
}
