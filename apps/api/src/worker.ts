// Texts are marked with $localize: it has to be there before anything that says something.
import '@angular/localize/init';
import { createLog, MovableClock, openDatabase, readConfig, startWorker, systemClock } from '@seamwright/shared/server';
import { buildHouse } from './house';
import { untilStopped } from './until-stopped';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const log = createLog(config.LOG_LEVEL, 'worker');
  const database = openDatabase(config.WORKER_DATABASE_URL);
  const clock = config.SEAMWRIGHT_MODE === 'production' ? systemClock : new MovableClock(database);
  const { subscribers, periodic, close } = buildHouse({ config, database, clock, log });
  const worker = await startWorker({ database, clock, log }, config.WORKER_DATABASE_URL, subscribers, periodic);
  log.info('working');

  await untilStopped();
  log.info('draining');
  await worker.stop();
  close();
  await database.close();
}

main().catch((error: Error) => {
  process.stderr.write(`${error.message}\n`);
  process.exit(1);
});
