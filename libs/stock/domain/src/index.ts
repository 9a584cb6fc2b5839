export { LOT_STATES, lotStates, type LotMove, type LotState } from './lot.states';
export type { Lot, LotOrigin } from './lot';
export { firstExpiredFirst, lotFit, type DayOfUse } from './lot-fit';
export { gramsIn } from './simple-yield';
export { judgePack, netWeight, packLimits, withinLimits, type PackLimits, type PieceLimits } from './pack-limits';
export type { Pack, PackedLine } from './pack';
export { packedLines } from './packed-lines';
