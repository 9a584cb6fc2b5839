import {
  addZone,
  changeZone,
  getCalendar,
  listDeliveryDays,
  listSiteZones,
  removeClosure,
  setClosure,
  setSiteZone,
} from '@seamwright/ordering/contracts';
import { implement, implementOnce, inTransaction, type Implementation } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { closuresAround } from './calendar.repository';
import { closePlant, openPlant } from './close-plant';
import { changeDeliveryZone, insertZone, zoneById, zonesWithSites } from './delivery-zones.repository';
import { listDeliveryDaysOf } from './list-delivery-days';
import type { OrderingParts } from './ports';
import { putSiteInZone, siteZonesOf } from './site-zones.repository';

export function calendarImplementations(parts: OrderingParts): Implementation[] {
  const { timeZone, days } = parts;
  return [
    implement(listDeliveryDays, ({ database, caller, now }, { query }) =>
      inTransaction(database, caller, (tx) => listDeliveryDaysOf(tx, { now, caller }, parts, query)),
    ),
    implement(getCalendar, ({ database, caller, now }) =>
      inTransaction(database, caller, async (tx) => ({
        timeZone,
        zones: await zonesWithSites(tx),
        closures: await closuresAround(tx, plantToday(now, timeZone)),
      })),
    ),
    implementOnce(addZone, {
      make: (tx, _context, { body }) => insertZone(tx, body),
      present: (tx, _context, id) => zoneById(tx, id),
    }),
    implement(changeZone, ({ database, caller, ifMatch }, { params, body }) =>
      inTransaction(database, caller, (tx) => changeDeliveryZone(tx, params.zoneId, ifMatch, body)),
    ),
    implement(setClosure, ({ database, caller, now }, { params, body }) =>
      inTransaction(database, caller, (tx) => closePlant(tx, { now, timeZone, days, ...params, ...body })),
    ),
    implement(removeClosure, ({ database, caller, now }, { params }) =>
      inTransaction(database, caller, (tx) => openPlant(tx, { now, timeZone, days, ...params })),
    ),
    implement(listSiteZones, ({ database, caller }, { query }) =>
      inTransaction(database, caller, async (tx) => ({ items: await siteZonesOf(tx, query.customerId) })),
    ),
    implement(setSiteZone, ({ database, caller, ifMatch }, { params, body }) =>
      inTransaction(database, caller, (tx) => putSiteInZone(tx, { ...params, ...body, rowVersion: ifMatch })),
    ),
  ];
}
