import { siteRule } from '@seamwright/identity/domain';
import type { Role } from '@seamwright/shared/contracts';
import type { Tx } from '@seamwright/shared/server';
import { personRows, reachOf } from './people.repository';

/** Somebody whom a mail can be written to. */
export interface Addressee {
  readonly id: string;
  readonly name: string;
  readonly email: string;
}

/** Active people who buy for a customer, by name; of one of its sites, those who act for that. */
export async function buyersOf(tx: Tx, customerId: string, siteId?: string): Promise<Addressee[]> {
  const rows = await personRows(tx)
    .where('p.customerId', '=', customerId)
    .where('p.active', '=', true)
    .orderBy('p.name')
    .orderBy('p.id')
    .execute();
  return rows
    .filter(({ roles, allSites, siteIds }) => {
      const sites = siteRule(roles as Role[], reachOf(allSites, siteIds));
      return siteId === undefined || sites === '*' || sites.includes(siteId);
    })
    .map(({ id, name, email }) => ({ id, name, email }));
}
