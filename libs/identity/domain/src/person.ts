import type { Reach } from './reach';
import type { DeskRole } from './role';

/** Invited: has not set a password yet. Inactive: may not sign in any more. */
export type PersonState = 'invited' | 'active' | 'inactive';

/** Somebody who signs in: a buyer of one customer, or staff. */
export interface Person {
  readonly id: string;
  readonly rowVersion: number;
  readonly email: string;
  readonly name: string;
  readonly roles: readonly DeskRole[];
  /** The customer that a buyer buys for; null for staff. */
  readonly customerId: string | null;
  /** The sites that a buyer is kept to. */
  readonly sites: Reach;
  /** The customers that a rep serves. */
  readonly customers: Reach;
  readonly state: PersonState;
}
