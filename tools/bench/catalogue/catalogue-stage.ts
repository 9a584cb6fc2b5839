import { authenticateBearer } from '@seamwright/identity/server';
import { signIn } from '@seamwright/identity/contracts';
import { createTestDatabase } from '@seamwright/database/testing';
import { createLog, inTransaction, LiveHub, openDatabase, SetClock, system } from '@seamwright/shared/server';
import { plantDate, unwrap } from '@seamwright/shared/util';
import { buildHouse, identityParts } from '../../../apps/api/src/house';
import { createServer } from '../../../apps/api/src/server';
import { callersOf } from '../../../seeds/callers';
import { seedCatalogue } from '../../../seeds/catalogue';
import { at } from '../../../seeds/history/history-days';
import { seedPeople } from '../../../seeds/people/seed-people';
import { seedPricing } from '../../../seeds/pricing';
import { listenOnLoopback } from '../../stand-in/loopback-server';
import { benchServer } from '../cluster';
import { ApiClient } from '../thread/api-client';
import { Plain } from '../thread/plain';
import { configFor, credentialsOf, known } from '../thread/stage';
import { fillCatalogue, type Filling } from './fill-catalogue';
import { listenTo, type ListenedDatabase } from './said-sql';

/** A large catalogue behind the API, listening in this process, and a plain connection to the same database. */
export interface CatalogueStage {
  readonly api: ApiClient;
  readonly plain: Plain;
  readonly listened: ListenedDatabase;
  /** A buyer's. */
  token(): string;
  signIn(): Promise<void>;
  close(): Promise<void>;
}

const NO_PORT = 1;

/** Makes a database with the demo's people, catalogue and prices, fills the catalogue up, and serves it. */
export async function openCatalogueStage(filling: Filling, say: (line: string) => void): Promise<CatalogueStage> {
  const undo: (() => unknown)[] = [];
  const close = async (): Promise<void> => {
    for (const back of undo.reverse()) await back();
  };
  try {
    return { ...(await furnish(filling, say, undo)), close };
  } catch (error) {
    await close();
    throw error;
  }
}

async function furnish(
  filling: Filling,
  say: (line: string) => void,
  undo: (() => unknown)[],
): Promise<Omit<CatalogueStage, 'close'>> {
  const server = benchServer();
  undo.push(() => server.stop());
  process.env['SEAMWRIGHT_TEST_ADMIN_URL'] = server.adminUrl;
  say('  making a database');
  const urls = await createTestDatabase();
  undo.push(() => urls.drop());
  const config = configFor({ ...urls, stripePort: NO_PORT, smtpPort: NO_PORT });
  const log = createLog('silent', 'bench');
  const now = at(unwrap(plantDate('2026-12-01')), '10:00');
  const clock = new SetClock(now);
  const api = openDatabase(urls.appUrl);
  undo.push(() => api.close());

  const people = await inTransaction(api, system('seed'), (tx) => seedPeople(tx, now, config.ARGON2_MEMORY_KIB));
  const callers = callersOf(people);
  const who = (key: string) => known(callers.get(key), key);
  const specificationIds = await seedCatalogue(api, { now, author: who('tamsin'), approver: who('idris') });
  await seedPricing(api, { validFrom: '2026-01-01', specificationIds, ...people });
  say(`  filling it with ${filling.specifications} specifications of ${filling.versionsEach} versions each`);
  const owner = await Plain.connect(urls.ownerUrl);
  await owner.inTransaction(() => fillCatalogue(owner, filling));
  await owner.query('vacuum analyze');
  await owner.close();

  const listened = listenTo(api);
  const { database } = listened;
  const house = buildHouse({ config, database, clock, log });
  undo.push(() => house.close());
  const authenticate = authenticateBearer(identityParts(config));
  const app = createServer(
    config,
    house,
    { database, clock, log, secureCookies: false, authenticate },
    new LiveHub(config.APP_DATABASE_URL, log),
  );
  const http = await listenOnLoopback(app, 0);
  undo.push(() => http.close());
  const client = new ApiClient(http.url);
  undo.push(() => client.close());
  const plain = await Plain.connect(urls.appUrl);
  undo.push(() => plain.close());

  let token = '';
  const signInBuyer = async (): Promise<void> => {
    token = (await client.call(null, signIn, { body: credentialsOf('lucian') })).accessToken;
  };
  await signInBuyer();
  return { api: client, plain, listened, token: () => token, signIn: signInBuyer };
}
