import * as z from 'zod';
import { chosenWire } from '@seamwright/catalogue/contracts';
import { CANDIDATE_OUTCOMES, PRICE_BASES, PRICE_LEVELS } from '@seamwright/pricing/domain';
import { gramsWire, line, minor, plantDay } from '@seamwright/shared/contracts';

/** Plain JSON pieces that contracts speaking of prices share. */
export const priceBasis = z.enum(PRICE_BASES);
export const priceLevel = z.enum(PRICE_LEVELS);

/** A price that may be charged: above zero, at most £100,000. */
export const priceTyped = z.int().positive().max(10_000_000).meta({ description: 'Whole minor units, above zero' });

/** What is chosen on one line: more choices than this no specification has. */
export const chosenValues = chosenWire.refine((chosen) => Object.keys(chosen).length <= 30, {
  message: 'At most 30 choices.',
});

/** An ordered quantity: so many pieces or cases, or about so many grams. */
export const quantityWire = z.discriminatedUnion('unit', [
  z.strictObject({ unit: z.enum(['piece', 'case']), count: z.int().positive().max(100_000) }),
  z.strictObject({
    unit: z.literal('kg'),
    grams: z.int().positive().max(100_000_000),
    notLess: z.boolean().default(false),
  }),
]);

/** What a line will weigh; `cases` is null when its pieces are not whole cases. */
export const lineWeights = z.strictObject({
  pieces: z.int().positive(),
  cases: z.int().positive().nullable(),
  minGrams: gramsWire,
  estimateGrams: gramsWire,
  maxGrams: gramsWire,
});

/** What a line will cost at least, most likely and at most. */
export const lineAmountsWire = z.strictObject({ minMinor: minor, estimateMinor: minor, maxMinor: minor });

/** A price and why it is this one; its parts add up to it. */
export const priceAnswer = z.strictObject({
  basis: priceBasis,
  priceMinor: minor,
  level: priceLevel,
  listName: line(),
  quoteNumber: z.int().nullable(),
  parts: z.array(
    z.strictObject({
      code: z.enum(['list-price', 'quantity-break', 'choices']),
      params: z.record(z.string(), z.union([z.string(), z.number()])),
      minor,
    }),
  ),
  candidates: z.array(
    z.strictObject({
      level: priceLevel,
      listName: line(),
      priceMinor: minor,
      basis: priceBasis,
      validFrom: plantDay,
      validUntil: plantDay.nullable(),
      quoteNumber: z.int().nullable(),
      outcome: z.enum(CANDIDATE_OUTCOMES),
    }),
  ),
});
export type PriceAnswerWire = z.infer<typeof priceAnswer>;
