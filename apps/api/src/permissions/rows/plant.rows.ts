import * as plant from '@seamwright/plant/contracts';
import { ofHouse, type Row } from '../row';
import {
  aClosedDay,
  anOpenDay,
  aPackedDay,
  aReleasedDay,
  lineAtTheScale,
  packLine,
  packOf,
  type AtTheScale,
} from '../testing/plant';
import type { World } from '../testing/world';

const move = ({ deliveryDay, rowVersion }: plant.CuttingDayWire) => ({ params: { deliveryDay }, ifMatch: rowVersion });

const ofSomeDay = async (world: World) => {
  const { day } = await anOpenDay(world, world.own);
  return { params: { deliveryDay: day.deliveryDay } };
};

const atTheScale = async (world: World): Promise<AtTheScale> =>
  lineAtTheScale(world, (await aReleasedDay(world, world.own)).order);

export const plantRows: readonly Row[] = [
  ofHouse(plant.listCuttingDays, () => ({})),
  ofHouse(plant.getCuttingDay, ofSomeDay),
  ofHouse(plant.closeCuttingDay, async (world) => move((await anOpenDay(world, world.own)).day)),
  ofHouse(plant.releaseCuttingDay, async (world) => move((await aClosedDay(world, world.own)).day)),
  ofHouse(plant.finishCuttingDay, async (world) => move(await aPackedDay(world, world.own))),
  ofHouse(plant.getCuttingList, ofSomeDay),
  ofHouse(plant.getPullList, ofSomeDay),
  ofHouse(plant.getWorkbook, ofSomeDay),
  ofHouse(plant.listPackingOrders, async (world) => ({
    query: { deliveryDay: (await aReleasedDay(world, world.own)).day.deliveryDay },
  })),
  ofHouse(plant.addPack, async (world) => packOf(world, await atTheScale(world))),
  ofHouse(plant.voidPack, async (world) => {
    const at = await atTheScale(world);
    return { params: { orderId: at.orderId, packId: await packLine(world, at) } };
  }),
  ofHouse(plant.markShort, async (world) => {
    const { orderId, line } = await atTheScale(world);
    return { params: { orderId, lineId: line.id }, body: { shortPieces: 1, reason: 'Torn' } };
  }),
  ofHouse(plant.finishOrder, async (world) => {
    const at = await atTheScale(world);
    await packLine(world, at);
    return { params: { orderId: at.orderId } };
  }),
];
