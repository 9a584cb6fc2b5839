export { type Closures, type DeliveryZone } from './delivery-zone';
export {
  checkDeliveryDay,
  cutOffOf,
  deliveryDays,
  FARTHEST_DAYS,
  isDeliveryDay,
  isWorkingDay,
  lastOrderDay,
  type DayQuestion,
  type DeliveryDay,
} from './delivery-calendar';
export {
  orderTotals,
  totalOf,
  type LineAmounts,
  type OrderTotals,
  type TaxAtRate,
  type TaxedAmount,
  type Total,
} from './order-totals';
export { DELIVERY_TAX, GOODS_TAX } from './tax';
export {
  checkAmendable,
  ORDER_STAGES,
  orderStage,
  type Amending,
  type OrderFacts,
  type OrderStage,
  type WaitingFor,
} from './order-stage';
export { checkOtherCard, type WaitingOrder } from './other-card';
export { WHEN_SHORT, type WhenShort } from './when-short';
export { packedAmount, type Packed, type PricedLine } from './packed-amount';
export {
  columnLetter,
  faultAt,
  IMPORT_COLUMNS,
  type ImportColumn,
  type ImportFault,
  type ImportRow,
} from './import-columns';
export {
  groupRows,
  MOST_LINES,
  nameKey,
  type GroupedImport,
  type ImportedLine,
  type ImportedOrder,
} from './import-grouping';
export { type Order, type OrderLine, type OrderSource, type OrderWithLines, type Settlement } from './order';
export { checkLineWeight, MOST_LINE_GRAMS } from './line-limits';
export { unfinishedLines } from './packing-finished';
