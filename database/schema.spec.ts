import { readFileSync, rmSync } from 'node:fs';
import { spawnSync } from 'node:child_process';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { typesArguments } from './cli';
import { MIGRATIONS } from './migrations';
import { migrateToHead } from './migrate';
import { withClient } from './roles';
import { createTestDatabase, type TestDatabase } from './testing';

describe('the schema', () => {
  let database: TestDatabase;
  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(() => database.drop());

  const ask = <Row>(sql: string): Promise<Row[]> =>
    withClient(database.ownerUrl, async (client) => (await client.query(sql)).rows as Row[]);

  it('has the types that the program was compiled against', () => {
    const file = join(tmpdir(), `seamwright-schema-${process.pid}.ts`);
    const run = spawnSync('node_modules/.bin/kysely-codegen', typesArguments(database.ownerUrl, file), {
      encoding: 'utf8',
    });
    expect(run.status).toBe(0);
    const generated = readFileSync(file, 'utf8');
    rmSync(file);
    expect(readFileSync('database/schema.ts', 'utf8')).toBe(generated);
  }, 30_000);

  it('numbers its migrations without a gap, one name each', () => {
    expect(MIGRATIONS.map(({ name }) => name.slice(0, 4))).toEqual(
      MIGRATIONS.map((_, at) => String(at + 1).padStart(4, '0')),
    );
    expect(new Set(MIGRATIONS.map(({ name }) => name)).size).toBe(MIGRATIONS.length);
  });

  it('is at head already: migrating again changes nothing', async () => {
    expect(await migrateToHead(database.ownerUrl)).toEqual([]);
  });

  it('refuses a database that is newer than the program', async () => {
    const newer = await createTestDatabase();
    await withClient(newer.ownerUrl, (client) =>
      client.query(`insert into schema_migrations (name) values ('9999_from_the_future')`),
    );
    await expect(migrateToHead(newer.ownerUrl)).rejects.toThrow(/newer than this program: it has 9999_from_the_future/);
    await newer.drop();
  });

  it('has row-level security on and forced wherever a row belongs to a customer', async () => {
    const open = await ask<{ table: string }>(`
      select c.relname as table
      from pg_class c join pg_attribute a on a.attrelid = c.oid
      where c.relnamespace = 'public'::regnamespace and c.relkind = 'r' and a.attname = 'customer_id' and not a.attisdropped
        and not (c.relrowsecurity and c.relforcerowsecurity)`);
    expect(open).toEqual([]);
  });

  it('keeps foreign keys inside a customer by customer and id together', async () => {
    const alone = await ask<{ name: string }>(`
      select con.conname as name
      from pg_constraint con
      join pg_attribute own on own.attrelid = con.conrelid and own.attname = 'customer_id'
      join pg_attribute far on far.attrelid = con.confrelid and far.attname = 'customer_id' and far.attnotnull
      where con.contype = 'f' and con.connamespace = 'public'::regnamespace
        and own.attnotnull and con.confrelid <> 'customers'::regclass
        and not own.attnum = any (con.conkey)`);
    expect(alone).toEqual([]);
  });

  it('serves through roles that can neither bypass row-level security nor change the schema', async () => {
    const roles = await ask<{ rolname: string; rolsuper: boolean; rolbypassrls: boolean }>(
      `select rolname, rolsuper, rolbypassrls from pg_roles where rolname like 'seamwright\\_%' and rolname <> 'seamwright_admin' order by 1`,
    );
    expect(roles.map(({ rolsuper, rolbypassrls }) => rolsuper || rolbypassrls)).toEqual([false, false, false]);
    const attempt = withClient(database.appUrl, (client) => client.query('create table smuggled (id int)'));
    await expect(attempt).rejects.toThrow(/permission denied/);
  });

  it('names the row of every audited table by a column that it has', async () => {
    const nameless = await ask<{ table: string; key: string }>(`
      select c.relname as table, k.key
      from pg_trigger t
      join pg_class c on c.oid = t.tgrelid
      cross join lateral (select convert_from(substring(t.tgargs for position('\\000'::bytea in t.tgargs) - 1), 'UTF8') as key) k
      where t.tgfoid = 'write_audit'::regproc
        and not exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = k.key)`);
    expect(nameless).toEqual([]);
  });

  it('has an index under every foreign key that rows are removed or looked up by', async () => {
    const bare = await ask<{ name: string }>(`
      select con.conname as name from pg_constraint con
      where con.contype = 'f' and con.connamespace = 'public'::regnamespace and con.confdeltype = 'c'
        and not exists (
          select 1 from pg_index i
          where i.indrelid = con.conrelid and (i.indkey::int2[])[0:0] && con.conkey
        )`);
    expect(bare).toEqual([]);
  });
});
