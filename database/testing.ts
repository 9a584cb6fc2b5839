import { createHash } from 'node:crypto';
import { migrateToHead } from './migrate';
import { MIGRATIONS } from './migrations';
import { dropDatabase, ensureDatabase, ensureRoles, quoted, roleUrls, withClient, type RoleUrls } from './roles';

export interface TestDatabase extends RoleUrls {
  readonly name: string;
  drop(): Promise<void>;
}

function adminUrl(): string {
  const url = process.env['SEAMWRIGHT_TEST_ADMIN_URL'];
  if (!url)
    throw new Error('SEAMWRIGHT_TEST_ADMIN_URL is not set: run these tests by `npm test`, or see DEVELOPERS.md.');
  return url;
}

/** The template's name follows from the migrations, so that a changed step makes a new one. */
function templateName(): string {
  const hash = createHash('sha256').update(JSON.stringify(MIGRATIONS)).digest('hex').slice(0, 12);
  return `seamwright_template_${hash}`;
}

/** Makes the migrated template once for all spec files; a lock keeps two processes from making it twice. */
async function ensureTemplate(): Promise<string> {
  const name = templateName();
  await withClient(adminUrl(), async (client) => {
    await client.query(`select pg_advisory_lock(hashtext('seamwright test template'))`);
    const ready = await client.query('select 1 from pg_database where datname = $1 and datistemplate', [name]);
    if (ready.rowCount) return;
    await ensureRoles(adminUrl());
    await dropDatabase(adminUrl(), name);
    await ensureDatabase(adminUrl(), name);
    await migrateToHead(roleUrls(adminUrl(), name).ownerUrl);
    await client.query(`alter database ${quoted(name)} is_template true`);
  });
  return name;
}

let count = 0;

/** A fresh, migrated, empty database of its own for one spec file. Call `drop` when done. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const template = await ensureTemplate();
  const name = `seamwright_spec_${process.pid}_${process.env['JEST_WORKER_ID'] ?? '0'}_${++count}_${Date.now().toString(36)}`;
  await withClient(adminUrl(), (client) =>
    client.query(`create database ${quoted(name)} template ${quoted(template)}`),
  );
  return { name, ...roleUrls(adminUrl(), name), drop: () => dropDatabase(adminUrl(), name) };
}
