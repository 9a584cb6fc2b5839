import type { Role } from '@seamwright/shared/contracts';

/** Who asks. Row-level security shows each of them their rows only. */
export type Caller =
  | { readonly kind: 'anonymous' }
  | {
      readonly kind: 'user';
      readonly personId: string;
      readonly roles: readonly Role[];
      readonly customerId: string;
      readonly sites: '*' | readonly string[];
    }
  | {
      readonly kind: 'staff';
      readonly personId: string;
      readonly roles: readonly Role[];
      readonly customers: '*' | readonly string[];
    }
  | { readonly kind: 'system'; readonly purpose: SystemPurpose };

export type SystemPurpose = 'sign-in' | 'refresh' | 'invitation' | 'webhook' | 'job' | 'seed' | 'number';

export const anonymous: Caller = { kind: 'anonymous' };
export const system = (purpose: SystemPurpose): Caller => ({ kind: 'system', purpose });

/** The person behind a caller, if it is one. */
export const personOf = (caller: Caller): string | null =>
  caller.kind === 'user' || caller.kind === 'staff' ? caller.personId : null;

export const rolesOf = (caller: Caller): readonly Role[] =>
  caller.kind === 'user' || caller.kind === 'staff' ? caller.roles : [];

/** The customers that a caller serves. */
export function customersOf(caller: Caller): '*' | readonly string[] {
  switch (caller.kind) {
    case 'anonymous':
      return [];
    case 'user':
      return [caller.customerId];
    case 'staff':
      return caller.customers;
    case 'system':
      return '*';
  }
}

const list = (ids: '*' | readonly string[]): string => (ids === '*' ? '*' : `{${ids.join(',')}}`);

/** The transaction's settings that the policies read (migration 0001). */
export function callerSettings(caller: Caller): Readonly<Record<string, string>> {
  switch (caller.kind) {
    case 'anonymous':
      return { caller: 'anonymous' };
    case 'user':
      return {
        caller: 'user',
        person_id: caller.personId,
        customers: list([caller.customerId]),
        sites: list(caller.sites),
      };
    case 'staff':
      return { caller: 'staff', person_id: caller.personId, customers: list(caller.customers), sites: '*' };
    case 'system':
      return { caller: 'system', purpose: caller.purpose, customers: '*', sites: '*' };
  }
}
