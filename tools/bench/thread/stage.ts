import { randomBytes } from 'node:crypto';
import { authenticateBearer } from '@seamwright/identity/server';
import { signIn } from '@seamwright/identity/contracts';
import { createTestDatabase } from '@seamwright/database/testing';
import { createLog, LiveHub, openDatabase, readConfig, SetClock, type Config } from '@seamwright/shared/server';
import { unwrap, plantDate, type PlantDate } from '@seamwright/shared/util';
import { buildHouse, identityParts } from '../../../apps/api/src/house';
import { createServer } from '../../../apps/api/src/server';
import { at } from '../../../seeds/history/history-days';
import { loadDemo } from '../../../seeds/load-demo';
import { buyerEmail, CUSTOMERS } from '../../../seeds/scenario/customers';
import { DEMO_PASSWORD, staffEmail } from '../../../seeds/scenario/plant';
import { STAFF } from '../../../seeds/scenario/staff';
import { createMailCatcher } from '../../mail-catcher/index';
import { listenOnLoopback } from '../../stand-in/loopback-server';
import { createStripeMock } from '../../stripe-mock/index';
import { benchServer } from '../cluster';
import { ApiClient } from './api-client';
import { Plain } from './plain';

/** A Tuesday: the demo's history ends here. */
const ANCHOR: PlantDate = unwrap(plantDate('2026-12-01'));
const STRIPE_KEY = 'sk_test_bench';

/** Who acts in the thread, by the scenario's keys. */
const ACTORS = ['lucian', 'ruben', 'petra', 'femi', 'anneke'] as const;
export type Actor = (typeof ACTORS)[number];

export interface SignedIn {
  readonly token: string;
  readonly personId: string;
  readonly customerId: string | null;
}

/** The demo behind the API, listening in this process, and a plain connection to the same database. */
export interface Stage {
  readonly anchor: PlantDate;
  readonly now: Date;
  readonly api: ApiClient;
  readonly plain: Plain;
  as(actor: Actor): SignedIn;
  /** Tokens live for minutes only. */
  signEverybodyIn(): Promise<void>;
  close(): Promise<void>;
}

/** How somebody of the scenario signs in. */
export function credentialsOf(key: string) {
  const staff = STAFF.find((each) => each.key === key);
  if (staff) return { application: 'admin' as const, email: staffEmail(key), password: DEMO_PASSWORD };
  for (const customer of CUSTOMERS)
    for (const buyer of customer.buyers)
      if (buyer.key === key)
        return { application: 'storefront' as const, email: buyerEmail(customer, buyer), password: DEMO_PASSWORD };
  throw new Error(`There is nobody called "${key}" in the scenario`);
}

/** Makes a database, fills it with the demo through the use cases, and serves it. */
export async function openStage(say: (line: string) => void): Promise<Stage> {
  const undo: (() => unknown)[] = [];
  const close = async (): Promise<void> => {
    for (const back of undo.reverse()) await back();
  };
  try {
    return { ...(await furnish(say, undo)), close };
  } catch (error) {
    await close();
    throw error;
  }
}

async function furnish(say: (line: string) => void, undo: (() => unknown)[]): Promise<Omit<Stage, 'close'>> {
  const server = benchServer();
  undo.push(() => server.stop());
  process.env['SEAMWRIGHT_TEST_ADMIN_URL'] = server.adminUrl;
  say('  making a database');
  const urls = await createTestDatabase();
  undo.push(() => urls.drop());

  const mails = await createMailCatcher().listen({ smtpPort: 0, httpPort: 0 });
  undo.push(() => mails.close());
  const processor = createStripeMock({ key: STRIPE_KEY });
  undo.push(() => processor.stop());
  const standIn = await listenOnLoopback(processor.app, 0);
  undo.push(() => standIn.close());

  const config = configFor({ ...urls, stripePort: standIn.port, smtpPort: mails.smtpPort });
  const log = createLog('silent', 'bench');
  say('  filling it with the demo');
  const worker = openDatabase(urls.workerUrl);
  try {
    await loadDemo({ config, database: worker, log, anchor: ANCHOR, say: () => undefined });
  } finally {
    await worker.close();
  }

  const now = at(ANCHOR, '10:00');
  const clock = new SetClock(now);
  const database = openDatabase(urls.appUrl);
  undo.push(() => database.close());
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
  const api = new ApiClient(http.url);
  undo.push(() => api.close());
  const plain = await Plain.connect(urls.appUrl);
  undo.push(() => plain.close());

  const signedIn = new Map<Actor, SignedIn>();
  const signEverybodyIn = async (): Promise<void> => {
    for (const actor of ACTORS) {
      const { accessToken, person } = await api.call(null, signIn, { body: credentialsOf(actor) });
      signedIn.set(actor, { token: accessToken, personId: person.id, customerId: person.customerId });
    }
  };
  await signEverybodyIn();
  return { anchor: ANCHOR, now, api, plain, as: (actor) => known(signedIn.get(actor), actor), signEverybodyIn };
}

/** What is there by now; said of what it is when not. */
export function known<T>(value: T | null | undefined, what: string): T {
  if (value === undefined || value === null) throw new Error(`The bench has no ${what}`);
  return value;
}

interface Addresses {
  readonly appUrl: string;
  readonly workerUrl: string;
  readonly stripePort: number;
  readonly smtpPort: number;
}

/** As a production would be set up, with the default cost of passwords; only the rate limit is out of the way. */
export const configFor = ({ appUrl, workerUrl, stripePort, smtpPort }: Addresses): Config =>
  readConfig({
    SEAMWRIGHT_MODE: 'test',
    APP_DATABASE_URL: appUrl,
    WORKER_DATABASE_URL: workerUrl,
    JWT_SECRET: randomBytes(32).toString('hex'),
    STRIPE_SECRET_KEY: STRIPE_KEY,
    STRIPE_WEBHOOK_SECRET: 'whsec_bench',
    STRIPE_HOST: '127.0.0.1',
    STRIPE_PORT: String(stripePort),
    STRIPE_PROTOCOL: 'http',
    SELLER_NAME: 'Withenbeck Meats',
    SELLER_ADDRESS: 'Lower Tannery|Withenbeck',
    SELLER_BANK_DETAILS: 'none',
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    REQUESTS_PER_MINUTE: '1000000',
  });
