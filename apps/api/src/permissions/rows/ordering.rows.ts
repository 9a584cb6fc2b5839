import * as ordering from '@seamwright/ordering/contracts';
import { rolesOf, type Caller } from '@seamwright/shared/server';
import { ofCaller, ofCustomer, ofHouse, type Row } from '../row';
import { aCard, anImport, anOrder, anUnpaidOrder, aWorkbook, ORDER_DAY, someLines } from '../testing/trade';
import type { World } from '../testing/world';

const zone = ({ next }: World) => ({
  name: `Zone ${next()}`,
  weekdays: [2, 4],
  cutOffTime: '14:00',
  leadDays: 1,
  deliveryChargeMinor: 500,
});

const aClosure = async (world: World): Promise<string> => {
  const day = world.nextDay();
  await world.deed(world.staff.admin, ordering.setClosure, { params: { day }, body: { reason: 'A holiday' } });
  return day;
};

/** Whoever is kept to some customers sees their own workbooks only; who may not bring one is shown the desk's. */
const uploader = ({ staff }: World, caller: Caller): Caller => {
  const { access } = ordering.uploadOrders;
  const may = access.who === 'roles' && rolesOf(caller).some((role) => access.roles.includes(role));
  return may ? caller : staff.admin;
};

export const orderingRows: readonly Row[] = [
  ofCustomer(ordering.listDeliveryDays, (_world, { id }) => ({ query: { customerId: id } })),
  ofHouse(ordering.getCalendar, () => ({})),
  ofHouse(ordering.addZone, (world) => ({ body: zone(world) })),
  ofHouse(ordering.changeZone, async (world) => {
    const { id, rowVersion } = await world.deed(world.staff.admin, ordering.addZone, { body: zone(world) });
    return { params: { zoneId: id }, body: zone(world), ifMatch: rowVersion };
  }),
  ofHouse(ordering.setClosure, (world) => ({ params: { day: world.nextDay() }, body: { reason: 'A holiday' } })),
  ofHouse(ordering.removeClosure, async (world) => ({ params: { day: await aClosure(world) } })),
  ofCustomer(ordering.listSiteZones, (_world, { id }) => ({ query: { customerId: id } }), 'empty'),
  ofCustomer(ordering.setSiteZone, async (world, { id, siteId }) => {
    const query = { customerId: id };
    const { items } = await world.deed(world.staff.admin, ordering.listSiteZones, { query });
    const { rowVersion } = items.find((site) => site.siteId === siteId) ?? { rowVersion: 0 };
    return { params: { customerId: id, siteId }, body: { zoneId: world.zoneId }, ifMatch: rowVersion };
  }),
  ofCustomer(ordering.placeOrder, (world, { id, siteId }) => ({
    body: { customerId: id, siteId, deliveryDay: ORDER_DAY, settlement: 'account' as const, lines: someLines(world) },
  })),
  ofCustomer(
    ordering.listOrders,
    async (world, party) => {
      await anOrder(world, party);
      return { query: { customerId: party.id } };
    },
    'empty',
  ),
  ofCustomer(ordering.getOrder, async (world, party) => ({ params: { orderId: (await anOrder(world, party)).id } })),
  ofCustomer(ordering.cancelOrder, async (world, party) => {
    const { id, rowVersion } = await anOrder(world, party);
    return { params: { orderId: id }, body: { reason: 'Ordered twice' }, ifMatch: rowVersion };
  }),
  ofCustomer(ordering.payOrderWith, async (world, party) => {
    const { id, rowVersion } = await anUnpaidOrder(world, party);
    return { params: { orderId: id }, body: { cardId: await aCard(world, party) }, ifMatch: rowVersion };
  }),
  ofHouse(ordering.getImportTemplate, () => ({})),
  ofHouse(ordering.uploadOrders, async (world) => ({ file: await aWorkbook(world, world.own) })),
  ofCaller(ordering.getOrderImport, async (world, caller) => ({
    params: { importId: await anImport(world, world.own, uploader(world, caller)) },
  })),
  ofCaller(
    ordering.takeOrders,
    async (world, caller) => ({
      params: { importId: await anImport(world, world.own, uploader(world, caller)) },
      body: { how: 'all-or-none' as const },
    }),
    { needsCustomer: true },
  ),
];
