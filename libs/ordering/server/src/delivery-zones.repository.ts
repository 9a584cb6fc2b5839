import { sql } from 'kysely';
import type { DeliveryZoneWire } from '@seamwright/ordering/contracts';
import { notFound, stale, type Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

type ZoneFields = Omit<DeliveryZoneWire, 'id' | 'rowVersion' | 'sites'>;

const zones = (tx: Tx) =>
  tx
    .selectFrom('deliveryZones as z')
    .selectAll('z')
    .select((zone) =>
      zone
        .selectFrom('siteZones as sz')
        .select(sql<number>`count(*)`.as('count'))
        .whereRef('sz.zoneId', '=', 'z.id')
        .as('sites'),
    );

const present = <Row extends { sites: number | null }>(row: Row) => ({ ...row, sites: row.sites ?? 0 });

/** Every zone with the number of sites in it that the caller sees, by name. */
export async function zonesWithSites(tx: Tx): Promise<DeliveryZoneWire[]> {
  return (await zones(tx).orderBy('z.name').execute()).map(present);
}

/** Throws `not-found`. */
export async function zoneById(tx: Tx, id: string): Promise<DeliveryZoneWire> {
  const row = await zones(tx).where('z.id', '=', id).executeTakeFirst();
  if (!row) throw notFound();
  return present(row);
}

const sorted = (fields: ZoneFields): ZoneFields => ({
  ...fields,
  weekdays: [...fields.weekdays].sort((a, b) => a - b),
});

export async function insertZone(tx: Tx, fields: ZoneFields): Promise<string> {
  const id = newId<'DeliveryZone'>();
  await tx
    .insertInto('deliveryZones')
    .values({ id, ...sorted(fields) })
    .execute();
  return id;
}

/** Throws `not-found`, or `stale` when somebody changed the zone since it was read. */
export async function changeDeliveryZone(
  tx: Tx,
  id: string,
  rowVersion: number,
  fields: ZoneFields,
): Promise<DeliveryZoneWire> {
  await zoneById(tx, id);
  const { numUpdatedRows } = await tx
    .updateTable('deliveryZones')
    .set({ ...sorted(fields), rowVersion: sql`row_version + 1` })
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (numUpdatedRows === 0n) throw stale();
  return zoneById(tx, id);
}
