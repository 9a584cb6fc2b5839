import type { Implementation, Subscriber } from '@seamwright/shared/server';
import { cuttingDayImplementations, type PlantParts } from './cutting-days.router';
import { packingImplementations } from './packing.router';
import { releaseLateOrders } from './release-late-orders';

export { cuttingDayPort } from './day-port';
export type { PlantParts } from './cutting-days.router';

export const plantImplementations = (parts: PlantParts): Implementation[] => [
  ...cuttingDayImplementations(parts),
  ...packingImplementations(),
];

export const plantSubscribers: readonly Subscriber[] = [releaseLateOrders];
