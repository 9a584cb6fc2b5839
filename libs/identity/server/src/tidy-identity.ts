import { inTransaction, system, type PeriodicJob } from '@seamwright/shared/server';

const DAY_MS = 86_400_000;
/** How long ended sessions and used links are kept, so that a question about them can still be answered. */
const KEPT_DAYS = 90;

/** Removes what proves nothing any more: old failures at once, ended sessions and links after a while. */
export const tidyIdentity: PeriodicJob = {
  name: 'tidy-identity',
  everySeconds: 3600,
  async run({ database, clock }) {
    const now = await clock.now();
    const old = new Date(now.getTime() - KEPT_DAYS * DAY_MS);
    await inTransaction(database, system('job'), async (tx) => {
      await tx
        .deleteFrom('signInFailures')
        .where('failedAt', '<', new Date(now.getTime() - DAY_MS))
        .execute();
      await tx
        .deleteFrom('signInSessions')
        .where((eb) => eb.or([eb('endedAt', '<', old), eb('expiresAt', '<', old)]))
        .execute();
      await tx.deleteFrom('oneTimeTokens').where('expiresAt', '<', old).execute();
    });
  },
};
