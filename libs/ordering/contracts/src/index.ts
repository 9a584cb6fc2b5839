export { listDeliveryDays, type DeliveryDaysAnswer } from './delivery-days.endpoints';
export {
  addZone,
  changeZone,
  getCalendar,
  listSiteZones,
  removeClosure,
  setClosure,
  setSiteZone,
  type ClosureWire,
  type DeliveryZoneWire,
  type SiteZoneWire,
} from './calendar.endpoints';
export {
  cancelOrder,
  getOrder,
  listOrders,
  ORDER_FILTERS,
  payOrderWith,
  placeOrder,
  type NewOrderWire,
  type OrderDetail,
  type OrderLineWire,
  type OrderListItem,
} from './orders.endpoints';
export {
  getImportTemplate,
  getOrderImport,
  takeOrders,
  uploadOrders,
  type ImportFaultWire,
  type ImportOrderWire,
  type OrderImportWire,
} from './order-imports.endpoints';
