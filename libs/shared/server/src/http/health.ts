import { Router } from 'express';
import { appliedMigrations, MIGRATIONS } from '@seamwright/database';
import { system } from '../database/caller';
import type { Database } from '../database/database';
import { inTransaction } from '../database/in-transaction';

/** So many untold events mean that no worker keeps up. */
const MOST_WAITING = 5000;

/** `/healthz`: the process answers. `/readyz`: the database answers, migrations are at head, and the jobs keep up. */
export function healthRouter(database: Database, url: string): Router {
  const router = Router();
  router.get('/healthz', (_request, response) => void response.json({ ok: true }));
  router.get('/readyz', async (_request, response) => {
    const checks = { database: false, migrations: false, jobs: false };
    try {
      const head = MIGRATIONS.at(-1)?.name;
      checks.migrations = (await appliedMigrations(url)).includes(head ?? '');
      const newest = await inTransaction(database, system('job'), (tx) =>
        tx
          .selectFrom('outboxEvents')
          .select(['id', 'dispatchedAt'])
          .orderBy('id', 'desc')
          .limit(1)
          .offset(MOST_WAITING)
          .executeTakeFirst(),
      );
      checks.database = true;
      checks.jobs = !newest || newest.dispatchedAt !== null;
    } catch {
      // What could not be asked stays false.
    }
    const ready = Object.values(checks).every(Boolean);
    response.status(ready ? 200 : 503).json({ ready, checks });
  });
  return router;
}
