import { applicationOf, customersOf, siteRule, type Application, type Reach } from '@seamwright/identity/domain';
import type { Role } from '@seamwright/shared/contracts';
import type { Tx } from '@seamwright/shared/server';
import { personRows, reachOf } from './people.repository';

/** Somebody who may sign in, with all that their sign-in gives them. */
export interface SignedInPerson {
  readonly id: string;
  readonly rowVersion: number;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly customerId: string | null;
  readonly customerName: string | null;
  readonly sites: Reach;
  readonly customers: Reach;
  readonly application: Application;
}

export interface Credentials {
  readonly person: SignedInPerson;
  readonly passwordHash: string | null;
  /** False for a person, or a customer, who was made inactive. */
  readonly maySignIn: boolean;
}

export async function credentialsByEmail(tx: Tx, email: string): Promise<Credentials | null> {
  const row = await credentialRows(tx).where('p.email', '=', email).executeTakeFirst();
  return row ? credentialsOf(row) : null;
}

export async function credentialsById(tx: Tx, personId: string): Promise<Credentials | null> {
  const row = await credentialRows(tx).where('p.id', '=', personId).executeTakeFirst();
  return row ? credentialsOf(row) : null;
}

const credentialRows = (tx: Tx) => personRows(tx).select(['p.passwordHash', 'c.active as customerActive']);
type CredentialRow = Awaited<ReturnType<ReturnType<typeof credentialRows>['executeTakeFirstOrThrow']>>;

function credentialsOf(row: CredentialRow): Credentials {
  const roles = row.roles as Role[];
  return {
    person: {
      id: row.id,
      rowVersion: row.rowVersion,
      name: row.name,
      email: row.email,
      roles,
      customerId: row.customerId,
      customerName: row.customerName,
      sites: siteRule(roles, reachOf(row.allSites, row.siteIds)),
      customers: customersOf(roles, reachOf(row.allCustomers, row.customerIds)),
      application: applicationOf(roles),
    },
    passwordHash: row.passwordHash,
    maySignIn: row.active && row.customerActive !== false,
  };
}
