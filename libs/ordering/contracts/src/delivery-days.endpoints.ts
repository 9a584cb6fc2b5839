import * as z from 'zod';
import {
  currency,
  defineEndpoint,
  id,
  instant,
  line,
  minor,
  ownCustomer,
  plantDay,
  ppmWire,
} from '@seamwright/shared/contracts';

const site = z.strictObject({ id, name: line(), address: z.string(), zoneName: line().nullable() });

export const deliveryDaysAnswer = z.strictObject({
  /** The server's clock when it answered; the time left is counted from it. */
  serverTime: instant,
  timeZone: z.string(),
  /** The site that the days are for; null when none of her sites is delivered to yet. */
  siteId: id.nullable(),
  zoneName: line().nullable(),
  currency,
  deliveryChargeMinor: minor,
  deliveryTaxPpm: ppmWire,
  /** Days that can still be ordered for, soonest first. `closed`: the plant has closed its list for that day. */
  days: z.array(z.strictObject({ day: plantDay, cutOffAt: instant, closed: z.boolean() })),
  /** Every site that may be ordered for. */
  sites: z.array(site),
});
export type DeliveryDaysAnswer = z.infer<typeof deliveryDaysAnswer>;

export const listDeliveryDays = defineEndpoint({
  id: 'delivery-days.list',
  summary: 'The next delivery days of a site with their cut-offs, and the sites that may be ordered for',
  method: 'GET',
  path: '/delivery-days',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'planner', 'accounts', 'admin'),
  query: {
    /** Staff say for whom. */
    customerId: id.optional(),
    /** Without it, the first of the sites that is delivered to. */
    siteId: id.optional(),
    /** Working days that the slowest chosen line needs beyond the zone's own. */
    leadDays: z.int().min(0).max(60).default(0),
    count: z.int().min(1).max(30).default(10),
  },
  response: deliveryDaysAnswer,
});
