import type { BuyerRole, DeskRole, PersonState, StaffRole } from '@seamwright/identity/domain';

interface RoleWords {
  readonly label: string;
  readonly help: string;
}

const BUYERS: Readonly<Record<BuyerRole, RoleWords>> = {
  buyer: { label: $localize`Buyer`, help: $localize`finds cuts and orders` },
  buyer_owner: {
    label: $localize`Account owner`,
    help: $localize`orders, invites colleagues and looks after addresses`,
  },
};

const STAFF: Readonly<Record<StaffRole, RoleWords>> = {
  rep: { label: $localize`Rep`, help: $localize`quotes prices and takes orders for customers` },
  technical: { label: $localize`Technical`, help: $localize`writes and approves specifications` },
  planner: { label: $localize`Planner`, help: $localize`closes the day and plans the cutting` },
  floor: { label: $localize`Floor`, help: $localize`cuts, weighs and packs` },
  accounts: { label: $localize`Accounts`, help: $localize`invoices, payments and customers’ terms` },
  admin: { label: $localize`Administrator`, help: $localize`people, roles and settings` },
};

const WORDS: Readonly<Record<DeskRole, RoleWords>> = { ...BUYERS, ...STAFF };

const STATES: Readonly<Record<PersonState, string>> = {
  invited: $localize`Invited`,
  active: $localize`Active`,
  inactive: $localize`Inactive`,
};

export const roleName = (role: DeskRole): string => WORDS[role].label;
export const personStateName = (state: PersonState): string => STATES[state];
export const personStateTone = (state: PersonState): 'ok' | 'eye' | 'plain' =>
  state === 'active' ? 'ok' : state === 'invited' ? 'eye' : 'plain';

/** The roles that somebody can be given, of the staff or of a customer's people. */
export const roleNames = (of: 'staff' | 'buyers'): readonly (RoleWords & { readonly value: DeskRole })[] =>
  Object.entries<RoleWords>(of === 'staff' ? STAFF : BUYERS).map(([value, words]) => ({
    value: value as DeskRole,
    ...words,
  }));
