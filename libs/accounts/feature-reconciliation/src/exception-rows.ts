import type { ExceptionWire, PayoutWire } from '@seamwright/accounts/contracts';
import { causeWords, exceptionWords, legWords } from '@seamwright/accounts/ui';
import { daysBetween, formatPlantDate, isPlantDate, type PlantDate } from '@seamwright/shared/util';

/** An exception in words. `days` since it was due, where that is known. */
export interface ExceptionRow {
  readonly id: string;
  readonly exception: ExceptionWire;
  readonly kind: ReturnType<typeof exceptionWords>;
  readonly leg: string;
  readonly what: string;
  readonly differenceMinor: number;
  readonly days: number | null;
  readonly cause: string;
}

/** Exceptions as the page lists them, by what they are about. */
export function exceptionRows(
  exceptions: readonly ExceptionWire[],
  payouts: readonly PayoutWire[],
  today: PlantDate,
  locale: string,
): ExceptionRow[] {
  return exceptions.map((exception, index) => {
    const payout = payouts.find(({ id }) => id === exception.payoutId);
    return {
      id: `${index} ${exception.leg} ${exception.kind}`,
      exception,
      kind: exceptionWords(exception.kind),
      leg: legWords(exception.leg),
      what: whatOf(exception, payout, locale),
      differenceMinor: exception.differenceMinor,
      days: payout && isPlantDate(payout.arrivalOn) ? Math.max(0, daysBetween(payout.arrivalOn, today)) : null,
      cause: causeWords(exception.cause),
    };
  });
}

function whatOf(
  { leg, orderNumber, chargeId, payoutId }: ExceptionWire,
  payout: PayoutWire | undefined,
  locale: string,
) {
  const day = (text: string): string => (isPlantDate(text) ? formatPlantDate(text, 'short', locale) : text);
  if (leg === 'charges' || leg === 'fees') {
    if (orderNumber === null) return $localize`:@@reconciliation.what.charge:Charge ${chargeId ?? ''}:charge:`;
    const order = String(orderNumber);
    return leg === 'charges'
      ? $localize`:@@reconciliation.what.payment:Card payment of order ${order}:order:`
      : $localize`:@@reconciliation.what.fee:Fee of order ${order}:order:`;
  }
  if (!payout)
    return payoutId === null
      ? $localize`:@@reconciliation.what.bankLine:A bank line that names a payout`
      : $localize`:@@reconciliation.what.payoutId:Payout ${payoutId}:payout:`;
  if (leg === 'bank' && payout.bankLine)
    return $localize`:@@reconciliation.what.both:Payout of ${day(payout.createdOn)}:sent:, bank line of ${day(payout.bankLine.bookedOn)}:booked:`;
  return $localize`:@@reconciliation.what.payout:Payout of ${day(payout.createdOn)}:sent:, due ${day(payout.arrivalOn)}:due:`;
}
