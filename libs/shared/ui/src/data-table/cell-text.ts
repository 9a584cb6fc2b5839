import {
  formatKg,
  formatMoney,
  formatPercent,
  formatPlantDate,
  grams,
  isPlantDate,
  minorUnits,
  ppm,
  type CurrencyCode,
} from '@seamwright/shared/util';
import type { CellValue, ColumnKind } from './table-column';

/** A value as its column writes it. Kilograms are bare: the column's head names the unit. Nothing for no value. */
export function cellText(kind: ColumnKind, value: CellValue, currency: CurrencyCode, locale: string): string {
  if (value == null) {
    return '';
  }
  if (typeof value === 'string') {
    return kind === 'date' && isPlantDate(value) ? formatPlantDate(value, 'short', locale) : value;
  }
  switch (kind) {
    case 'money':
      return formatMoney(minorUnits(value), currency, locale);
    case 'kg':
      return formatKg(grams(value), locale);
    case 'percent':
      return formatPercent(ppm(value), locale);
    default:
      return new Intl.NumberFormat(locale).format(value);
  }
}
