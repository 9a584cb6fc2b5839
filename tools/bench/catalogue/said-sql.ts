import type { PoolClient } from 'pg';
import type { Database } from '@seamwright/shared/server';
import type { Plain } from '../thread/plain';

export interface Said {
  readonly text: string;
  readonly values: readonly unknown[];
}

/** The same database, which writes down what is sent through it. */
export interface ListenedDatabase {
  readonly database: Database;
  /** What `work` sent. */
  saidBy(work: () => Promise<unknown>): Promise<Said[]>;
}

export function listenTo(database: Database): ListenedDatabase {
  let said: Said[] | null = null;
  const connect = async () => {
    const client: PoolClient = await database.pool.connect();
    return {
      release: (error?: Error) => client.release(error),
      query: (text: string, values?: unknown[]) => {
        said?.push({ text, values: values ?? [] });
        return client.query(text, values);
      },
    };
  };
  return {
    database: { ...database, pool: { connect } as unknown as Database['pool'] },
    async saidBy(work) {
      said = [];
      await work();
      const all = said;
      said = null;
      return all;
    },
  };
}

/** Says the same again over the plain driver, `begin` and `commit` included. */
export async function sayAgain(plain: Plain, said: readonly Said[]): Promise<void> {
  for (const { text, values } of said) await plain.query(text, values);
}
