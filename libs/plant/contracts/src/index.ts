export {
  closeCuttingDay,
  finishCuttingDay,
  getCuttingDay,
  getCuttingList,
  getPullList,
  getWorkbook,
  listCuttingDays,
  releaseCuttingDay,
  type CuttingDayWire,
  type CuttingListWire,
  type PullListWire,
} from './cutting-days.endpoints';
export {
  addPack,
  finishOrder,
  listPackingOrders,
  markShort,
  voidPack,
  type PackingLineWire,
  type PackingOrderWire,
} from './packing.endpoints';
export { cautionScope, cautionWords, cuttingDayStateName, stationName } from './plant-words';
