import type { DeskRole } from './role';

/** Whoever looks after people: invites them, changes what they may do, ends their sessions. */
export interface Steward {
  readonly roles: readonly DeskRole[];
  /** Set for a buyer. */
  readonly customerId: string | null;
}

/**
 * Whether a steward may look after people of this customer (null: staff). Administrators look after everybody, reps
 * after buyers, account owners after their own colleagues. Which customers a rep serves is not asked here.
 */
export function mayLookAfter(steward: Steward, customerId: string | null): boolean {
  if (steward.roles.includes('admin')) return true;
  if (customerId === null) return false;
  if (steward.roles.includes('rep')) return true;
  return steward.roles.includes('buyer_owner') && steward.customerId === customerId;
}
