import { sql } from 'kysely';
import type { Tx } from '../../src/index';

const TRIES = 500;

/** Resolves once another connection waits for a lock that somebody holds, this transaction for one. */
export async function waitForLock(tx: Tx): Promise<void> {
  for (let tries = 0; tries < TRIES; tries++) {
    const { rows } = await sql<{ waiting: number }>`
      select count(*) as waiting from pg_locks
      where not granted and pid in (select pid from pg_stat_activity where datname = current_database())`.execute(tx);
    if ((rows[0]?.waiting ?? 0) > 0) return;
    await sql`select pg_sleep(0.01)`.execute(tx);
  }
  throw new Error('Nobody waited for a lock');
}
