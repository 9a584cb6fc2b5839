import { sql } from 'kysely';
import type { Closures, DeliveryZone } from '@seamwright/ordering/domain';
import type { Tx } from '@seamwright/shared/server';
import { addDays, minorUnits, type PlantDate } from '@seamwright/shared/util';

/** A site that the caller may see, with the zone it is delivered in. */
export interface SiteInZone {
  readonly customerId: string;
  readonly customerName: string;
  readonly customerActive: boolean;
  readonly siteId: string;
  readonly siteName: string;
  readonly siteActive: boolean;
  readonly address: string;
  readonly postcode: string;
  readonly zone: DeliveryZone | null;
}

/** The sites of these customers, by name; another customer's are not seen. */
export async function sitesInZones(tx: Tx, customerIds: readonly string[]): Promise<SiteInZone[]> {
  if (customerIds.length === 0) return [];
  const rows = await tx
    .selectFrom('sites as s')
    .innerJoin('customers as c', 'c.id', 's.customerId')
    .leftJoin('siteZones as sz', 'sz.siteId', 's.id')
    .leftJoin('deliveryZones as z', 'z.id', 'sz.zoneId')
    .select(['s.customerId', 'c.name as customerName', 'c.active as customerActive', 's.id as siteId'])
    .select(['s.name as siteName', 's.active as siteActive', 's.address', 's.postcode'])
    .select(['z.id', 'z.name', 'z.weekdays', 'z.cutOffTime', 'z.leadDays', 'z.deliveryChargeMinor'])
    .where('s.customerId', '=', sql<string>`any(${[...new Set(customerIds)]}::uuid[])`)
    .orderBy('s.name')
    .orderBy('s.id')
    .execute();
  return rows.map(({ id, name, weekdays, cutOffTime, leadDays, deliveryChargeMinor, ...site }) => ({
    ...site,
    zone:
      id !== null && name !== null && weekdays && cutOffTime && leadDays !== null && deliveryChargeMinor !== null
        ? { id, name, weekdays, cutOffTime, leadDays, deliveryChargeMinor: minorUnits(deliveryChargeMinor) }
        : null,
  }));
}

/** Lead days, and the cutting before a delivery, may reach back past the day itself. */
const BACK_DAYS = 60;

/** The days from two months before `day` on when the plant is closed. */
export async function closuresAround(tx: Tx, day: PlantDate): Promise<{ day: PlantDate; reason: string }[]> {
  const rows = await tx
    .selectFrom('plantClosures')
    .selectAll()
    .where('day', '>=', addDays(day, -BACK_DAYS))
    .orderBy('day')
    .execute();
  return rows.map(({ day: closed, reason }) => ({ day: closed as PlantDate, reason }));
}

/** The same without reasons: enough to count working days forward or back from `day`. */
export async function closuresFor(tx: Tx, day: PlantDate): Promise<Closures> {
  return new Set((await closuresAround(tx, day)).map((closure) => closure.day));
}
