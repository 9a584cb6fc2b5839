export { ok, refuse, RefusalError, unwrap, type Accepted, type Refusal, type Refused, type Result } from './result';
export { divideDown, divideHalfUp, divideRounded, divideUp, toSafeNumber, type Rounding } from './rounding';
export { currencyCode, currencyCodes, minorDigits, type CurrencyCode } from './currency';
export { addMoney, minorUnits, priceForGrams, priceTimes, sumMoney, taxOn, type MinorUnits } from './money';
export { formatMoney, parseMoney } from './money-text';
export { shareByLargestRemainder } from './largest-remainder';
export { UNIT_SPACE } from './unit-space';
export { formatPercent, multiplyPpm, ppm, type Ppm } from './ppm';
export {
  addFractions,
  compareFractions,
  divideFractions,
  fraction,
  fractionOfPpm,
  multiplyFractions,
  roundFraction,
  subtractFractions,
  type Fraction,
} from './fraction';
export { applyPpm, grams, sumGrams, type Grams } from './weight';
export { formatKg, formatKgWithUnit, parseKg } from './weight-text';
export { piecesNearest, quantity, type Quantity, type QuantityInput } from './quantity';
export {
  addDays,
  daysBetween,
  endOfMonth,
  endOfWeek,
  isoWeekOf,
  isPlantDate,
  plantDate,
  weekdayOf,
  type PlantDate,
} from './plant-date';
export { instantAt, isClockTime, plantToday } from './plant-clock';
export { formatPlantDate, parsePlantDate } from './plant-date-text';
export { newId, type Id } from './identifiers';
export { checkDigitMod10, gtin14VariableMeasure, isGtin } from './gtin';
export { creditorReference, formatCreditorReference, isCreditorReference } from './creditor-reference';
export { stateTable, type Moves, type StateTable } from './state-table';
