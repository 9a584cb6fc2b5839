import { sql } from 'kysely';
import type { SiteZoneWire } from '@seamwright/ordering/contracts';
import { notFound, stale, violates, type Tx } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';

/** The sites of a customer with the zone each is delivered in, by name. */
export async function siteZonesOf(tx: Tx, customerId: string): Promise<SiteZoneWire[]> {
  const rows = await tx
    .selectFrom('sites as s')
    .leftJoin('siteZones as sz', 'sz.siteId', 's.id')
    .select(['s.id as siteId', 's.name as siteName', 'sz.zoneId', 'sz.rowVersion'])
    .where('s.customerId', '=', customerId)
    .orderBy('s.name')
    .orderBy('s.id')
    .execute();
  return rows.map((row) => ({ ...row, rowVersion: row.rowVersion ?? 0 }));
}

export interface SiteZoneDeed {
  readonly customerId: string;
  readonly siteId: string;
  readonly zoneId: string;
  /** The one that was read; 0 while the site had no zone. */
  readonly rowVersion: number;
}

/** Throws `not-found` for another customer's site, `zone-unknown`, or `stale`. */
export async function putSiteInZone(
  tx: Tx,
  { customerId, siteId, zoneId, rowVersion }: SiteZoneDeed,
): Promise<SiteZoneWire> {
  const before = (await siteZonesOf(tx, customerId)).find((site) => site.siteId === siteId);
  if (!before) throw notFound();
  if (before.rowVersion !== rowVersion) throw stale();
  const { numInsertedOrUpdatedRows } = await tx
    .insertInto('siteZones')
    .values({ customerId, siteId, zoneId })
    .onConflict((conflict) =>
      conflict
        .column('siteId')
        .doUpdateSet({ zoneId, rowVersion: sql`site_zones.row_version + 1` })
        .where('siteZones.rowVersion', '=', rowVersion),
    )
    .executeTakeFirst()
    .catch((error: unknown) => {
      if (violates(error, 'site_zones_zone_id_fkey'))
        throw new RefusalError({ code: 'zone-unknown', params: {}, pointer: '/zoneId' });
      throw error;
    });
  if (numInsertedOrUpdatedRows === 0n) throw stale();
  return { ...before, zoneId, rowVersion: rowVersion + 1 };
}
