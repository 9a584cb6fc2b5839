import { sql } from 'kysely';
import type { Person, PersonState, Reach, Standing } from '@seamwright/identity/domain';
import type { Role } from '@seamwright/shared/contracts';
import { notFound, stale, violates, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { likePattern } from '../like-pattern';

/** A person with what administrators are shown beside it. */
export interface PersonRecord extends Person {
  readonly roles: readonly Role[];
  readonly customerName: string | null;
  readonly lastSeenAt: Date | null;
}

export const reachOf = (all: boolean, ids: string[]): Reach => (all ? '*' : ids);

/** People with their customer's name and the ids that they are kept to. */
export const personRows = (tx: Tx) =>
  tx
    .selectFrom('people as p')
    .leftJoin('customers as c', 'c.id', 'p.customerId')
    .select([
      'p.id',
      'p.rowVersion',
      'p.email',
      'p.name',
      'p.customerId',
      'p.roles',
      'p.allSites',
      'p.allCustomers',
      'p.active',
      'c.name as customerName',
      sql<string[]>`array(
        select ps.site_id::text from person_sites ps where ps.person_id = p.id order by 1)`.as('siteIds'),
      sql<string[]>`array(
        select sc.customer_id::text from staff_customers sc where sc.person_id = p.id order by 1)`.as('customerIds'),
    ]);

const recordRows = (tx: Tx) =>
  personRows(tx).select([
    sql<boolean>`p.password_hash is not null`.as('joined'),
    sql<string>`lower(p.name)`.as('sortName'),
    sql<Date | null>`(select max(s.last_used_at) from sign_in_sessions s where s.person_id = p.id)`.as('lastSeenAt'),
  ]);
type RecordRow = Awaited<ReturnType<ReturnType<typeof recordRows>['executeTakeFirstOrThrow']>>;

const stateOf = (active: boolean, joined: boolean): PersonState =>
  !active ? 'inactive' : joined ? 'active' : 'invited';

export const recordOf = (row: RecordRow): PersonRecord => ({
  id: row.id,
  rowVersion: row.rowVersion,
  email: row.email,
  name: row.name,
  roles: row.roles as Role[],
  customerId: row.customerId,
  customerName: row.customerName,
  sites: reachOf(row.allSites, row.siteIds),
  customers: reachOf(row.allCustomers, row.customerIds),
  state: stateOf(row.active, row.joined),
  lastSeenAt: row.lastSeenAt,
});

/** Throws `not-found` for a person whom the caller may not see. */
export async function personById(tx: Tx, personId: string): Promise<PersonRecord> {
  const row = await recordRows(tx).where('p.id', '=', personId).executeTakeFirst();
  if (!row) throw notFound();
  return recordOf(row);
}

/** Active staff who hold a role, by name. */
export async function staffWithRole(tx: Tx, role: Role): Promise<PersonRecord[]> {
  const rows = await recordRows(tx)
    .where('p.customerId', 'is', null)
    .where('p.active', '=', true)
    .where(sql<boolean>`${role} = any (p.roles)`)
    .orderBy('sortName')
    .orderBy('p.id')
    .execute();
  return rows.map(recordOf);
}

export interface PeopleQuestion {
  readonly customerId?: string | undefined;
  readonly who?: 'staff' | 'buyers' | undefined;
  readonly q?: string | undefined;
  readonly after: readonly [name: string, id: string] | null;
  readonly limit: number;
}

/** People by name, one more than the limit. */
export function peoplePage(tx: Tx, { customerId, who, q, after, limit }: PeopleQuestion): Promise<RecordRow[]> {
  let query = recordRows(tx);
  if (customerId) query = query.where('p.customerId', '=', customerId);
  if (who) query = query.where('p.customerId', who === 'staff' ? 'is' : 'is not', null);
  if (q) {
    const pattern = likePattern(q);
    query = query.where((eb) => eb.or([eb('p.name', 'ilike', pattern), eb('p.email', 'ilike', pattern)]));
  }
  if (after) query = query.where(sql<boolean>`(lower(p.name), p.id) > (${after[0]}, ${after[1]}::uuid)`);
  return query
    .orderBy('sortName')
    .orderBy('p.id')
    .limit(limit + 1)
    .execute();
}

export interface NewPerson extends Standing {
  readonly email: string;
  readonly name: string;
  readonly roles: readonly Role[];
}

/** Adds a person without a password. Refuses with `email-taken`. The e-mail is kept as given: normalise it before. */
export async function insertPerson(tx: Tx, now: Date, person: NewPerson): Promise<string> {
  const id: string = newId();
  const { email, name, customerId, roles, sites, customers } = person;
  try {
    await tx
      .insertInto('people')
      .values({
        id,
        email,
        name,
        customerId,
        roles: [...roles],
        allSites: sites === '*',
        allCustomers: customers === '*',
        createdAt: now,
      })
      .execute();
  } catch (error) {
    if (violates(error, 'people_email')) throw new RefusalError({ code: 'email-taken', params: {}, pointer: '/email' });
    throw error;
  }
  await keepTo(tx, id, person);
  return id;
}

export interface PersonChange extends Standing {
  readonly name: string;
  readonly active: boolean;
}

/** Changes a person who was read at this row version; throws `stale` when there is a newer one. */
export async function changePersonRow(
  tx: Tx,
  personId: string,
  rowVersion: number,
  change: PersonChange,
): Promise<void> {
  const { name, roles, active, sites, customers } = change;
  const changed = await tx
    .updateTable('people')
    .set({
      name,
      roles: [...roles],
      active,
      allSites: sites === '*',
      allCustomers: customers === '*',
      rowVersion: rowVersion + 1,
    })
    .where('id', '=', personId)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (changed.numUpdatedRows !== 1n) throw stale();
  await keepTo(tx, personId, change);
}

export async function renamePerson(tx: Tx, personId: string, rowVersion: number, name: string): Promise<void> {
  const changed = await tx
    .updateTable('people')
    .set({ name, rowVersion: rowVersion + 1 })
    .where('id', '=', personId)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (changed.numUpdatedRows !== 1n) throw stale();
}

/** Writes the sites and customers that a person is kept to; refuses those that don't exist or belong elsewhere. */
async function keepTo(tx: Tx, personId: string, { customerId, sites, customers }: Standing): Promise<void> {
  const siteIds = sites === '*' ? [] : [...new Set(sites)];
  await tx.deleteFrom('personSites').where('personId', '=', personId).where(notIn('site_id', siteIds)).execute();
  if (customerId !== null && siteIds.length > 0) {
    const known = await tx
      .selectFrom('sites')
      .select('id')
      .where('customerId', '=', customerId)
      .where('id', 'in', siteIds)
      .execute();
    if (known.length < siteIds.length) throw unknown('site-unknown', '/sites');
    await tx
      .insertInto('personSites')
      .values(siteIds.map((siteId) => ({ personId, customerId, siteId })))
      .onConflict((conflict) => conflict.doNothing())
      .execute();
  }
  const customerIds = customers === '*' ? [] : [...new Set(customers)];
  await tx
    .deleteFrom('staffCustomers')
    .where('personId', '=', personId)
    .where(notIn('customer_id', customerIds))
    .execute();
  if (customerIds.length > 0) {
    const known = await tx.selectFrom('customers').select('id').where('id', 'in', customerIds).execute();
    if (known.length < customerIds.length) throw unknown('customer-unknown', '/customers');
    await tx
      .insertInto('staffCustomers')
      .values(customerIds.map((each) => ({ personId, customerId: each })))
      .onConflict((conflict) => conflict.doNothing())
      .execute();
  }
}

const notIn = (column: string, ids: string[]) => sql<boolean>`not (${sql.ref(column)} = any (${ids}::uuid[]))`;
const unknown = (code: string, pointer: string) => new RefusalError({ code, params: {}, pointer });

/** Sets the password by its hash. */
export async function setPasswordHash(tx: Tx, personId: string, passwordHash: string): Promise<void> {
  await tx.updateTable('people').set({ passwordHash }).where('id', '=', personId).execute();
}
