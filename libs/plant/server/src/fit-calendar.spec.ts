import { closeCuttingDay, getCuttingDay } from '@seamwright/plant/contracts';
import { inTransaction } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import { openTestPlant, type TestPlant } from '../testing/src/index';
import { cuttingDayPort } from './day-port';

let plant: TestPlant;
beforeAll(async () => {
  plant = await openTestPlant();
});
afterAll(() => plant.house.close());

const TODAY = '2026-12-01' as PlantDate;
const dayOf = async (deliveryDay: string) =>
  (await plant.house.call(plant.planner, getCuttingDay, { params: { deliveryDay } })).body;
const order = (deliveryDay: string) => plant.place([{ code: 'LM-901', count: 1 }], { deliveryDay });
/** Closes the plant for a day the way ordering does; the whole is undone when the plant refuses. */
const closeFor = (day: string, today = TODAY) =>
  inTransaction(plant.house.database, plant.planner, async (tx) => {
    await tx.insertInto('plantClosures').values({ day, reason: 'Stocktake' }).execute();
    await cuttingDayPort.calendarChanged(tx, day as PlantDate, today);
  });
const openFor = (day: string) =>
  inTransaction(plant.house.database, plant.planner, async (tx) => {
    await tx.deleteFrom('plantClosures').where('day', '=', day).execute();
    await cuttingDayPort.calendarChanged(tx, day as PlantDate, TODAY);
  });

describe('a change of the calendar', () => {
  it('moves the cutting of a day that is still open, and moves it back', async () => {
    await order('2026-12-09');
    const before = await dayOf('2026-12-09');
    await closeFor('2026-12-08');
    expect(await dayOf('2026-12-09')).toMatchObject({ cuttingDay: '2026-12-07', rowVersion: before.rowVersion + 1 });
    await openFor('2026-12-08');
    expect((await dayOf('2026-12-09')).cuttingDay).toBe('2026-12-08');
  });

  it('is refused for the day on which a closed list is cut', async () => {
    await order('2026-12-11');
    const { rowVersion: ifMatch } = await dayOf('2026-12-11');
    await plant.house.call(plant.planner, closeCuttingDay, { params: { deliveryDay: '2026-12-11' }, ifMatch });
    await expect(closeFor('2026-12-10')).rejects.toMatchObject({
      refusal: { code: 'day-being-cut', params: { day: '2026-12-10', delivery: '2026-12-11' } },
    });
    await closeFor('2026-12-09');
    expect((await dayOf('2026-12-11')).cuttingDay).toBe('2026-12-10');
  });

  it('is refused when no day is left to cut what is ordered, not for a day without orders', async () => {
    await order('2026-12-15');
    const monday = '2026-12-14' as PlantDate;
    await expect(closeFor(monday, monday)).rejects.toMatchObject({ refusal: { code: 'no-day-to-cut' } });
    await inTransaction(plant.house.database, plant.market.pubBuyer, (tx) =>
      cuttingDayPort.isClosed(tx, '2026-12-22' as PlantDate),
    );
    await expect(closeFor('2026-12-21', '2026-12-21' as PlantDate)).resolves.toBeUndefined();
  });
});
