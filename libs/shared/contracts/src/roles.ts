/** Who a person is to the desk; a person may hold several staff roles. */
export const ROLES = ['buyer', 'buyer_owner', 'rep', 'technical', 'planner', 'floor', 'accounts', 'admin'] as const;
export type Role = (typeof ROLES)[number];

export const BUYER_ROLES = ['buyer', 'buyer_owner'] as const satisfies readonly Role[];
export const STAFF_ROLES = [
  'rep',
  'technical',
  'planner',
  'floor',
  'accounts',
  'admin',
] as const satisfies readonly Role[];

export const isBuyerRole = (role: Role): boolean => (BUYER_ROLES as readonly Role[]).includes(role);
