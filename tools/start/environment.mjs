// The ports, addresses and variables of one start.
import { join } from 'node:path';
import { freePort } from './ports.mjs';

/** The demo's firm, which does not exist, and the tariff of the card processor's stand-in. */
const demoSeller = {
  SELLER_NAME: 'Withenbeck Meats',
  SELLER_ADDRESS: 'Lower Tannery|Withenbeck|WB1 4MW',
  SELLER_VAT_NUMBER: 'GB 000 0000 00',
  SELLER_BANK_DETAILS: 'Demo bank, sort code 00-00-00, account 00000000',
  CARD_FEE_PPM: '15000',
  CARD_FEE_FIXED_MINOR: '20',
};

/** Where the card processor's events are received. */
const webhookPath = '/api/webhooks/stripe';

/**
 * @typedef {{http: number, stripe: number, smtp: number, mail: number}} Ports
 */

/**
 * The stand-ins take the ports after ours when those are free, so that their pages keep their addresses.
 * @param {number} http
 * @returns {Promise<Ports>}
 */
export async function choosePorts(http) {
  const stripe = await freePort(http + 1);
  const mail = await freePort(http + 2);
  return { http, stripe, mail, smtp: await freePort(http + 3) };
}

/**
 * @param {Ports} ports
 */
export function addressesOf(ports) {
  const origin = `http://127.0.0.1:${ports.http}`;
  return {
    origin,
    storefront: `${origin}/`,
    admin: `${origin}/admin/`,
    docs: `${origin}/api/docs`,
    cards: `http://127.0.0.1:${ports.stripe}/`,
    mail: `http://127.0.0.1:${ports.mail}/`,
  };
}

/**
 * What the programs of a start are told by their environment.
 * @param {object} known
 * @param {Ports} known.ports
 * @param {ReturnType<typeof import('./secrets.mjs').ensureSecrets>} known.secrets
 * @param {{ownerUrl: string, appUrl: string, workerUrl: string}} known.database
 * @param {string} known.folder the demo's folder
 * @param {{storefront: string, admin: string}} known.statics the folders of the built applications
 */
export function environments({ ports, secrets, database, folder, statics }) {
  // The administrator's address is for making the database, and no program that serves gets it.
  const { DATABASE_URL: _administrators, ...base } = process.env;
  const services = {
    STRIPE_SECRET_KEY: secrets.stripeKey,
    STRIPE_HOST: '127.0.0.1',
    STRIPE_PORT: String(ports.stripe),
    STRIPE_PROTOCOL: 'http',
    STRIPE_WEBHOOK_SECRET: secrets.stripeWebhookSecret,
    ...demoSeller,
    SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
    PUBLIC_ORIGIN: addressesOf(ports).origin,
    SEAMWRIGHT_MODE: 'demo',
    APP_DATABASE_URL: database.appUrl,
    WORKER_DATABASE_URL: database.workerUrl,
    JWT_SECRET: secrets.jwtSecret,
  };
  return {
    stripeMock: {
      ...base,
      STRIPE_MOCK_PORT: String(ports.stripe),
      STRIPE_MOCK_KEY: secrets.stripeKey,
      STRIPE_MOCK_WEBHOOK_URL: `${addressesOf(ports).origin}${webhookPath}`,
      STRIPE_MOCK_WEBHOOK_SECRET: secrets.stripeWebhookSecret,
      STRIPE_MOCK_SNAPSHOT: snapshotIn(folder),
    },
    mailCatcher: { ...base, MAIL_CATCHER_SMTP_PORT: String(ports.smtp), MAIL_CATCHER_HTTP_PORT: String(ports.mail) },
    seeds: { ...base, ...services, OWNER_DATABASE_URL: database.ownerUrl },
    server: {
      ...base,
      ...services,
      PORT: String(ports.http),
      HOST: '127.0.0.1',
      STATIC_STOREFRONT: statics.storefront,
      STATIC_ADMIN: statics.admin,
    },
  };
}

/** Where the card processor's stand-in keeps its state between starts. */
export const snapshotIn = (folder) => join(folder, 'stripe-mock.json');
