export { pricePerKg } from './price-per-kg';
export { HOUSE_CURRENCY } from './house-currency';
export { plateCost, portionToBuy, type Plate, type PlateCost } from './plate-cost';
export { lineAmounts, type LineAmounts, type PricedWeights } from './line-amounts';
export {
  PRICE_BASES,
  PRICE_LEVELS,
  type PriceBasis,
  type PriceBreak,
  type PriceCandidate,
  type PriceLevel,
} from './price-candidate';
export { choicesChange, type PricedPiece } from './priced-piece';
export { breakReached, checkBreaks, orderedInBasis } from './quantity-breaks';
export {
  agreementValidity,
  answerQuote,
  checkQuoteDates,
  checkQuotedPrices,
  type QuoteDates,
  type QuotedPrice,
} from './quote';
export { QUOTE_STATES, quoteStates, type QuoteMove, type QuoteState } from './quote.states';
export {
  CANDIDATE_OUTCOMES,
  resolvePrice,
  type CandidateOutcome,
  type ConsideredPrice,
  type PriceAnswer,
  type PricePart,
  type PriceQuestion,
} from './resolve-price';
export { inForce, overlap, withoutDays, type Validity } from './validity';
