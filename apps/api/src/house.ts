import type { Express } from 'express';
import {
  accountsImplementations,
  accountsPeriodic,
  accountsSubscribers,
  cardPort,
  stripeProcessor,
  stripeWebhook,
  type AccountsParts,
} from '@seamwright/accounts/server';
import {
  catalogueImplementations,
  schemeImplementations,
  searchImplementations,
  yieldImplementations,
} from '@seamwright/catalogue/server';
import { identityImplementations, tidyIdentity, type IdentityParts } from '@seamwright/identity/server';
import {
  countOpenOrderLines,
  orderingImplementations,
  orderingSubscribers,
  type OrderingParts,
} from '@seamwright/ordering/server';
import { cuttingDayPort, plantImplementations, plantSubscribers } from '@seamwright/plant/server';
import { countPriceLines, pricePort, pricingImplementations, pricingPeriodic } from '@seamwright/pricing/server';
import {
  mailSubscriber,
  smtpMailer,
  systemClock,
  type Clock,
  type Config,
  type Database,
  type Implementation,
  type Log,
  type PeriodicJob,
  type Subscriber,
} from '@seamwright/shared/server';
import { stockImplementations, stockPort } from '@seamwright/stock/server';

/** Everything that the storeys bring, put together in one place; no business rule lives here. */
export interface House {
  readonly implementations: readonly Implementation[];
  readonly subscribers: readonly Subscriber[];
  readonly periodic: readonly PeriodicJob[];
  /** Mounts what is called from outside without a declared endpoint. */
  webhooks(app: Express): void;
  /** Lets connections to the outside go. */
  close(): void;
}

export interface HouseParts {
  readonly config: Config;
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Log;
}

/** What the identity storey is furnished with: sessions and links live by the real time, whatever the demo's clock says. */
export const identityParts = (config: Config): IdentityParts => ({
  clock: systemClock,
  jwtSecrets: [config.JWT_SECRET, ...(config.JWT_PREVIOUS_SECRET ? [config.JWT_PREVIOUS_SECRET] : [])],
  publicOrigin: config.PUBLIC_ORIGIN,
  argonMemoryKib: config.ARGON2_MEMORY_KIB,
});

const accountsParts = (config: Config, clock: Clock): AccountsParts => ({
  processor: stripeProcessor({
    secretKey: config.STRIPE_SECRET_KEY,
    webhookSecrets: [
      config.STRIPE_WEBHOOK_SECRET,
      ...(config.STRIPE_WEBHOOK_PREVIOUS_SECRET ? [config.STRIPE_WEBHOOK_PREVIOUS_SECRET] : []),
    ],
    host: config.STRIPE_HOST,
    port: config.STRIPE_PORT,
    protocol: config.STRIPE_PROTOCOL,
  }),
  clock,
  timeZone: config.PLANT_TIME_ZONE,
  publicOrigin: config.PUBLIC_ORIGIN,
  publishableKey: config.STRIPE_PUBLISHABLE_KEY ?? null,
  seller: {
    name: config.SELLER_NAME,
    address: config.SELLER_ADDRESS.split('|').join('\n'),
    vatNumber: config.SELLER_VAT_NUMBER,
    bankDetails: config.SELLER_BANK_DETAILS,
  },
  tariff:
    config.CARD_FEE_PPM === undefined
      ? null
      : { ratePpm: config.CARD_FEE_PPM, fixedMinor: config.CARD_FEE_FIXED_MINOR },
});

/** Puts the storeys together; a lower one that needs an answer from a higher one is given it here. */
export function buildHouse({ config, database, clock, log }: HouseParts): House {
  const timeZone = config.PLANT_TIME_ZONE;
  const publicOrigin = config.PUBLIC_ORIGIN;
  const accounts = accountsParts(config, clock);
  const mailer = smtpMailer(config.SMTP_URL, config.MAIL_FROM);
  const ordering: OrderingParts = { timeZone, clock, cards: cardPort(accounts), days: cuttingDayPort };
  return {
    implementations: [
      ...identityImplementations(identityParts(config)),
      ...catalogueImplementations,
      ...schemeImplementations,
      ...yieldImplementations({ timeZone, readers: { countPriceLines, countOpenOrderLines } }),
      ...searchImplementations({ stock: stockPort, prices: pricePort, timeZone }),
      ...pricingImplementations({ timeZone, publicOrigin }),
      ...stockImplementations({ timeZone }),
      ...orderingImplementations(ordering),
      ...plantImplementations({ timeZone }),
      ...accountsImplementations(accounts),
    ],
    subscribers: [
      mailSubscriber(mailer),
      ...orderingSubscribers(ordering),
      ...plantSubscribers,
      ...accountsSubscribers(accounts),
    ],
    periodic: [tidyIdentity, ...pricingPeriodic({ timeZone }), ...accountsPeriodic(accounts)],
    close: () => mailer.close(),
    webhooks: (app) => {
      app.post('/api/webhooks/stripe', ...stripeWebhook({ processor: accounts.processor, database, clock, log }));
    },
  };
}
