import { sql } from 'kysely';
import { LOCK_OUT_WINDOW_MINUTES, waitBeforeSignIn } from '@seamwright/identity/domain';
import { ProblemError, type Tx } from '@seamwright/shared/server';
import { keyedHash } from '../tokens/secret-token';

/** Whose password is tried, from where: both only as keyed hashes. */
export interface Attempt {
  readonly emailHash: string;
  readonly sourceHash: string;
}

export const attemptOf = (key: string, email: string, source: string): Attempt => ({
  emailHash: keyedHash(key, `email:${email}`),
  sourceHash: keyedHash(key, `source:${source}`),
});

const earlier = (tx: Tx, { emailHash, sourceHash }: Attempt, now: Date) =>
  tx
    .selectFrom('signInFailures')
    .select('failedAt')
    .where('emailHash', '=', emailHash)
    .where('sourceHash', '=', sourceHash)
    .where('failedAt', '>', new Date(now.getTime() - LOCK_OUT_WINDOW_MINUTES * 60_000))
    .execute();

/**
 * Writes the attempt down as failed before the password is looked at, so that many at once count as many; `forgive`
 * takes it back when the password was right. Refuses with `sign-in-wait` when there were too many.
 */
export async function countAttempt(tx: Tx, attempt: Attempt, now: Date): Promise<void> {
  await sql`select pg_advisory_xact_lock(hashtextextended(${attempt.emailHash + attempt.sourceHash}, 0))`.execute(tx);
  const failures = await earlier(tx, attempt, now);
  const seconds = waitBeforeSignIn(
    failures.map(({ failedAt }) => failedAt),
    now,
  );
  if (seconds > 0) throw new ProblemError(429, { code: 'sign-in-wait', params: { seconds } });
  await tx
    .insertInto('signInFailures')
    .values({ ...attempt, failedAt: now })
    .execute();
}

/** Forgets the failures of somebody who proved to know the password. */
export async function forgive(tx: Tx, { emailHash, sourceHash }: Attempt): Promise<void> {
  await tx
    .deleteFrom('signInFailures')
    .where('emailHash', '=', emailHash)
    .where('sourceHash', '=', sourceHash)
    .execute();
}
