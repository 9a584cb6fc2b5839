import { emit, inTransaction, system, type PeriodicJob } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { expireQuotes } from './quotes.repository';

/** Ends sent quotes on the day after their last day for an answer. */
export function expireQuotesJob(timeZone: string): PeriodicJob {
  return {
    name: 'expire-quotes',
    everySeconds: 300,
    async run({ database, clock }) {
      const now = await clock.now();
      await inTransaction(database, system('job'), async (tx) => {
        const ended = await expireQuotes(tx, plantToday(now, timeZone), now);
        await emit(
          tx,
          now,
          ...ended.map(({ id: subjectId, customerId }) => ({ type: 'quote-expired', subjectId, customerId })),
        );
      });
    },
  };
}
