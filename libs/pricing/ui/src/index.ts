export { basisWord, levelWord, quoteStateWord } from './price-words';
export { PriceWhy } from './price-why';
export { priceWhyParts } from './price-why-parts';
export { QuoteFacts, type ShownQuoteFacts } from './quote-facts';
export { QuoteLines, type ShownQuoteLine } from './quote-lines';
export { QuoteSeam } from './quote-seam';
export { QuoteStateChip } from './quote-state';
