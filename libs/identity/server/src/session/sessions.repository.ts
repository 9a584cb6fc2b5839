import { sessionEnd, type Application } from '@seamwright/identity/domain';
import type { Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { hashToken, newSecretToken } from '../tokens/secret-token';

export type EndReason =
  'signed-out' | 'signed-out-everywhere' | 'reuse' | 'made-inactive' | 'password-changed' | 'ended-by-steward';

/** A refresh token to be put into the cookie, and until when. */
export interface IssuedToken {
  readonly sessionId: string;
  readonly token: string;
  readonly expiresAt: Date;
}

export interface NewSession {
  readonly personId: string;
  readonly application: Application;
  readonly device: string;
}

/** Opens a session with the first token of its chain. */
export async function startSession(tx: Tx, now: Date, session: NewSession): Promise<IssuedToken> {
  const id: string = newId();
  const expiresAt = sessionEnd(now, now);
  await tx
    .insertInto('signInSessions')
    .values({ id, ...session, createdAt: now, lastUsedAt: now, expiresAt })
    .execute();
  return { sessionId: id, token: await addToken(tx, now, id, 1), expiresAt };
}

export async function addToken(tx: Tx, now: Date, sessionId: string, generation: number): Promise<string> {
  const token = newSecretToken();
  await tx
    .insertInto('refreshTokens')
    .values({ tokenHash: hashToken(token), sessionId, generation, issuedAt: now })
    .execute();
  return token;
}

/** The session that a refresh token belongs to, ended or not. */
export async function sessionIdOfToken(tx: Tx, token: string): Promise<string | null> {
  const row = await tx
    .selectFrom('refreshTokens')
    .select('sessionId')
    .where('tokenHash', '=', hashToken(token))
    .executeTakeFirst();
  return row?.sessionId ?? null;
}

/** Locks a session, so that two renewals come one after the other. */
export const lockSession = (tx: Tx, sessionId: string) =>
  tx.selectFrom('signInSessions').selectAll().where('id', '=', sessionId).forUpdate().executeTakeFirstOrThrow();

/** The shown token's place in its chain, beside the newest place. */
export async function placeInChain(tx: Tx, sessionId: string, token: string) {
  const shown = await tx
    .selectFrom('refreshTokens')
    .select(['generation', 'replacedAt'])
    .where('tokenHash', '=', hashToken(token))
    .executeTakeFirstOrThrow();
  const { newest } = await tx
    .selectFrom('refreshTokens')
    .select((eb) => eb.fn.max('generation').as('newest'))
    .where('sessionId', '=', sessionId)
    .executeTakeFirstOrThrow();
  return { shown, newest };
}

/** Marks all tokens of a chain that were never used as replaced. */
export async function replaceTokens(tx: Tx, now: Date, sessionId: string): Promise<void> {
  await tx
    .updateTable('refreshTokens')
    .set({ replacedAt: now })
    .where('sessionId', '=', sessionId)
    .where('replacedAt', 'is', null)
    .execute();
}

export async function touchSession(tx: Tx, now: Date, sessionId: string, expiresAt: Date): Promise<void> {
  await tx.updateTable('signInSessions').set({ lastUsedAt: now, expiresAt }).where('id', '=', sessionId).execute();
}

const openOnes = (tx: Tx, now: Date, because: EndReason) =>
  tx.updateTable('signInSessions').set({ endedAt: now, endedBecause: because }).where('endedAt', 'is', null);

/** Ends one session; given a person, only when it is that person's. True when there was one to end. */
export async function endSession(
  tx: Tx,
  now: Date,
  sessionId: string,
  because: EndReason,
  personId?: string,
): Promise<boolean> {
  let ending = openOnes(tx, now, because).where('id', '=', sessionId);
  if (personId) ending = ending.where('personId', '=', personId);
  return (await ending.executeTakeFirst()).numUpdatedRows === 1n;
}

/** Ends the open sessions of a person, all of them or all but one. */
export async function endSessionsOf(
  tx: Tx,
  now: Date,
  personId: string,
  because: EndReason,
  butSessionId: string | null = null,
): Promise<void> {
  let ending = openOnes(tx, now, because).where('personId', '=', personId);
  if (butSessionId) ending = ending.where('id', '!=', butSessionId);
  await ending.execute();
}

/** Ends the open sessions of everybody who buys for a customer. */
export async function endSessionsOfCustomer(tx: Tx, now: Date, customerId: string): Promise<void> {
  await openOnes(tx, now, 'made-inactive')
    .where('personId', 'in', (eb) => eb.selectFrom('people').select('id').where('customerId', '=', customerId))
    .execute();
}

/** A person's sessions that are open, the last used first. */
export const openSessionsOf = (tx: Tx, now: Date, personId: string) =>
  tx
    .selectFrom('signInSessions')
    .select(['id', 'application', 'device', 'createdAt', 'lastUsedAt'])
    .where('personId', '=', personId)
    .where('endedAt', 'is', null)
    .where('expiresAt', '>', now)
    .orderBy('lastUsedAt', 'desc')
    .orderBy('id')
    .execute();
