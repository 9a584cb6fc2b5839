import type { PoolClient } from 'pg';
import type { Database } from '../../src/index';

/** A step of a plan that reads a table. */
export interface TableRead {
  readonly table: string;
  /** How: the index, or null for reading the whole table. */
  readonly index: string | null;
  /** What of the index is read; null for all of it, in its order. */
  readonly key: string | null;
}

export interface WatchedDatabase {
  readonly database: Database;
  /** Every table read that was planned for a SELECT sent since. */
  readonly reads: readonly TableRead[];
}

interface Plan {
  readonly 'Relation Name'?: string;
  readonly 'Index Name'?: string;
  readonly 'Index Cond'?: string;
  readonly Plans?: readonly Plan[];
}

/**
 * The same database, which writes down how PostgreSQL goes about the SELECTs that are sent, on tables that are filled
 * and analysed. `by-index` has it read no table from end to end where an index serves, so that the answer does not hang
 * on how full the tables of a test are: what is still read whole would be so in any house. `as-it-would` leaves it to it.
 */
export function watchPlans(database: Database, how: 'by-index' | 'as-it-would' = 'by-index'): WatchedDatabase {
  const reads: TableRead[] = [];
  const connect = async () => {
    const client: PoolClient = await database.pool.connect();
    return {
      release: (error?: Error) => client.release(error),
      query: async (text: string, values?: unknown[]) => {
        if (/^\s*(?:with|select)\b/i.test(text)) {
          await client.query(`set local enable_seqscan = ${how === 'by-index' ? 'off' : 'on'}`);
          const { rows } = await client.query<{ 'QUERY PLAN': [{ Plan: Plan }] }>(
            `explain (format json) ${text}`,
            values,
          );
          await client.query('set local enable_seqscan = on');
          for (const row of rows) reads.push(...readsOf(row['QUERY PLAN'][0].Plan));
        }
        return client.query(text, values);
      },
    };
  };
  return { database: { ...database, pool: { connect } as unknown as Database['pool'] }, reads };
}

function readsOf(plan: Plan): TableRead[] {
  const { 'Relation Name': table, Plans: steps = [] } = plan;
  const looked = table ? lookedUp(plan) : undefined;
  const own = table ? [{ table, index: looked?.['Index Name'] ?? null, key: looked?.['Index Cond'] ?? null }] : [];
  return [...own, ...steps.flatMap(readsOf)];
}

/** The step that looks into the index: the one that reads the table, or one below it that makes a bitmap for it. */
function lookedUp(plan: Plan): Plan | undefined {
  if (plan['Index Name']) return plan;
  return plan.Plans?.filter((step) => !step['Relation Name'])
    .map(lookedUp)
    .find((step) => step !== undefined);
}
