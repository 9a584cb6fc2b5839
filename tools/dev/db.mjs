// npm run db:migrate, db:types, db:reset: the demo's database in our cluster, or in the one that DATABASE_URL names.
//   node tools/dev/db.mjs migrate|types|reset
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureCluster } from '../postgres/cluster.mjs';
import { placeOf } from '../postgres/place.mjs';
import { snapshotIn } from '../start/environment.mjs';
import { lockHolder } from '../start/lock.mjs';
import { checkNode, ensurePackages } from '../start/packages.mjs';
import { Told, checkout, runMain, runMeanwhile } from '../start/system.mjs';

/** The commands of database/cli.ts behind each of ours: types are read from a database at head. */
const commands = { migrate: ['migrate'], types: ['migrate', 'types'], reset: ['drop', 'migrate'] };

await runMain(async () => {
  const [verb] = process.argv.slice(2);
  if (!Object.hasOwn(commands, verb ?? '')) throw new Told('Usage: node tools/dev/db.mjs migrate|types|reset');
  const log = (line) => console.log(line);
  checkNode(checkout);
  ensurePackages({ root: checkout, log });
  const { folder } = placeOf(checkout, 'demo');
  if (verb === 'reset') {
    const holder = lockHolder(join(folder, 'start.lock'));
    if (holder) throw new Told(`Seamwright runs at ${holder.address} (process ${holder.pid}). Stop it before a reset.`);
    // The card processor's stand-in must not remember payments of orders that are gone.
    rmSync(snapshotIn(folder), { force: true });
  }
  const cluster = process.env.DATABASE_URL ? undefined : await ensureCluster({ name: 'demo', log });
  try {
    const env = { ...process.env, DATABASE_URL: process.env.DATABASE_URL ?? cluster.adminUrl };
    for (const command of commands[verb]) {
      const args = ['database/cli.ts', command];
      const done = await runMeanwhile(join(checkout, 'node_modules/.bin/tsx'), args, {
        cwd: checkout,
        env,
        shown: true,
      });
      if (done.code !== 0) throw new Told(`database/cli.ts ${command} ended with code ${done.code}.`);
    }
  } finally {
    if (cluster && !cluster.reused) await cluster.stop();
  }
});
