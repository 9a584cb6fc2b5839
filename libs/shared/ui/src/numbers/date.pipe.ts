import { inject, LOCALE_ID, Pipe, type PipeTransform } from '@angular/core';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** A day at the plant (YYYY-MM-DD) in words; nothing for a day that is not known. */
@Pipe({ name: 'swDate' })
export class DatePipe implements PipeTransform {
  private readonly locale = inject(LOCALE_ID);

  transform(date: string | null | undefined, style: 'short' | 'long' = 'short'): string {
    return date != null && isPlantDate(date) ? formatPlantDate(date, style, this.locale) : '';
  }
}
