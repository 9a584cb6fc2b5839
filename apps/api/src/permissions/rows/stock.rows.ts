import * as stock from '@seamwright/stock/contracts';
import { ofHouse, type Row } from '../row';
import { aLot, lotFacts } from '../testing/plant';

export const stockRows: readonly Row[] = [
  ofHouse(stock.listLots, () => ({})),
  ofHouse(stock.getLot, async (world) => ({ params: { id: (await aLot(world)).id } })),
  ofHouse(stock.receiveLot, (world) => ({ body: lotFacts(world) })),
  ofHouse(stock.holdLot, async (world) => {
    const { id, rowVersion } = await aLot(world);
    return { params: { id }, body: { reason: 'The seal is broken' }, ifMatch: rowVersion };
  }),
  ofHouse(stock.releaseLot, async (world) => {
    const { id, rowVersion } = await aLot(world);
    return { params: { id }, ifMatch: rowVersion };
  }),
  ofHouse(stock.listLotNodes, () => ({})),
];
