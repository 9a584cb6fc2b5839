import { withClient } from './roles';
import { MIGRATIONS } from './migrations';
import { ensureQueues } from './queues';

/** Names of the migrations that the database has, oldest first; empty before the first. */
export async function appliedMigrations(url: string): Promise<string[]> {
  return withClient(url, async (client) => {
    const table = await client.query(`select to_regclass('schema_migrations') as found`);
    if (!table.rows[0].found) return [];
    const rows = await client.query('select name from schema_migrations order by name');
    return rows.rows.map((row: { name: string }) => row.name);
  });
}

/**
 * Brings a database to the head of the static list, each migration in a transaction of its own.
 * Refuses a database that has steps this program does not know (it belongs to a newer release).
 */
export async function migrateToHead(ownerUrl: string): Promise<string[]> {
  const made = await withClient(ownerUrl, async (client) => {
    await client.query(`set client_min_messages = warning`);
    await client.query(
      `create table if not exists schema_migrations (name text primary key, applied_at timestamptz not null default clock_timestamp());
       grant select on schema_migrations to seamwright_app, seamwright_worker`,
    );
    await client.query(`select pg_advisory_lock(hashtext('seamwright migrations'))`);
    const rows = await client.query('select name from schema_migrations');
    const applied = new Set(rows.rows.map((row: { name: string }) => row.name));
    const known = new Set(MIGRATIONS.map((migration) => migration.name));
    const foreign = [...applied].filter((name) => !known.has(name));
    if (foreign.length > 0) throw new Error(`The database is newer than this program: it has ${foreign.join(', ')}.`);
    const made: string[] = [];
    for (const migration of MIGRATIONS.filter(({ name }) => !applied.has(name))) {
      await client.query('begin');
      try {
        await client.query(migration.sql);
        await client.query('insert into schema_migrations (name) values ($1)', [migration.name]);
        await client.query('commit');
      } catch (error) {
        await client.query('rollback');
        throw new Error(`Migration ${migration.name} failed: ${(error as Error).message}`, { cause: error });
      }
      made.push(migration.name);
    }
    return made;
  });
  await ensureQueues(ownerUrl);
  return made;
}
