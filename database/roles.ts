import { createHash } from 'node:crypto';
import { Client } from 'pg';

export const OWNER_ROLE = 'seamwright_owner';
export const APP_ROLE = 'seamwright_app';
export const WORKER_ROLE = 'seamwright_worker';

export interface RoleUrls {
  readonly ownerUrl: string;
  readonly appUrl: string;
  readonly workerUrl: string;
}

/** The password of a role, derived from the administrator's own, so that it need not be kept anywhere. */
function passwordOf(role: string, adminUrl: URL): string {
  return createHash('sha256').update(`${role}:${adminUrl.username}:${adminUrl.password}`).digest('hex').slice(0, 40);
}

function urlFor(role: string, adminUrl: URL, database: string): string {
  const url = new URL(adminUrl);
  url.username = role;
  url.password = passwordOf(role, adminUrl);
  url.pathname = `/${database}`;
  return url.toString();
}

export function roleUrls(adminUrl: string, database: string): RoleUrls {
  const url = new URL(adminUrl);
  return {
    ownerUrl: urlFor(OWNER_ROLE, url, database),
    appUrl: urlFor(APP_ROLE, url, database),
    workerUrl: urlFor(WORKER_ROLE, url, database),
  };
}

/**
 * What an administrator may run by hand where `adminUrl` has no right to create roles and databases. The passwords are
 * the ones that the program derives from that address.
 */
export function adminSql(adminUrl: string, database: string): string {
  const url = new URL(adminUrl);
  return [OWNER_ROLE, APP_ROLE, WORKER_ROLE]
    .map((role) => `create role ${role} login nosuperuser nobypassrls password '${passwordOf(role, url)}';`)
    .concat(`grant ${OWNER_ROLE} to ${quoted(url.username)};`)
    .concat(`create database ${quoted(database)} owner ${OWNER_ROLE} encoding 'UTF8' template template0;`)
    .concat(
      `\\connect ${quoted(database)}`,
      'create extension if not exists btree_gist;',
      'create extension if not exists pg_trgm;',
      `alter schema public owner to ${OWNER_ROLE};`,
    )
    .join('\n');
}

/** Creates the three roles with their passwords; the two that serve can't bypass row-level security. */
export async function ensureRoles(adminUrl: string): Promise<void> {
  const url = new URL(adminUrl);
  await withClient(adminUrl, async (client) => {
    for (const role of [OWNER_ROLE, APP_ROLE, WORKER_ROLE]) {
      const known = await client.query('select 1 from pg_roles where rolname = $1', [role]);
      // An administrator who is no superuser may set a password, but not say again what a role may not do.
      const verb = known.rowCount ? `alter role ${role}` : `create role ${role} login nosuperuser nobypassrls`;
      const statement = `${verb} password '${passwordOf(role, url)}'`;
      if (known.rowCount) await unlessForbidden(client, statement);
      else await client.query(statement);
    }
    // The owner must be grantable to the administrator for `create database … owner` without superuser rights.
    await unlessForbidden(client, `grant ${OWNER_ROLE} to current_user`);
  });
}

const INSUFFICIENT_PRIVILEGE = '42501';

/** For what an administrator may have done by hand already (see adminSql), where this connection has no right to. */
async function unlessForbidden(client: Client, statement: string): Promise<void> {
  await client.query(statement).catch((error: Error & { code?: string }) => {
    if (error.code !== INSUFFICIENT_PRIVILEGE) throw error;
  });
}

/** Creates the database when it is missing; true when it was made. */
export async function ensureDatabase(adminUrl: string, database: string): Promise<boolean> {
  const made = await withClient(adminUrl, async (client) => {
    const known = await client.query('select 1 from pg_database where datname = $1', [database]);
    if (known.rowCount) return false;
    await client.query(`create database ${quoted(database)} owner ${OWNER_ROLE} encoding 'UTF8' template template0`);
    return true;
  });
  const inside = new URL(adminUrl);
  inside.pathname = `/${database}`;
  await withClient(inside.toString(), async (client) => {
    await client.query('create extension if not exists btree_gist; create extension if not exists pg_trgm');
    await unlessForbidden(client, `alter schema public owner to ${OWNER_ROLE}`);
  });
  return made;
}

export async function dropDatabase(adminUrl: string, database: string): Promise<void> {
  await withClient(adminUrl, (client) => client.query(`drop database if exists ${quoted(database)} with (force)`));
}

export function quoted(name: string): string {
  return `"${name.replaceAll('"', '""')}"`;
}

export async function withClient<T>(url: string, work: (client: Client) => Promise<T>): Promise<T> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}
