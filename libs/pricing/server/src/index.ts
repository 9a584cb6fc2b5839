import { checkPrices } from '@seamwright/pricing/contracts';
import { implement, type Implementation, type PeriodicJob } from '@seamwright/shared/server';
import { answerPriceCheck } from './check-prices';
import { expireQuotesJob } from './expire-quotes.job';
import { priceListImplementations } from './price-lists.router';
import { quoteImplementations, type QuoteParts } from './quotes.router';

export { countPriceLines } from './count-price-lines';
export { addPriceList, type NewPriceLine, type NewPriceList } from './price-lists.repository';
export { pricePort } from './price-port';
export { priceFor, type PriceRequest } from './price-for';

/** The endpoints of this storey. */
export const pricingImplementations = (parts: QuoteParts): Implementation[] => [
  implement(checkPrices, (context, { body }) => answerPriceCheck(context, parts.timeZone, body)),
  ...quoteImplementations(parts),
  ...priceListImplementations(parts),
];

export const pricingPeriodic = (parts: { readonly timeZone: string }): PeriodicJob[] => [
  expireQuotesJob(parts.timeZone),
];
