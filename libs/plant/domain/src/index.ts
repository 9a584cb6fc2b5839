export {
  CUTTING_DAY_STATES,
  cuttingDayStates,
  isBeingCut,
  isClosedToOrders,
  type CuttingDayMove,
  type CuttingDayState,
} from './cutting-day.states';
export { CAUTIONS, cautionsOf, type Caution } from './cautions';
export { cuttingDayAfterChange, cuttingDayOf, type CuttingDay } from './cutting-day';
export { type Cut, type CutFor, type CuttingLine, type Primal } from './cutting-line';
export type { CutQuantity } from './cut-quantity';
export {
  byCustomer,
  byPrimal,
  cuttingList,
  cuttingTotals,
  stationLoads,
  type CustomerCut,
  type CustomerCuts,
  type CustomerShare,
  type CuttingListRow,
  type CuttingTotals,
  type PrimalRows,
} from './cutting-list';
export { pullList, pullTotals, type Pull, type PullListRow, type PullTotals } from './pull-list';
export { minutesOf, type StationLoad } from './station-time';
export { openPieces, roomForPack, type LineProgress } from './packing';
