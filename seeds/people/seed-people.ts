import {
  addPerson,
  addSite,
  createCustomer,
  createGroup,
  hashPassword,
  setPasswordHash,
} from '@seamwright/identity/server';
import type { Tx } from '@seamwright/shared/server';
import { buyerEmail, CUSTOMERS, GROUPS } from '../scenario/customers';
import { DEMO_PASSWORD, staffEmail } from '../scenario/plant';
import { STAFF } from '../scenario/staff';

/** Ids of what was loaded, by the scenario's keys. */
export interface SeededPeople {
  readonly customers: ReadonlyMap<string, string>;
  readonly sites: ReadonlyMap<string, string>;
  readonly people: ReadonlyMap<string, string>;
  readonly groups: ReadonlyMap<string, string>;
}

/** Opens the demo's accounts and adds its people, all with the demo's password. */
export async function seedPeople(tx: Tx, now: Date, argonMemoryKib: number): Promise<SeededPeople> {
  const passwordHash = await hashPassword(DEMO_PASSWORD, argonMemoryKib);
  const groups = new Map<string, string>();
  for (const name of GROUPS) groups.set(name, await createGroup(tx, name));

  const customers = new Map<string, string>();
  const sites = new Map<string, string>();
  const people = new Map<string, string>();
  for (const customer of CUSTOMERS) {
    const { key, name, kind, group, termsDays, termsFrom, billingAddress } = customer;
    const customerId = await createCustomer(tx, now, {
      name,
      kind,
      groupId: group === null ? null : (groups.get(group) ?? null),
      invoiceEmail: `accounts@${key}.example`,
      billingAddress,
      vatNumber: null,
      termsDays,
      termsFrom,
    });
    customers.set(key, customerId);
    for (const { key: siteKey, zone: _zone, ...facts } of customer.sites)
      sites.set(siteKey, await addSite(tx, customerId, facts));
    for (const buyer of customer.buyers) {
      const kept = buyer.sites?.map((siteKey) => sites.get(siteKey) ?? '') ?? '*';
      const id = await addPerson(tx, now, {
        email: buyerEmail(customer, buyer),
        name: buyer.name,
        roles: buyer.roles,
        customerId,
        sites: kept,
        customers: '*',
      });
      await setPasswordHash(tx, id, passwordHash);
      people.set(buyer.key, id);
    }
  }
  for (const { key, name, roles, customers: served } of STAFF) {
    const id = await addPerson(tx, now, {
      email: staffEmail(key),
      name,
      roles,
      customerId: null,
      sites: '*',
      customers: served?.map((each) => customers.get(each) ?? '') ?? '*',
    });
    await setPasswordHash(tx, id, passwordHash);
    people.set(key, id);
  }
  return { customers, sites, people, groups };
}
