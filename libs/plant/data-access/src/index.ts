export {
  CuttingDayListPageActions,
  CuttingDayPageActions,
  CuttingDaysApiActions,
  CuttingDaysLiveActions,
  type DayDeed,
  type DayPapers,
} from './cutting-days/cutting-days.actions';
export { cuttingDaysEffects } from './cutting-days/cutting-days.effects';
export { cuttingDaysFeature } from './cutting-days/cutting-days.feature';
export {
  PackingApiActions,
  PackingLiveActions,
  ScaleOrdersPageActions,
  ScalePageActions,
  type PackingDeed,
  type WeighedPack,
} from './packing/packing.actions';
export { packingEffects } from './packing/packing.effects';
export { packingFeature } from './packing/packing.feature';
