export { DeliveryDayPicker, type OfferedDay } from './delivery-day-picker';
export { OrderHistory, type ShownChange } from './order-history';
export { OrderLines, type ShownOrderLine } from './order-lines';
export { OrderPayment, paymentWords, type ShownPayment } from './order-payment';
export { OrderSeam, orderStages, type OrderLife } from './order-seam';
export { OrderStageChip } from './order-stage';
export { OrderTotalsBox, type ShownTotals } from './order-totals';
export { quantityWords, sourceWord, stageWord, whenShortWord, type ShownQuantity } from './order-words';
