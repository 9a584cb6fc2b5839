import { addPerson, hashPassword, setPasswordHash } from '@seamwright/identity/server';
import { isBuyerRole, type Role } from '@seamwright/shared/contracts';
import { inTransaction, system, type Caller, type Database } from '@seamwright/shared/server';
import { TEST_NOW } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';

export const PASSWORD = 'boned and rolled';
let passwordHash: Promise<string> | undefined;

export interface NamedPerson {
  readonly id: string;
  readonly email: string;
}

/** Somebody who can sign in with `PASSWORD`, unless they are only `invited`. */
export async function addSomebody(
  database: Database,
  role: Role,
  customerId: string | null,
  state: 'joined' | 'invited' = 'joined',
): Promise<NamedPerson> {
  const hash = await (passwordHash ??= hashPassword(PASSWORD, 8));
  const email = `${role.replace('_', '-')}.${newId()}@example.test`;
  const id = await inTransaction(database, system('seed'), async (tx) => {
    const reach = { sites: '*', customers: '*' } as const;
    const personId = await addPerson(tx, TEST_NOW, { email, name: `The ${role}`, customerId, roles: [role], ...reach });
    if (state === 'joined') await setPasswordHash(tx, personId, hash);
    return personId;
  });
  return { id, email };
}

/** Somebody new who calls in a role: a buyer for the customer, staff for these customers. */
export async function addCaller(
  database: Database,
  role: Role,
  customerId: string,
  customers: '*' | readonly string[] = '*',
): Promise<Caller> {
  const { id: personId } = await addSomebody(database, role, isBuyerRole(role) ? customerId : null);
  return isBuyerRole(role)
    ? { kind: 'user', personId, roles: [role], customerId, sites: '*' }
    : { kind: 'staff', personId, roles: [role], customers };
}
