import * as z from 'zod';
import { defineEndpoint, id, line, minor, plantDay, rowVersion, staffOnly } from '@seamwright/shared/contracts';

const zoneFields = {
  name: line(60),
  /** ISO weekdays: 1 Monday to 7 Sunday. */
  weekdays: z
    .array(z.int().min(1).max(7))
    .min(1)
    .max(7)
    .refine((days) => new Set(days).size === days.length, { message: 'Each weekday once.' }),
  cutOffTime: z
    .string()
    .regex(/^([01]\d|2[0-3]):[0-5]\d$/)
    .meta({ description: "HH:MM on the plant's clock" }),
  leadDays: z.int().min(1).max(14),
  deliveryChargeMinor: minor.nonnegative().max(100_000),
};

export const deliveryZone = z.strictObject({ id, rowVersion, ...zoneFields, sites: z.int().nonnegative() });
export type DeliveryZoneWire = z.infer<typeof deliveryZone>;

const closure = z.strictObject({ day: plantDay, reason: line(120) });
export type ClosureWire = z.infer<typeof closure>;

export const getCalendar = defineEndpoint({
  id: 'calendar.get',
  summary: 'Delivery zones, and the days from last month on when the plant is closed',
  method: 'GET',
  path: '/delivery-calendar',
  access: staffOnly('rep', 'planner', 'accounts', 'admin'),
  response: z.strictObject({ timeZone: z.string(), zones: z.array(deliveryZone), closures: z.array(closure) }),
});

export const addZone = defineEndpoint({
  id: 'delivery-zones.add',
  summary: 'Adds a delivery zone',
  method: 'POST',
  path: '/delivery-zones',
  access: staffOnly('admin'),
  body: z.strictObject(zoneFields),
  response: deliveryZone,
  status: 201,
  idempotent: true,
});

export const changeZone = defineEndpoint({
  id: 'delivery-zones.change',
  summary: 'Changes a delivery zone; orders that are placed keep their day and charge',
  method: 'PUT',
  path: '/delivery-zones/:zoneId',
  access: staffOnly('admin'),
  params: { zoneId: id },
  body: z.strictObject(zoneFields),
  response: deliveryZone,
  guarded: true,
});

export const setClosure = defineEndpoint({
  id: 'plant-closures.set',
  summary: 'Closes the plant for a day that nobody has ordered for',
  method: 'PUT',
  path: '/plant-closures/:day',
  access: staffOnly('admin'),
  params: { day: plantDay },
  body: z.strictObject({ reason: line(120) }),
  response: closure,
});

export const removeClosure = defineEndpoint({
  id: 'plant-closures.remove',
  summary: 'Opens the plant again for a day',
  method: 'DELETE',
  path: '/plant-closures/:day',
  access: staffOnly('admin'),
  params: { day: plantDay },
});

export const siteZone = z.strictObject({
  siteId: id,
  siteName: line(),
  /** 0 while the site has no zone. */
  rowVersion: z.int().nonnegative(),
  zoneId: id.nullable(),
});
export type SiteZoneWire = z.infer<typeof siteZone>;

export const listSiteZones = defineEndpoint({
  id: 'site-zones.list',
  summary: 'The sites of a customer with the zone that each is delivered in',
  method: 'GET',
  path: '/site-zones',
  access: staffOnly('rep', 'planner', 'admin'),
  query: { customerId: id },
  response: z.strictObject({ items: z.array(siteZone) }),
});

export const setSiteZone = defineEndpoint({
  id: 'site-zones.set',
  summary: 'Puts a site into a delivery zone',
  method: 'PUT',
  path: '/customers/:customerId/sites/:siteId/delivery-zone',
  access: staffOnly('admin'),
  params: { customerId: id, siteId: id },
  body: z.strictObject({ zoneId: id }),
  response: siteZone,
  guarded: true,
});
