import type { SiteFacts } from '@seamwright/identity/contracts';
import type { Site } from '@seamwright/identity/domain';
import { notFound, stale, type Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

const rows = (tx: Tx) =>
  tx
    .selectFrom('sites')
    .select([
      'id',
      'rowVersion',
      'customerId',
      'name',
      'address',
      'postcode',
      'contactName',
      'phone',
      'accessNotes',
      'active',
    ]);

/** The sites of a customer that the caller acts for, by name. */
export const sitesOf = (tx: Tx, customerId: string): Promise<Site[]> =>
  rows(tx).where('customerId', '=', customerId).orderBy('name').orderBy('id').execute();

/** Throws `not-found` for a site of another customer, or one that the caller does not act for. */
export const siteById = (tx: Tx, customerId: string, siteId: string): Promise<Site> =>
  rows(tx).where('customerId', '=', customerId).where('id', '=', siteId).executeTakeFirstOrThrow(notFound);

export const siteByItsId = (tx: Tx, siteId: string): Promise<Site> =>
  rows(tx).where('id', '=', siteId).executeTakeFirstOrThrow(notFound);

/** Adds a place to deliver to. Gives the id. */
export async function addSite(tx: Tx, customerId: string, facts: SiteFacts): Promise<string> {
  const id: string = newId();
  await tx
    .insertInto('sites')
    .values({ id, customerId, ...facts })
    .execute();
  return id;
}

/** Changes a site that was read at this row version; throws `stale` when there is a newer one. */
export async function changeSite(
  tx: Tx,
  customerId: string,
  siteId: string,
  rowVersion: number,
  facts: SiteFacts & { readonly active: boolean },
): Promise<void> {
  const changed = await tx
    .updateTable('sites')
    .set({ ...facts, rowVersion: rowVersion + 1 })
    .where('customerId', '=', customerId)
    .where('id', '=', siteId)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (changed.numUpdatedRows !== 1n) throw stale();
}
