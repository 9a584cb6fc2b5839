import * as z from 'zod';
import {
  currency,
  defineEndpoint,
  id,
  line,
  minor,
  ownCustomer,
  pageOf,
  pageQuery,
  plantDay,
  rowVersion,
} from '@seamwright/shared/contracts';
import { priceBasis, priceLevel, priceTyped } from './price-wire';

/** Searched words: empty means all. */
const searched = z.string().trim().max(80).optional();

export const priceList = z.strictObject({
  id,
  level: priceLevel,
  name: line(),
  /** The customer or group that it is for; null on the base list. */
  owner: z.string().nullable(),
  currency,
  lineCount: z.int(),
});
export type PriceList = z.infer<typeof priceList>;

const breaks = z
  .array(z.strictObject({ fromQuantity: z.int().min(2).max(100_000_000), priceMinor: priceTyped }))
  .max(10);

export const priceListLine = z.strictObject({
  id,
  rowVersion,
  specificationId: id,
  code: line(40),
  name: line(),
  choiceKey: z.string().nullable(),
  basis: priceBasis,
  priceMinor: minor,
  validFrom: plantDay,
  /** The first day on which it is not in force any more. */
  validUntil: plantDay.nullable(),
  quoteNumber: z.int().nullable(),
  breaks: z.array(z.strictObject({ fromQuantity: z.int(), priceMinor: minor })),
});
export type PriceListLine = z.infer<typeof priceListLine>;

const staff = ownCustomer('rep', 'admin');

export const listPriceLists = defineEndpoint({
  id: 'price-lists.list',
  summary: 'Price lists: base, then by group and customer',
  method: 'GET',
  path: '/price-lists',
  access: staff,
  query: { ...pageQuery, level: priceLevel.optional(), q: searched },
  response: pageOf(priceList),
});

export const getPriceList = defineEndpoint({
  id: 'price-lists.get',
  summary: 'One price list',
  method: 'GET',
  path: '/price-lists/:priceListId',
  access: staff,
  params: { priceListId: id },
  response: priceList,
});

export const listPriceLines = defineEndpoint({
  id: 'price-lists.lines',
  summary: 'The prices of a list in force on or after a day, by code',
  method: 'GET',
  path: '/price-lists/:priceListId/lines',
  access: staff,
  params: { priceListId: id },
  query: { ...pageQuery, q: searched, from: plantDay.optional() },
  response: pageOf(priceListLine),
});

/** From the day on; until the day before, the line stays as it was. */
export const setPriceLine = defineEndpoint({
  id: 'price-lists.set',
  summary: 'Sets the price and quantity breaks of a line from a day on',
  method: 'PUT',
  path: '/price-lines/:priceLineId',
  access: staff,
  params: { priceLineId: id },
  body: z.strictObject({ from: plantDay, priceMinor: priceTyped, breaks }),
  response: priceListLine,
  guarded: true,
});
