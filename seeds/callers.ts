import type { Caller } from '@seamwright/shared/server';
import type { SeededPeople } from './people/seed-people';
import { CUSTOMERS } from './scenario/customers';
import { STAFF } from './scenario/staff';

/** The demo's people as callers, by their keys. */
export function callersOf({ people, customers, sites }: SeededPeople): ReadonlyMap<string, Caller> {
  const staff = STAFF.map(({ key, roles, customers: served }): [string, Caller] => [
    key,
    {
      kind: 'staff',
      personId: people.get(key) ?? '',
      roles,
      customers: served?.map((each) => customers.get(each) ?? '') ?? '*',
    },
  ]);
  const buyers = CUSTOMERS.flatMap((customer) =>
    customer.buyers.map((buyer): [string, Caller] => [
      buyer.key,
      {
        kind: 'user',
        personId: people.get(buyer.key) ?? '',
        roles: buyer.roles,
        customerId: customers.get(customer.key) ?? '',
        sites: buyer.sites?.map((each) => sites.get(each) ?? '') ?? '*',
      },
    ]),
  );
  return new Map([...staff, ...buyers]);
}
