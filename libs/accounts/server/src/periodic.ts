import { inTransaction, system, type JobContext, type PeriodicJob } from '@seamwright/shared/server';
import { unsettledCards } from './cards.repository';
import { settleCard } from './keep-card';
import type { AccountsParts } from './parts';
import { overdueHolds, unsettledPayments } from './payments.repository';
import { ProcessorSilent } from './processor';
import { settlePayment } from './settle-payment';
import { syncProcessor } from './sync-processor';

type Parts = Omit<AccountsParts, 'clock'>;

/** What was begun so long ago should have been answered. */
const ANSWERED_AFTER_MS = 30_000;
const AT_ONCE = 50;

/** Each by itself: one that can't be settled must not keep the others waiting. */
async function each<T extends { readonly id: string }>(
  context: JobContext,
  items: readonly T[],
  settle: (item: T) => Promise<void>,
): Promise<void> {
  for (const item of items) {
    await settle(item).catch((error: unknown) =>
      context.log.error({ err: error, id: item.id }, 'could not be settled'),
    );
  }
}

/** Repeats, with the same keys, the calls whose answers were never stored. */
const repairCards = (parts: Parts): PeriodicJob => ({
  name: 'repair-card-calls',
  everySeconds: 30,
  async run(context) {
    const now = await context.clock.now();
    const before = new Date(now.getTime() - ANSWERED_AFTER_MS);
    const found = await inTransaction(context.database, system('job'), async (tx) => ({
      cards: await unsettledCards(tx, before, AT_ONCE),
      payments: [...(await unsettledPayments(tx, before, AT_ONCE)), ...(await overdueHolds(tx, now, AT_ONCE))],
    }));
    await each(context, found.cards, ({ id }) => settleCard(context, parts, id));
    await each(context, found.payments, ({ id }) => settlePayment(context, parts, id));
  },
});

/** Learns what the processor did with our money since the last time. */
const followProcessor = (parts: Parts): PeriodicJob => ({
  name: 'follow-card-processor',
  everySeconds: 300,
  async run(context) {
    await syncProcessor(context, parts).catch((error: unknown) => {
      if (!(error instanceof ProcessorSilent)) throw error;
      context.log.warn({ err: error }, 'the card processor did not answer; asked again next time');
    });
  },
});

export const accountsPeriodic = (parts: Parts): PeriodicJob[] => [repairCards(parts), followProcessor(parts)];
