import { createLog, drainOutbox, readConfig, type Config, type Implementation } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { listenOnLoopback } from '../../../../../tools/stand-in/loopback-server';
import { createStripeMock } from '../../../../../tools/stripe-mock/index';
import { buildHouse, type House } from '../../house';

/** The house as the composition root puts it together, over a fresh database, with the stand-in of the card processor. */
export interface WholeHouse extends TestHouse {
  readonly config: Config;
  readonly built: House;
  readonly implementations: readonly Implementation[];
  /** Tells every subscriber of what is waiting, but the one that sends mail. */
  settle(): Promise<void>;
}

const KEY = 'sk_test_whole_house';
export const PUBLIC_ORIGIN = 'http://127.0.0.1:4300';

export async function openWholeHouse(): Promise<WholeHouse> {
  const mock = createStripeMock({ key: KEY, now: () => TEST_NOW, webhookDelivery: 'on-flush' });
  const processor = await listenOnLoopback(mock.app, 0);
  const config = readConfig({
    SEAMWRIGHT_MODE: 'test',
    PUBLIC_ORIGIN,
    APP_DATABASE_URL: 'given-by-the-test-house',
    WORKER_DATABASE_URL: 'given-by-the-test-house',
    JWT_SECRET: 'a secret for tests that is long enough',
    STRIPE_SECRET_KEY: KEY,
    STRIPE_WEBHOOK_SECRET: 'whsec_whole_house',
    STRIPE_HOST: '127.0.0.1',
    STRIPE_PORT: String(processor.port),
    STRIPE_PROTOCOL: 'http',
    SELLER_NAME: 'Alder Row Meats',
    SELLER_ADDRESS: '3 Alder Row|ZZ2 2BB',
    SELLER_BANK_DETAILS: 'Harbour Bank, 00-00-00, 00000000',
    SMTP_URL: 'smtp://127.0.0.1:1',
    LOG_LEVEL: 'silent',
    // The least that the hash takes: who may call is checked here, not the strength of passwords.
    ARGON2_MEMORY_KIB: '8',
  });
  const log = createLog('silent', 'test');
  let built: House | undefined;
  const house = await openTestHouse({
    implementations: ({ database, clock }) => (built = buildHouse({ config, database, clock, log })).implementations,
  });
  if (!built) throw new Error('The house was opened without its implementations');
  const { implementations, subscribers } = built;
  const told = subscribers.filter(({ name }) => name !== 'mail');
  return {
    ...house,
    config,
    built,
    implementations,
    settle: () => drainOutbox(house.jobs, told),
    async close() {
      await house.close();
      await mock.stop();
      await processor.close();
    },
  };
}
