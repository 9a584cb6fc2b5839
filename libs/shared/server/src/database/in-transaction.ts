import { CamelCasePlugin, Kysely, PostgresDialect, type PostgresPool } from 'kysely';
import { escapeLiteral, type PoolClient } from 'pg';
import type { DB } from '@seamwright/database';
import { callerSettings, type Caller } from './caller';
import type { Database } from './database';

/** An open transaction of one caller. Repositories take it as an argument and never open one. */
export type Tx = Kysely<DB>;

const DEADLOCK = '40P01';
const TRIES = 3;

function beginAs(caller: Caller): string {
  const settings = Object.entries(callerSettings(caller)).map(
    ([name, value]) => `set_config('seamwright.${name}', ${escapeLiteral(value)}, true)`,
  );
  return `begin; select ${settings.join(', ')}`;
}

function kyselyOn(client: PoolClient): Tx {
  const pool = {
    connect: async () => ({ query: client.query.bind(client), release: () => undefined }),
    end: async () => undefined,
  } as unknown as PostgresPool;
  return new Kysely<DB>({
    dialect: new PostgresDialect({ pool }),
    plugins: [new CamelCasePlugin({ maintainNestedObjectKeys: true })],
  });
}

/**
 * The only way to open a transaction: sends `begin` and the caller in one trip, for that transaction only,
 * commits when `work` resolves and rolls back when it throws. A deadlock is tried again, so `work` must have no
 * effect outside the transaction.
 */
export async function inTransaction<T>(database: Database, caller: Caller, work: (tx: Tx) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    const client = await database.pool.connect();
    let broken: Error | undefined;
    try {
      await client.query(beginAs(caller));
      const result = await work(kyselyOn(client));
      await client.query('commit');
      return result;
    } catch (error) {
      await client.query('rollback').catch((lost: Error) => (broken = lost));
      if ((error as { code?: string }).code === DEADLOCK && attempt < TRIES) continue;
      throw error;
    } finally {
      client.release(broken);
    }
  }
}
