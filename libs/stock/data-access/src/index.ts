export { LotReceipts, type LotPrimal, type LotReceipt } from './lot-receipts';
export { LotListPageActions, LotPageActions, LotsApiActions, LotsLiveActions } from './lots/lots.actions';
export { lotsEffects } from './lots/lots.effects';
export { lotsFeature } from './lots/lots.feature';
