import { ok, refuse, type Result } from '@seamwright/shared/util';
import type { Reach } from './reach';
import { isBuyer, type DeskRole } from './role';

/** What a person is to the desk. */
export interface Standing {
  readonly customerId: string | null;
  readonly roles: readonly DeskRole[];
  readonly sites: Reach;
  readonly customers: Reach;
}

/**
 * Checks that a standing makes sense: buyers belong to one customer and staff to none, only a plain buyer is kept to
 * sites, only a rep to customers. Refuses with `roles-missing`, `roles-need-customer`, `roles-of-staff`,
 * `sites-not-kept`, `sites-missing` or `customers-not-kept`.
 */
export function checkStanding<S extends Standing>(standing: S): Result<S> {
  const { customerId, roles, sites, customers } = standing;
  if (roles.length === 0) return refuse('roles-missing', {}, '/roles');
  const buyers = roles.filter((role) => isBuyer([role])).length;
  if (customerId === null && buyers > 0) return refuse('roles-need-customer', {}, '/roles');
  if (customerId !== null && buyers < roles.length) return refuse('roles-of-staff', {}, '/roles');
  if (sites !== '*') {
    if (customerId === null || roles.includes('buyer_owner')) return refuse('sites-not-kept', {}, '/sites');
    if (sites.length === 0) return refuse('sites-missing', {}, '/sites');
  }
  if (customers !== '*' && roles.some((role) => role !== 'rep')) return refuse('customers-not-kept', {}, '/customers');
  return ok(standing);
}
