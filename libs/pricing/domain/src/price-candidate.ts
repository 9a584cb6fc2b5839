import type { Validity } from './validity';

/** What a price is for: a kg of real weight, a piece, or a whole case. */
export const PRICE_BASES = ['kg', 'piece', 'case'] as const;
export type PriceBasis = (typeof PRICE_BASES)[number];

/** From the most specific to the least: what was agreed with the customer, the customer's list, the group's, everybody's. */
export const PRICE_LEVELS = ['agreement', 'customer', 'group', 'base'] as const;
export type PriceLevel = (typeof PRICE_LEVELS)[number];

/** The price from an ordered quantity on, counted in the line's basis: grams, pieces or cases. */
export interface PriceBreak {
  readonly fromQuantity: number;
  readonly priceMinor: number;
}

/** A line of a price list that speaks of the specification. */
export interface PriceCandidate extends Validity {
  readonly lineId: string;
  readonly level: PriceLevel;
  readonly listName: string;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
  /** The one set of choices that the price is for, its changes included; null stands for any, its changes come on top. */
  readonly choiceKey: string | null;
  readonly breaks: readonly PriceBreak[];
  /** The accepted quote that an agreement comes from. */
  readonly quoteNumber: number | null;
}
