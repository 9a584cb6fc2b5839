import { addDays, ok, refuse, type PlantDate, type Result } from '@seamwright/shared/util';
import type { PriceBasis } from './price-candidate';
import { quoteStates, type QuoteState } from './quote.states';
import type { Validity } from './validity';

/** The days that a quote names: its prices' first and last day, and the last day for an answer. */
export interface QuoteDates {
  readonly pricesFrom: PlantDate;
  readonly pricesUntil: PlantDate;
  readonly answerBy: PlantDate;
}

/** What is quoted: one specification with its choices, at one price. */
export interface QuotedPrice {
  readonly specificationId: string;
  readonly choiceKey: string;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
}

/**
 * Checks the days against each other and today's. Refuses with `quote-prices-backwards`, `quote-answer-past` or
 * `quote-answer-after-prices`, pointing at the day.
 */
export function checkQuoteDates<T extends QuoteDates>(dates: T, today: PlantDate): Result<T> {
  if (dates.pricesUntil < dates.pricesFrom) return refuse('quote-prices-backwards', {}, '/pricesUntil');
  if (dates.answerBy < today) return refuse('quote-answer-past', {}, '/answerBy');
  if (dates.answerBy > dates.pricesUntil) return refuse('quote-answer-after-prices', {}, '/answerBy');
  return ok(dates);
}

/** Refuses with `quote-line-twice`, pointing at the line, when a specification with the same choices is quoted twice. */
export function checkQuotedPrices(lines: readonly QuotedPrice[]): Result<readonly QuotedPrice[]> {
  const seen = new Set<string>();
  for (const [at, { specificationId, choiceKey }] of lines.entries()) {
    const key = `${specificationId} ${choiceKey}`;
    if (seen.has(key)) return refuse('quote-line-twice', {}, `/lines/${at}`);
    seen.add(key);
  }
  return ok(lines);
}

/**
 * The state after the customer's answer, on a day. Refuses with `quote-expired` after the last day for an answer, also
 * before it is marked so; with `quote-answered` (state) when it was answered, with `quote-not-sent` while it is a draft.
 */
export function answerQuote(
  quote: { readonly state: QuoteState; readonly answerBy: PlantDate },
  answer: 'accept' | 'decline',
  today: PlantDate,
): Result<QuoteState> {
  if (quote.state === 'draft') return refuse('quote-not-sent');
  if (quote.state === 'accepted' || quote.state === 'declined') return refuse('quote-answered', { state: quote.state });
  if (quote.state === 'expired' || quote.answerBy < today) return refuse('quote-expired', { day: quote.answerBy });
  return quoteStates.next(quote.state, answer);
}

/** The days on which an accepted quote's prices are in force: its last day is the last one included. */
export function agreementValidity({ pricesFrom, pricesUntil }: QuoteDates): Validity {
  return { validFrom: pricesFrom, validUntil: addDays(pricesUntil, 1) };
}
