import type { Express } from 'express';
import {
  mailSubscriber,
  smtpMailer,
  type Clock,
  type Config,
  type Database,
  type Implementation,
  type PeriodicJob,
  type Subscriber,
} from '@seamwright/shared/server';

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

export function buildHouse({ config }: HouseParts): House {
  return {
    implementations: [],
    subscribers: [mailSubscriber(smtpMailer(config.SMTP_URL, config.MAIL_FROM))],
    periodic: [],
    webhooks: () => undefined,
  };
}
