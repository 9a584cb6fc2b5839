import { applicationOf, type DeskRole } from '@seamwright/identity/domain';
import type { Tx } from '@seamwright/shared/server';
import { hashToken, newSecretToken } from '../tokens/secret-token';

export type LinkPurpose = 'invitation' | 'password-reset';

const LIVES_MS: Readonly<Record<LinkPurpose, number>> = { invitation: 7 * 86_400_000, 'password-reset': 3_600_000 };
const PAGE: Readonly<Record<LinkPurpose, string>> = {
  invitation: 'accept-invitation',
  'password-reset': 'set-password',
};

/** A new secret for a mailed link; only its hash is kept. The ones before it stop working. */
export async function makeLinkToken(tx: Tx, now: Date, personId: string, purpose: LinkPurpose): Promise<string> {
  const token = newSecretToken();
  await tx
    .insertInto('oneTimeTokens')
    .values({
      tokenHash: hashToken(token),
      personId,
      purpose,
      createdAt: now,
      expiresAt: new Date(now.getTime() + LIVES_MS[purpose]),
    })
    .execute();
  return token;
}

/** Where the link leads. The secret stands behind `#`, so that no server or log along the way sees it. */
export function linkAddress(
  publicOrigin: string,
  roles: readonly DeskRole[],
  purpose: LinkPurpose,
  token: string,
): string {
  const base = applicationOf(roles) === 'admin' ? '/admin' : '';
  return `${new URL(publicOrigin).origin}${base}/${PAGE[purpose]}#token=${token}`;
}

/** The person whom a link still works for: not used, not too old, none newer. Null otherwise. */
export async function personOfLink(tx: Tx, now: Date, token: string, purpose: LinkPurpose): Promise<string | null> {
  const link = await tx
    .selectFrom('oneTimeTokens as t')
    .select('t.personId')
    .where('t.tokenHash', '=', hashToken(token))
    .where('t.purpose', '=', purpose)
    .where('t.usedAt', 'is', null)
    .where('t.expiresAt', '>', now)
    .where((eb) =>
      eb.not(
        eb.exists(
          eb
            .selectFrom('oneTimeTokens as newer')
            .select('newer.tokenHash')
            .whereRef('newer.personId', '=', 't.personId')
            .whereRef('newer.purpose', '=', 't.purpose')
            .whereRef('newer.createdAt', '>', 't.createdAt'),
        ),
      ),
    )
    .forUpdate('t')
    .executeTakeFirst();
  return link?.personId ?? null;
}

/** Uses up every open link of a person: once a password is set, none may set another. */
export async function useUpLinks(tx: Tx, now: Date, personId: string): Promise<void> {
  await tx
    .updateTable('oneTimeTokens')
    .set({ usedAt: now })
    .where('personId', '=', personId)
    .where('usedAt', 'is', null)
    .execute();
}

/** Whether a link was made for the person since then. */
export async function hasLinkSince(tx: Tx, personId: string, purpose: LinkPurpose, since: Date): Promise<boolean> {
  const link = await tx
    .selectFrom('oneTimeTokens')
    .select('tokenHash')
    .where('personId', '=', personId)
    .where('purpose', '=', purpose)
    .where('createdAt', '>', since)
    .limit(1)
    .executeTakeFirst();
  return link !== undefined;
}
