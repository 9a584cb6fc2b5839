import { isBuyer, type DeskRole } from './role';

/** Everything there is, or these by id. */
export type Reach = '*' | readonly string[];

/**
 * The customers whose rows a member of staff sees. Only a rep may be kept to some: whoever also has another role works
 * with everybody's orders.
 */
export function customersOf(roles: readonly DeskRole[], assigned: Reach): Reach {
  return roles.every((role) => role === 'rep') ? assigned : '*';
}

/** The sites that a buyer acts for; an account owner acts for all of them. */
export function siteRule(roles: readonly DeskRole[], kept: Reach): Reach {
  return isBuyer(roles) && !roles.includes('buyer_owner') ? kept : '*';
}
