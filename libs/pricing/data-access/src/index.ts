export { PriceChecks, type PriceCheck, type PriceCheckAnswer, type PricedLine } from './price-checks';
export {
  PriceListPageActions,
  PriceListsApiActions,
  PriceListsPageActions,
  type ListSearch,
  type PriceChange,
} from './price-lists/price-lists.actions';
export { priceListsEffects } from './price-lists/price-lists.effects';
export { priceListsFeature } from './price-lists/price-lists.feature';
export {
  NewQuotePageActions,
  QuoteListPageActions,
  QuotePageActions,
  QuotesApiActions,
  type QuoteDeed,
} from './quotes/quotes.actions';
export { quotesEffects } from './quotes/quotes.effects';
export { quotesFeature, type Deed } from './quotes/quotes.feature';
