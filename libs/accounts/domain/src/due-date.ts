import { addDays, endOfMonth, endOfWeek, type PlantDate } from '@seamwright/shared/util';
import type { TermsFrom } from '@seamwright/identity/domain';

/** The day an invoice is due: so many days after it, after the Sunday of its week, or after the last of its month. */
export function dueDate(issuedOn: PlantDate, terms: { readonly days: number; readonly from: TermsFrom }): PlantDate {
  switch (terms.from) {
    case 'invoice':
      return addDays(issuedOn, terms.days);
    case 'end-of-week':
      return addDays(endOfWeek(issuedOn), terms.days);
    case 'end-of-month':
      return addDays(endOfMonth(issuedOn), terms.days);
  }
}
