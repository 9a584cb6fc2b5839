import {
  addZone,
  changeZone,
  getCalendar,
  listDeliveryDays,
  listSiteZones,
  placeOrder,
  removeClosure,
  setClosure,
  setSiteZone,
} from '@seamwright/ordering/contracts';
import { openOrderingHouse, type OrderingHouse } from '@seamwright/ordering/server/testing';
import type { Caller } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
afterAll(() => house.close());

const zone = { name: 'Moor', weekdays: [4, 2], cutOffTime: '11:30', leadDays: 2, deliveryChargeMinor: 900 };

describe('the delivery days of a site', () => {
  it('start with the first that can still be ordered for, with its cut-off', async () => {
    const { body } = await house.call(house.heron.buyer, listDeliveryDays, { query: { count: 3 } });
    expect(body).toMatchObject({
      serverTime: '2026-12-01T12:00:00.000Z',
      zoneName: 'Harbour',
      deliveryChargeMinor: 650,
      days: [
        { day: '2026-12-02', cutOffAt: '2026-12-01T14:00:00.000Z', closed: false },
        { day: '2026-12-03', cutOffAt: '2026-12-02T14:00:00.000Z' },
        { day: '2026-12-04', cutOffAt: '2026-12-03T14:00:00.000Z' },
      ],
    });
    expect(body.sites.map(({ name }) => name)).toEqual(['Annexe', 'Heron kitchen']);
  });

  it('reach later for goods that take longer, and tell of days that are closed already', async () => {
    house.closedDays.add('2026-12-07');
    const { body } = await house.call(house.heron.buyer, listDeliveryDays, { query: { count: 1, leadDays: 3 } });
    expect(body.days).toEqual([{ day: '2026-12-07', cutOffAt: '2026-12-01T14:00:00.000Z', closed: true }]);
    house.closedDays.clear();
  });

  it('are shown to the buyers of the site, and to staff who name the customer', async () => {
    const ask = (caller: Caller, query: object) => house.call(caller, listDeliveryDays, { query });
    expect((await ask(house.heron.buyer, { siteId: house.quayside.siteId })).status).toBe(404);
    expect((await ask(house.heron.annexeBuyer, { siteId: house.heron.siteId })).status).toBe(404);
    expect((await ask(house.heron.annexeBuyer, {})).body.sites).toHaveLength(1);
    expect((await ask(house.rep, {})).problem.code).toBe('customer-missing');
    expect((await ask(house.rep, { customerId: house.quayside.id })).body.sites).toHaveLength(1);
    const kept: Caller = { kind: 'staff', personId: newId(), roles: ['rep'], customers: [house.heron.id] };
    expect((await ask(kept, { customerId: house.quayside.id })).status).toBe(404);
  });
});

describe('the calendar', () => {
  it('takes new zones and changes of them from the administrator, guarded', async () => {
    const added = await house.call(house.admin, addZone, { body: zone });
    expect(added.body).toMatchObject({ ...zone, weekdays: [2, 4], rowVersion: 1, sites: 0 });
    const params = { zoneId: added.body.id };
    const changed = await house.call(house.admin, changeZone, { params, body: { ...zone, leadDays: 3 }, ifMatch: 1 });
    expect(changed.body).toMatchObject({ leadDays: 3, rowVersion: 2 });
    expect((await house.call(house.admin, changeZone, { params, body: zone, ifMatch: 1 })).status).toBe(412);
    expect((await house.call(house.rep, changeZone, { params, body: zone, ifMatch: 2 })).status).toBe(403);
    expect((await house.call(house.admin, addZone, { body: zone })).problem.code).toBe('already-there');
    const bad = await house.call(house.admin, addZone, { body: { ...zone, cutOffTime: '25:00', weekdays: [8] } });
    expect(bad.problem.errors.map(({ pointer }) => pointer).sort()).toEqual(['/cutOffTime', '/weekdays/0']);
    expect((await house.call(house.rep, getCalendar, {})).body.zones.map(({ name }) => name)).toEqual([
      'Harbour',
      'Moor',
    ]);
  });

  it('puts a site into a zone, guarded by the version that was read', async () => {
    const zones = (await house.call(house.admin, getCalendar, {})).body.zones;
    const moor = zones.find(({ name }) => name === 'Moor')?.id ?? '';
    const query = { customerId: house.quayside.id };
    const [site] = (await house.call(house.admin, listSiteZones, { query })).body.items;
    const params = { customerId: house.quayside.id, siteId: site?.siteId ?? '' };
    const put = (ifMatch: number, zoneId = moor) =>
      house.call(house.admin, setSiteZone, { params, body: { zoneId }, ifMatch });
    expect((await put(1)).body).toMatchObject({ zoneId: moor, rowVersion: 2 });
    expect((await put(1)).status).toBe(412);
    expect((await put(2, newId())).problem.code).toBe('zone-unknown');
    const other = { ...params, customerId: house.heron.id };
    const wrong = await house.call(house.admin, setSiteZone, { params: other, body: { zoneId: moor }, ifMatch: 2 });
    expect(wrong.status).toBe(404);
  });

  it('closes a day that nobody ordered for, and opens it again', async () => {
    const close = (day: string) =>
      house.call(house.admin, setClosure, { params: { day }, body: { reason: 'Stocktake' } });
    await house.call(house.heron.buyer, placeOrder, {
      body: {
        siteId: house.heron.siteId,
        deliveryDay: '2026-12-02',
        settlement: 'account',
        lines: [{ code: 'BF-901', quantity: { unit: 'piece', count: 1 } }],
      },
    });
    expect((await close('2026-12-02')).problem.code).toBe('closure-has-orders');
    expect((await close('2026-11-30')).problem.code).toBe('day-past');
    expect((await close('2026-12-03')).status).toBe(200);
    const days = async () =>
      (await house.call(house.heron.buyer, listDeliveryDays, { query: { count: 2 } })).body.days.map(({ day }) => day);
    expect(await days()).toEqual(['2026-12-02', '2026-12-04']);
    const params = { day: '2026-12-03' };
    expect((await house.call(house.admin, removeClosure, { params })).status).toBe(204);
    expect((await house.call(house.admin, removeClosure, { params })).status).toBe(404);
    expect(await days()).toEqual(['2026-12-02', '2026-12-03']);
  });
});
