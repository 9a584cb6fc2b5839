import { ok, refuse, type Quantity, type Result } from '@seamwright/shared/util';
import { PRICE_LEVELS, type PriceBasis, type PriceCandidate, type PriceLevel } from './price-candidate';
import { choicesChange, type PricedPiece } from './priced-piece';
import { breakReached, orderedInBasis } from './quantity-breaks';
import { inForce } from './validity';

export interface PriceQuestion {
  readonly candidates: readonly PriceCandidate[];
  /** YYYY-MM-DD. */
  readonly deliveryDay: string;
  readonly choiceKey: string;
  readonly quantity: Quantity;
  readonly priceChangeMinorPerKg: number;
  readonly piece: PricedPiece;
}

/**
 * One part of a price; the parts add up to it. `list-price` is the line's own (level, list), `quantity-break` what the
 * break takes off or adds (basis, fromQuantity), `choices` what the choices change (basis, perKg).
 */
export interface PricePart {
  readonly code: 'list-price' | 'quantity-break' | 'choices';
  readonly params: Readonly<Record<string, string | number>>;
  readonly minor: number;
}

export const CANDIDATE_OUTCOMES = ['won', 'lost-to-more-specific', 'not-in-force', 'other-choices'] as const;
export type CandidateOutcome = (typeof CANDIDATE_OUTCOMES)[number];

export interface ConsideredPrice {
  readonly level: PriceLevel;
  readonly listName: string;
  readonly priceMinor: number;
  readonly basis: PriceBasis;
  readonly validFrom: string;
  readonly validUntil: string | null;
  readonly quoteNumber: number | null;
  readonly outcome: CandidateOutcome;
}

/** The price, and why it is this one: its parts, and every candidate with what became of it. */
export interface PriceAnswer {
  readonly basis: PriceBasis;
  readonly priceMinor: number;
  readonly level: PriceLevel;
  readonly listName: string;
  readonly quoteNumber: number | null;
  readonly parts: readonly PricePart[];
  readonly candidates: readonly ConsideredPrice[];
}

/**
 * The price in force: the most specific level with a line on the delivery day wins, not the cheapest; then the break
 * that the ordered quantity reaches; then the choices' change, unless the line is for these very choices. Refuses with
 * `price-on-request` when no line is in force, or when what is left would not be above zero.
 */
export function resolvePrice(question: PriceQuestion): Result<PriceAnswer> {
  const ranked = [...question.candidates].sort(bySpecificity);
  const winner = ranked.find((candidate) => whyOut(candidate, question) === null);
  if (!winner) return refuse('price-on-request');
  const parts = partsOf(winner, question);
  const priceMinor = parts.reduce((sum, part) => sum + part.minor, 0);
  if (priceMinor <= 0) return refuse('price-on-request');
  const { basis, level, listName, quoteNumber } = winner;
  const candidates = ranked.map((candidate) =>
    considered(candidate, candidate === winner ? 'won' : (whyOut(candidate, question) ?? 'lost-to-more-specific')),
  );
  return ok({ basis, priceMinor, level, listName, quoteNumber, parts, candidates });
}

/** Within a level, a line for the very choices comes before one for any, then the newer one. */
function bySpecificity(one: PriceCandidate, other: PriceCandidate): number {
  return (
    PRICE_LEVELS.indexOf(one.level) - PRICE_LEVELS.indexOf(other.level) ||
    Number(one.choiceKey === null) - Number(other.choiceKey === null) ||
    compareText(other.validFrom, one.validFrom) ||
    compareText(one.lineId, other.lineId)
  );
}

const compareText = (one: string, other: string): number => (one < other ? -1 : one > other ? 1 : 0);

function whyOut(candidate: PriceCandidate, question: PriceQuestion): 'other-choices' | 'not-in-force' | null {
  if (candidate.choiceKey !== null && candidate.choiceKey !== question.choiceKey) return 'other-choices';
  return inForce(candidate, question.deliveryDay) ? null : 'not-in-force';
}

function partsOf(line: PriceCandidate, question: PriceQuestion): PricePart[] {
  const { basis } = line;
  const parts: PricePart[] = [
    { code: 'list-price', params: { level: line.level, list: line.listName }, minor: line.priceMinor },
  ];
  const reached = breakReached(line.breaks, orderedInBasis(basis, question.quantity, question.piece));
  if (reached)
    parts.push({
      code: 'quantity-break',
      params: { basis, fromQuantity: reached.fromQuantity },
      minor: reached.priceMinor - line.priceMinor,
    });
  const perKg = question.priceChangeMinorPerKg;
  if (line.choiceKey === null && perKg !== 0)
    parts.push({ code: 'choices', params: { basis, perKg }, minor: choicesChange(basis, perKg, question.piece) });
  return parts;
}

function considered(candidate: PriceCandidate, outcome: CandidateOutcome): ConsideredPrice {
  const { level, listName, priceMinor, basis, validFrom, validUntil, quoteNumber } = candidate;
  return { level, listName, priceMinor, basis, validFrom, validUntil, quoteNumber, outcome };
}
