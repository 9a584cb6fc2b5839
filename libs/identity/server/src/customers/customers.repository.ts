import { sql } from 'kysely';
import type { CustomerFacts } from '@seamwright/identity/contracts';
import type { Customer, CustomerKind, TermsFrom } from '@seamwright/identity/domain';
import { notFound, stale, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { likePattern } from '../like-pattern';

/** A customer with the name of its group. */
export interface CustomerRecord extends Customer {
  readonly groupName: string | null;
}

const rows = (tx: Tx) =>
  tx
    .selectFrom('customers as c')
    .leftJoin('customerGroups as g', 'g.id', 'c.groupId')
    .select([
      'c.id',
      'c.rowVersion',
      'c.number',
      'c.name',
      'c.kind',
      'c.groupId',
      'c.invoiceEmail',
      'c.billingAddress',
      'c.vatNumber',
      'c.termsDays',
      'c.termsFrom',
      'c.active',
      'g.name as groupName',
      sql<string>`lower(c.name)`.as('sortName'),
    ]);
type Row = Awaited<ReturnType<ReturnType<typeof rows>['executeTakeFirstOrThrow']>>;

export const customerOf = ({ sortName: _sortName, kind, termsFrom, ...row }: Row): CustomerRecord => ({
  ...row,
  kind: kind as CustomerKind,
  termsFrom: termsFrom as TermsFrom,
});

/** Throws `not-found` for a customer whom the caller may not see. */
export async function customerById(tx: Tx, customerId: string): Promise<CustomerRecord> {
  const row = await rows(tx).where('c.id', '=', customerId).executeTakeFirst();
  if (!row) throw notFound();
  return customerOf(row);
}

/** Customers by the names asked for, without regard to case; more than one where several bear the name. */
export async function customersByNames(
  tx: Tx,
  names: readonly string[],
): Promise<ReadonlyMap<string, readonly CustomerRecord[]>> {
  const asked = new Map(names.map((name) => [name, name.trim().toLowerCase()]));
  if (asked.size === 0) return new Map();
  const found = await rows(tx)
    .where(sql<boolean>`lower(c.name) = any (${[...asked.values()]}::text[])`)
    .orderBy('c.number')
    .execute();
  return new Map([...asked].map(([name, key]) => [name, found.filter((row) => row.sortName === key).map(customerOf)]));
}

export interface CustomersQuestion {
  readonly q?: string | undefined;
  readonly kind?: CustomerKind | undefined;
  readonly after: readonly [name: string, id: string] | null;
  readonly limit: number;
}

/** Customers by name, one more than the limit. The search looks at names and numbers. */
export function customersPage(tx: Tx, { q, kind, after, limit }: CustomersQuestion): Promise<Row[]> {
  let query = rows(tx);
  if (kind) query = query.where('c.kind', '=', kind);
  if (q) {
    const pattern = likePattern(q);
    query = query.where(sql<boolean>`(c.name ilike ${pattern} or c.number::text ilike ${pattern})`);
  }
  if (after) query = query.where(sql<boolean>`(lower(c.name), c.id) > (${after[0]}, ${after[1]}::uuid)`);
  return query
    .orderBy('sortName')
    .orderBy('c.id')
    .limit(limit + 1)
    .execute();
}

/** Opens an account. Refuses with `group-unknown`. Gives the id. */
export async function createCustomer(tx: Tx, now: Date, facts: CustomerFacts): Promise<string> {
  await knownGroup(tx, facts.groupId);
  const id: string = newId();
  await tx
    .insertInto('customers')
    .values({ id, ...facts, createdAt: now })
    .execute();
  return id;
}

/** Changes a customer that was read at this row version; throws `stale` when there is a newer one. */
export async function changeCustomer(
  tx: Tx,
  customerId: string,
  rowVersion: number,
  facts: CustomerFacts & { readonly active: boolean },
): Promise<void> {
  await knownGroup(tx, facts.groupId);
  const changed = await tx
    .updateTable('customers')
    .set({ ...facts, rowVersion: rowVersion + 1 })
    .where('id', '=', customerId)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (changed.numUpdatedRows !== 1n) throw stale();
}

async function knownGroup(tx: Tx, groupId: string | null): Promise<void> {
  if (groupId === null) return;
  const found = await tx.selectFrom('customerGroups').select('id').where('id', '=', groupId).executeTakeFirst();
  if (!found) throw new RefusalError({ code: 'group-unknown', params: {}, pointer: '/groupId' });
}

export interface CustomerGroup {
  readonly id: string;
  readonly name: string;
}

export const customerGroups = (tx: Tx): Promise<CustomerGroup[]> =>
  tx.selectFrom('customerGroups').select(['id', 'name']).orderBy('name').orderBy('id').execute();

export const groupById = (tx: Tx, id: string): Promise<CustomerGroup> =>
  tx.selectFrom('customerGroups').select(['id', 'name']).where('id', '=', id).executeTakeFirstOrThrow(notFound);

/** Names a new group; refuses with `already-there` a name that is taken. Gives the id. */
export async function createGroup(tx: Tx, name: string): Promise<string> {
  const id: string = newId();
  await tx.insertInto('customerGroups').values({ id, name }).execute();
  return id;
}
