import type { StockPort } from '@seamwright/catalogue/server';
import { lotFit } from '@seamwright/stock/domain';
import { releasedLots } from './lots.repository';

/** What the catalogue asks of stock. */
export const stockPort: StockPort = {
  async nodesInStock(tx, day) {
    const lots = await releasedLots(tx);
    const usable = lots.filter(
      (lot) => lot.remainingGrams > 0 && lotFit(lot, { cuttingDay: day, deliveryDay: day }).ok,
    );
    return [...new Set(usable.map(({ nodeId }) => nodeId))];
  },
};
