import { inject, LOCALE_ID, Pipe, type PipeTransform } from '@angular/core';
import { formatKg, formatKgWithUnit, grams } from '@seamwright/shared/util';

/** Whole grams as kilograms with their unit, or `bare` for a column whose head names it; nothing when not known. */
@Pipe({ name: 'swKg' })
export class KgPipe implements PipeTransform {
  private readonly locale = inject(LOCALE_ID);

  transform(weight: number | null | undefined, form: 'unit' | 'bare' = 'unit'): string {
    if (weight == null) {
      return '';
    }
    return form === 'unit' ? formatKgWithUnit(grams(weight), this.locale) : formatKg(grams(weight), this.locale);
  }
}
