// Texts are marked with $localize: it has to be there before anything that says something.
import '@angular/localize/init';
import { createServer as createHttpServer } from 'node:http';
import { createLog, LiveHub, MovableClock, openDatabase, readConfig, systemClock } from '@seamwright/shared/server';
import { authenticateBearer } from '@seamwright/identity/server';
import { buildHouse, identityParts } from './house';
import { createServer } from './server';
import { untilStopped } from './until-stopped';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const log = createLog(config.LOG_LEVEL, 'api');
  const database = openDatabase(config.APP_DATABASE_URL);
  const clock = config.SEAMWRIGHT_MODE === 'production' ? systemClock : new MovableClock(database);
  const house = buildHouse({ config, database, clock, log });
  const live = new LiveHub(config.APP_DATABASE_URL, log);
  await live.start();
  const app = createServer(
    config,
    house,
    {
      database,
      clock,
      log,
      secureCookies: config.PUBLIC_ORIGIN.startsWith('https:'),
      authenticate: authenticateBearer(identityParts(config)),
    },
    live,
  );
  const server = createHttpServer(app);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(config.PORT, config.HOST, resolve);
  });
  log.info({ host: config.HOST, port: config.PORT }, 'serving');

  await untilStopped();
  log.info('draining');
  await live.close();
  await new Promise((resolve) => {
    server.close(resolve);
    server.closeIdleConnections();
  });
  house.close();
  await database.close();
}

main().catch((error: Error) => {
  process.stderr.write(`${error.message}\n`);
  process.exit(1);
});
