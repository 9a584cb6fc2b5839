import {
  formatKgWithUnit,
  formatMoney,
  formatPlantDate,
  grams,
  isPlantDate,
  minorUnits,
  type CurrencyCode,
} from '@seamwright/shared/util';
import type { ConsideredPrice, PriceAnswer, PriceBasis, PricePart } from '@seamwright/pricing/domain';
import type { WhyPart } from '@seamwright/shared/ui';
import { basisWord, levelWord, outcomeWord } from './price-words';

interface Writing {
  readonly currency: CurrencyCode;
  readonly locale: string;
}

/** A price as the parts of a "why?" panel: what it is made of, what it comes to, and the prices that were not used. */
export function priceWhyParts(price: PriceAnswer, { currency, locale }: Writing): WhyPart[] {
  const money = (minor: number): string => formatMoney(minorUnits(minor), currency, locale);
  const perBasis = (minor: number, basis: PriceBasis): string => `${money(minor)}/${basisWord(basis)}`;
  const [first, ...changes] = price.parts;
  const lost = price.candidates.filter(({ outcome }) => outcome !== 'won');
  return [
    ...(first ? [{ label: sourceOf(price), value: perBasis(first.minor, price.basis) }] : []),
    ...changes.map((part) => ({ label: changeOf(part, price.basis, locale), value: signed(part.minor, money) })),
    {
      label: $localize`:@@pricing.why.total:Price`,
      value: perBasis(price.priceMinor, price.basis),
      total: true,
    },
    ...lost.map((candidate) => ({
      label: sourceOf(candidate),
      value: perBasis(candidate.priceMinor, candidate.basis),
      note: lossOf(candidate, locale),
    })),
  ];
}

function sourceOf({ level, listName, quoteNumber }: Pick<PriceAnswer, 'level' | 'listName' | 'quoteNumber'>): string {
  if (level === 'agreement')
    return quoteNumber === null ? listName : $localize`:@@pricing.why.agreed:Agreed by quote ${quoteNumber}:number:`;
  return level === 'base' ? listName : `${listName} (${levelWord(level).toLowerCase()})`;
}

function changeOf({ code, params }: PricePart, basis: PriceBasis, locale: string): string {
  if (code === 'choices') return $localize`:@@pricing.why.choices:Choices`;
  const from = Number(params['fromQuantity']);
  const quantity = basis === 'kg' ? formatKgWithUnit(grams(from), locale) : `${from} × ${basisWord(basis)}`;
  return $localize`:@@pricing.why.break:Ordering ${quantity}:quantity: or more`;
}

/** Why a price was not used; one that is not in force says when it is. */
function lossOf({ outcome, validFrom, validUntil }: ConsideredPrice, locale: string): string {
  if (outcome !== 'not-in-force') return outcomeWord(outcome);
  const from = dayText(validFrom, locale);
  return validUntil === null
    ? $localize`:@@pricing.why.from:in force from ${from}:day: only`
    : $localize`:@@pricing.why.span:in force from ${from}:day: until before ${dayText(validUntil, locale)}:end:`;
}

const dayText = (day: string, locale: string): string =>
  isPlantDate(day) ? formatPlantDate(day, 'short', locale) : day;

const signed = (minor: number, money: (minor: number) => string): string =>
  `${minor < 0 ? '−' : '+'} ${money(Math.abs(minor))}`;
