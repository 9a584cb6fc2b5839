// Texts are marked with $localize: it has to be there before anything that says something.
import '@angular/localize/init';
import {
  createLog,
  inTransaction,
  MovableClock,
  openDatabase,
  readConfig,
  system,
  type Database,
} from '@seamwright/shared/server';
import { plantToday, unwrap, plantDate } from '@seamwright/shared/util';
import { at } from './history/history-days';
import { loadDemo } from './load-demo';
import { signInLines } from './sign-in-lines';

const LOADED = { caller: 'seeds', endpoint: 'demo', key: 'loaded' };

/** Fills the demo unless it is there. `--sign-ins` prints who may sign in. SEED_ANCHOR_DAY fixes the plant's today. */
async function main(words: readonly string[]): Promise<void> {
  if (words.includes('--sign-ins')) return void console.log(signInLines().join('\n'));
  const config = readConfig(process.env);
  if (config.SEAMWRIGHT_MODE === 'production') throw new Error('The demo is not loaded in production.');
  const database = openDatabase(config.WORKER_DATABASE_URL);
  try {
    const standing = await standingOf(database);
    if (standing === 'loaded') return void console.log('the demo is there');
    if (standing === 'half') throw new Error('The demo was half loaded. Make it anew with: npm start -- --reset');
    const fixed = process.env['SEED_ANCHOR_DAY'];
    const clock = new MovableClock(database);
    const anchor = fixed ? unwrap(plantDate(fixed)) : plantToday(await clock.now(), config.PLANT_TIME_ZONE);
    const log = createLog('error', 'seeds');
    await loadDemo({ config, database, log, anchor, say: (line) => console.log(line) });
    if (fixed) await clock.moveTo(at(anchor, '10:00'));
    const createdAt = await clock.now();
    await inTransaction(database, system('seed'), (tx) =>
      tx
        .insertInto('idempotencyKeys')
        .values({ ...LOADED, requestHash: anchor, createdAt })
        .execute(),
    );
  } finally {
    await database.close();
  }
}

async function standingOf(database: Database): Promise<'empty' | 'half' | 'loaded'> {
  return inTransaction(database, system('seed'), async (tx) => {
    const done = await tx
      .selectFrom('idempotencyKeys')
      .select('key')
      .where('caller', '=', LOADED.caller)
      .executeTakeFirst();
    if (done) return 'loaded';
    return (await tx.selectFrom('customers').select('id').limit(1).executeTakeFirst()) ? 'half' : 'empty';
  });
}

main(process.argv.slice(2)).catch((error: Error) => {
  console.error(error.stack ?? error.message);
  process.exitCode = 1;
});
