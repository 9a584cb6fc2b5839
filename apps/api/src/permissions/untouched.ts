import { sql } from 'kysely';
import { inTransaction, system, type JobContext, type Tx } from '@seamwright/shared/server';

/** How many rows each table has and which transactions wrote them: the same twice when nothing was written between. */
export type Imprint = Readonly<Record<string, string>>;

async function readableTables(tx: Tx): Promise<string[]> {
  const { rows } = await sql<{ name: string }>`
    select c.relname as name from pg_class c
    where c.relnamespace = 'public'::regnamespace and c.relkind = 'r' and has_table_privilege(c.oid, 'select')
    order by 1`.execute(tx);
  return rows.map(({ name }) => name);
}

/** Takes the imprint of every table that the jobs' role may read. */
export function imprintOf({ database }: JobContext): Promise<Imprint> {
  return inTransaction(database, system('job'), async (tx) => {
    const counted = (await readableTables(tx)).map(
      (name) =>
        sql`select ${name}::text as name, count(*) || ' rows by ' || coalesce(sum(t.xmin::text::numeric), 0) as state
          from ${sql.table(name)} t`,
    );
    const { rows } = await sql<{ name: string; state: string }>`${sql.join(counted, sql` union all `)}`.execute(tx);
    return Object.fromEntries(rows.map(({ name, state }) => [name, state]));
  });
}
