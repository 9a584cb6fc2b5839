import * as z from 'zod';
import { QUOTE_STATES } from '@seamwright/pricing/domain';
import {
  currency,
  defineEndpoint,
  id,
  instant,
  line,
  minor,
  note,
  ownCustomer,
  pageOf,
  pageQuery,
  plantDay,
  rowVersion,
} from '@seamwright/shared/contracts';
import { chosenValues, lineAmountsWire, lineWeights, priceBasis, priceTyped } from './price-wire';

export const quoteState = z.enum(QUOTE_STATES);

const quoteHead = {
  id,
  rowVersion,
  number: z.int(),
  customerId: id,
  customerName: line(),
  state: quoteState,
  currency,
  pricesFrom: plantDay,
  pricesUntil: plantDay,
  answerBy: plantDay,
  createdAt: instant,
  sentAt: instant.nullable(),
  decidedAt: instant.nullable(),
} as const;

export const quoteListItem = z.strictObject({ ...quoteHead, lineCount: z.int() });
export type QuoteListItem = z.infer<typeof quoteListItem>;

/** One quoted price, with what a whole case will weigh and cost at it. */
export const quoteLine = z.strictObject({
  id,
  specificationId: id,
  code: line(40),
  name: line(),
  summary: z.string(),
  chosen: chosenValues,
  choiceKey: z.string(),
  basis: priceBasis,
  priceMinor: minor,
  caseWeights: lineWeights,
  caseAmounts: lineAmountsWire,
});

export const quoteDetail = z.strictObject({
  ...quoteHead,
  notes: z.string(),
  writtenBy: z.string(),
  /** Who answered for the customer. */
  decidedBy: z.string().nullable(),
  lines: z.array(quoteLine),
});
export type QuoteDetail = z.infer<typeof quoteDetail>;

export const newQuote = z.strictObject({
  customerId: id,
  pricesFrom: plantDay,
  pricesUntil: plantDay,
  answerBy: plantDay,
  notes: note(),
  lines: z
    .array(
      z.strictObject({
        specificationId: id,
        chosen: chosenValues.default({}),
        basis: priceBasis,
        priceMinor: priceTyped,
      }),
    )
    .min(1)
    .max(200),
});
export type NewQuoteWire = z.input<typeof newQuote>;

const readers = ownCustomer('buyer', 'buyer_owner', 'rep', 'admin');
const writers = ownCustomer('rep', 'admin');
const buyers = ownCustomer('buyer', 'buyer_owner');
const params = { quoteId: id };

/** Newest first. Buyers see what was sent to them, never a draft. */
export const listQuotes = defineEndpoint({
  id: 'quotes.list',
  summary: 'Quotes, newest first',
  method: 'GET',
  path: '/quotes',
  access: readers,
  query: { ...pageQuery, state: quoteState.optional(), customerId: id.optional() },
  response: pageOf(quoteListItem),
});

export const getQuote = defineEndpoint({
  id: 'quotes.get',
  summary: 'One quote with its prices',
  method: 'GET',
  path: '/quotes/:quoteId',
  access: readers,
  params,
  response: quoteDetail,
});

export const createQuote = defineEndpoint({
  id: 'quotes.create',
  summary: 'Writes a quote as a draft',
  method: 'POST',
  path: '/quotes',
  access: writers,
  body: newQuote,
  response: quoteDetail,
  status: 201,
  idempotent: true,
});

export const sendQuote = defineEndpoint({
  id: 'quotes.send',
  summary: 'Sends a draft to the customer by mail',
  method: 'POST',
  path: '/quotes/:quoteId/send',
  access: writers,
  params,
  response: quoteDetail,
  guarded: true,
});

export const acceptQuote = defineEndpoint({
  id: 'quotes.accept',
  summary: "Accepts a quote: its prices become the customer's agreement",
  method: 'POST',
  path: '/quotes/:quoteId/accept',
  access: buyers,
  params,
  response: quoteDetail,
  guarded: true,
});

export const declineQuote = defineEndpoint({
  id: 'quotes.decline',
  summary: 'Declines a quote',
  method: 'POST',
  path: '/quotes/:quoteId/decline',
  access: buyers,
  params,
  response: quoteDetail,
  guarded: true,
});
