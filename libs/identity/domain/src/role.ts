export type BuyerRole = 'buyer' | 'buyer_owner';
export type StaffRole = 'rep' | 'technical' | 'planner' | 'floor' | 'accounts' | 'admin';
export type DeskRole = BuyerRole | StaffRole;

/** The application that a person uses: buyers shop, staff work at the desk. */
export type Application = 'storefront' | 'admin';

/** Whether any of the roles is a buyer's. A person is a buyer or staff, never both. */
export const isBuyer = (roles: readonly DeskRole[]): boolean =>
  roles.includes('buyer') || roles.includes('buyer_owner');

export const applicationOf = (roles: readonly DeskRole[]): Application => (isBuyer(roles) ? 'storefront' : 'admin');
