import { listDeliveryDays } from '@seamwright/ordering/contracts';
import type { Bench, BenchCase, ReadyBench } from '../bench';
import { accessCases } from './access-cases';
import { catalogueCases } from './catalogue-cases';
import { dayCases } from './day-cases';
import { moneyCases } from './money-cases';
import { orderCases } from './order-cases';
import { fillFloor, packingCases } from './packing-cases';
import { threadDays } from './scenario';
import { known, openStage, type Stage } from './stage';

/** Every call of the thread, from signing in to the reconciliation, over HTTP. */
export const threadBench: Bench = {
  name: 'thread',
  async prepare({ turns, say }): Promise<ReadyBench> {
    const stage = await openStage(say);
    try {
      say('  placing orders to work on');
      return { cases: await casesOn(stage, turns), beforeCase: stage.signEverybodyIn, close: stage.close };
    } catch (error) {
      await stage.close();
      throw error;
    }
  },
};

/** In the order of the trade; each case prepares its own rows ahead. */
async function casesOn(stage: Stage, turns: number): Promise<BenchCase[]> {
  const days = threadDays(stage.anchor, 2 * turns);
  const { siteId } = await stage.api.call(stage.as('lucian').token, listDeliveryDays, { query: { count: 1 } });
  const site = known(siteId, 'site to deliver to');
  const toPack = await fillFloor(stage, days.floor, site, turns);
  return [
    ...accessCases(stage),
    ...(await catalogueCases(stage, days)),
    ...(await orderCases(stage, days, site)),
    ...(await dayCases(stage, days, site)),
    ...packingCases(stage, toPack),
    ...(await moneyCases(stage)),
  ];
}
