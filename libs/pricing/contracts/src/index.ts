export {
  getPriceList,
  listPriceLines,
  listPriceLists,
  setPriceLine,
  type PriceList,
  type PriceListLine,
} from './price-lists.endpoints';
export {
  chosenValues,
  lineAmountsWire,
  lineWeights,
  priceAnswer,
  priceBasis,
  quantityWire,
  type PriceAnswerWire,
} from './price-wire';
export { checkPrices, type PricedLine } from './prices.endpoints';
export {
  acceptQuote,
  createQuote,
  declineQuote,
  getQuote,
  listQuotes,
  sendQuote,
  type NewQuoteWire,
  type QuoteDetail,
  type QuoteListItem,
} from './quotes.endpoints';
