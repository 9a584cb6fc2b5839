import { customersOf } from '@seamwright/identity/domain';
import { isBuyerRole, ROLES, type AnyEndpoint, type Role } from '@seamwright/shared/contracts';
import { anonymous, type Caller } from '@seamwright/shared/server';
import type { Row } from './row';
import type { World } from './testing/world';

/** Whose thing is asked for; `none` where it is no customer's. */
export type Whose = 'own' | 'other' | 'none';

export type Expected = 'done' | 'not-signed-in' | 'not-allowed' | 'hidden';

/** One call of the matrix and what has to come of it. */
export interface Case {
  readonly who: string;
  readonly caller: Caller;
  readonly whose: Whose;
  readonly expected: Expected;
}

interface Calling {
  readonly who: string;
  readonly caller: Caller;
  readonly role: Role | null;
  /** Whether the caller serves the customer whose thing it is. */
  readonly serves: Readonly<Record<Whose, boolean>>;
}

/** A buyer for the one customer, or staff: for all customers and, in a role that is kept to some, for one and for none. */
function callersIn(role: Role, { own, staff }: World): Calling[] {
  const ofOne = { own: true, other: false, none: true };
  if (isBuyerRole(role)) return [{ who: role, caller: role === 'buyer' ? own.buyer : own.owner, role, serves: ofOne }];
  const forAll = { own: true, other: true, none: true };
  const everybody: Calling = { who: `${role} for all`, caller: staff[role], role, serves: forAll };
  if (customersOf([role], [own.id]) === '*') return [everybody];
  const kept = (customers: readonly string[]): Caller => ({ ...staff[role], customers }) as Caller;
  return [
    everybody,
    { who: `${role} for one`, caller: kept([own.id]), role, serves: ofOne },
    { who: `${role} for none`, caller: kept([]), role, serves: { own: false, other: false, none: true } },
  ];
}

const NOBODY: Calling = {
  who: 'nobody',
  caller: anonymous,
  role: null,
  serves: { own: false, other: false, none: true },
};

const callersOf = (world: World): Calling[] => [NOBODY, ...ROLES.flatMap((role) => callersIn(role, world))];

function expectedOf({ access }: AnyEndpoint, { caller, role, serves }: Calling, whose: Whose): Expected {
  if (access.who === 'roles') {
    if (caller.kind === 'anonymous' || role === null) return 'not-signed-in';
    if (!access.roles.includes(role)) return 'not-allowed';
  }
  return serves[whose] ? 'done' : 'hidden';
}

/** Every call of an endpoint that the matrix makes, as its declaration says it has to end. */
export function casesOf(world: World, row: Row): Case[] {
  const asked: readonly Whose[] = row.belongsTo === 'customer' ? ['own', 'other'] : ['none'];
  const callers = callersOf(world).filter(
    ({ role, serves }) => role === null || serves.own || row.belongsTo !== 'caller' || !row.needsCustomer,
  );
  return callers.flatMap((calling) =>
    asked.map((whose) => ({
      who: calling.who,
      caller: calling.caller,
      whose,
      expected: expectedOf(row.endpoint, calling, whose),
    })),
  );
}
