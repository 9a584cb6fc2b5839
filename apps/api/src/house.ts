import type { Express } from 'express';
import { catalogueImplementations } from '@seamwright/catalogue/server';
import { identityImplementations, tidyIdentity, type IdentityParts } from '@seamwright/identity/server';
import {
  orderingImplementations,
  orderingSubscribers,
  type CardPort,
  type OrderingParts,
} from '@seamwright/ordering/server';
import { cuttingDayPort, plantImplementations, plantSubscribers } from '@seamwright/plant/server';
import { pricingImplementations, pricingPeriodic } from '@seamwright/pricing/server';
import {
  mailSubscriber,
  smtpMailer,
  systemClock,
  type Clock,
  type Config,
  type Database,
  type Implementation,
  type PeriodicJob,
  type Subscriber,
} from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { stockImplementations } from '@seamwright/stock/server';

/** Everything that the storeys bring, put together in one place; no business rule lives here. */
export interface House {
  readonly implementations: readonly Implementation[];
  readonly subscribers: readonly Subscriber[];
  readonly periodic: readonly PeriodicJob[];
  /** Mounts what is called from outside without a declared endpoint. */
  webhooks(app: Express): void;
}

export interface HouseParts {
  readonly config: Config;
  readonly database: Database;
  readonly clock: Clock;
}

// Until the accounts storey is here, orders go on account.
const noCards: CardPort = {
  start: () => Promise.reject(new RefusalError({ code: 'not-found', params: {} })),
  hold: async () => undefined,
  stateOf: async () => new Map(),
};

/** What the identity storey is furnished with: sessions and links live by the real time, whatever the demo's clock says. */
export const identityParts = (config: Config): IdentityParts => ({
  clock: systemClock,
  jwtSecrets: [config.JWT_SECRET, ...(config.JWT_PREVIOUS_SECRET ? [config.JWT_PREVIOUS_SECRET] : [])],
  publicOrigin: config.PUBLIC_ORIGIN,
  argonMemoryKib: config.ARGON2_MEMORY_KIB,
});

export function buildHouse({ config, clock }: HouseParts): House {
  const timeZone = config.PLANT_TIME_ZONE;
  const publicOrigin = config.PUBLIC_ORIGIN;
  const identity = identityParts(config);
  const ordering: OrderingParts = { timeZone, clock, cards: noCards, days: cuttingDayPort };
  return {
    implementations: [
      ...identityImplementations(identity),
      ...catalogueImplementations,
      ...pricingImplementations({ timeZone, publicOrigin }),
      ...stockImplementations({ timeZone }),
      ...orderingImplementations(ordering),
      ...plantImplementations({ timeZone }),
    ],
    subscribers: [
      mailSubscriber(smtpMailer(config.SMTP_URL, config.MAIL_FROM)),
      ...orderingSubscribers(ordering),
      ...plantSubscribers,
    ],
    periodic: [...pricingPeriodic({ timeZone }), tidyIdentity],
    webhooks: () => undefined,
  };
}
