import type { PlantDate } from '@seamwright/shared/util';
import { workingDaysBetween } from './working-days';

export interface PayoutToMatch {
  readonly id: string;
  readonly amountMinor: number;
  readonly currency: string;
  readonly arrivalOn: string;
}

export interface BankLineToMatch {
  readonly id: string;
  readonly bookedOn: string;
  readonly amountMinor: number;
  readonly currency: string;
  readonly text: string;
  readonly reference: string | null;
}

export interface PayoutMatch {
  readonly payoutId: string;
  readonly bankLineId: string;
  readonly matchedBy: 'reference' | 'amount-and-date';
  /** Booked − sent, minor units. */
  readonly differenceMinor: number;
}

/** Working days that the bank may be apart from the day the processor named. */
export const MOST_DAYS_APART = 3;

const bare = (text: string): string => text.toUpperCase().replace(/[^0-9A-Z]/g, '');

/** Whether a bank line bears the payout's own id, in its reference or its text. */
export function bearsReference(line: Pick<BankLineToMatch, 'text' | 'reference'>, payoutId: string): boolean {
  const wanted = bare(payoutId);
  return bare(line.reference ?? '').includes(wanted) || bare(line.text).includes(wanted);
}

/** Whether a bank line names any payout of the processor. */
export const namesPayout = ({ text, reference }: Pick<BankLineToMatch, 'text' | 'reference'>): boolean =>
  /\bpo_[0-9a-z]{8,}\b/i.test(`${reference ?? ''} ${text}`);

/**
 * Pairs payouts with bank lines, each once: first by reference, whatever the amount; then by the same amount within
 * three working days, the nearest day first.
 */
export function matchPayouts(payouts: readonly PayoutToMatch[], lines: readonly BankLineToMatch[]): PayoutMatch[] {
  const free = new Map(lines.filter(({ amountMinor }) => amountMinor > 0).map((line) => [line.id, line]));
  const matches: PayoutMatch[] = [];
  const take = (payout: PayoutToMatch, line: BankLineToMatch, matchedBy: PayoutMatch['matchedBy']) => {
    free.delete(line.id);
    const differenceMinor = line.amountMinor - payout.amountMinor;
    matches.push({ payoutId: payout.id, bankLineId: line.id, matchedBy, differenceMinor });
  };
  const left = payouts.filter((payout) => {
    const named = [...free.values()].filter(
      (line) => line.currency === payout.currency && bearsReference(line, payout.id),
    );
    const line = named.find(({ amountMinor }) => amountMinor === payout.amountMinor) ?? named[0];
    if (line) take(payout, line, 'reference');
    return !line;
  });
  const apart = (payout: PayoutToMatch, line: BankLineToMatch): number =>
    workingDaysBetween(payout.arrivalOn as PlantDate, line.bookedOn as PlantDate);
  const pairs = left
    .flatMap((payout) =>
      [...free.values()]
        .filter((line) => line.amountMinor === payout.amountMinor && line.currency === payout.currency)
        .filter((line) => !namesPayout(line) && apart(payout, line) <= MOST_DAYS_APART)
        .map((line) => ({ payout, line, days: apart(payout, line) })),
    )
    .sort((a, b) => a.days - b.days);
  const done = new Set<string>();
  for (const { payout, line } of pairs) {
    if (done.has(payout.id) || !free.has(line.id)) continue;
    done.add(payout.id);
    take(payout, line, 'amount-and-date');
  }
  return matches;
}
