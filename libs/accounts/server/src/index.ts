import type { Implementation } from '@seamwright/shared/server';
import { bookImplementations } from './books.router';
import { cardImplementations } from './cards.router';
import { paperImplementations } from './papers.router';
import type { AccountsParts } from './parts';

export { cardPort } from './card-port';
export { importStatement } from './import-statement';
export type { AccountsParts, Seller } from './parts';
export { accountsPeriodic } from './periodic';
export {
  CardRefused,
  ProcessorRefused,
  ProcessorSilent,
  SignatureWrong,
  type HoldWanted,
  type Processor,
  type ProcessorEvent,
  type SavedCard,
} from './processor';
export { settleCard } from './keep-card';
export { stripeProcessor, type StripeConfig } from './stripe-processor';
export { stripeWebhook, type WebhookParts } from './stripe-webhook';
export { accountsSubscribers } from './subscribers';
export { syncProcessor } from './sync-processor';

export const accountsImplementations = (parts: AccountsParts): Implementation[] => [
  ...cardImplementations(parts),
  ...paperImplementations(parts),
  ...bookImplementations(parts),
];
