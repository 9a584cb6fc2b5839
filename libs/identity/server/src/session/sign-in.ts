import type { Answer, CheckedInput } from '@seamwright/shared/contracts';
import type { signIn as signInEndpoint } from '@seamwright/identity/contracts';
import { normaliseEmail } from '@seamwright/identity/domain';
import { inTransaction, ProblemError, system, type RequestContext } from '@seamwright/shared/server';
import type { IdentityParts } from '../identity-parts';
import { hashPassword, isOutdated, isRightPassword } from '../passwords';
import { setPasswordHash } from '../people/people.repository';
import { credentialsByEmail } from '../people/signed-in-person';
import { attemptOf, countAttempt, forgive } from './sign-in-attempts';
import { keepRefreshToken } from './session-cookie';
import { startSession } from './sessions.repository';
import { presentSignedIn } from './signed-in.presenter';

/**
 * Signs in by e-mail and password. Unknown, wrong and inactive are refused alike (`sign-in-refused`, 401); who came to
 * the wrong application is told so only after the right password.
 */
export async function signIn(
  parts: IdentityParts,
  context: RequestContext,
  { application, email, password }: CheckedInput<typeof signInEndpoint>['body'],
): Promise<Answer<typeof signInEndpoint>> {
  const now = await parts.clock.now();
  const address = normaliseEmail(email);
  const attempt = attemptOf(parts.jwtSecrets[0], address, context.source);
  const found = await inTransaction(context.database, system('sign-in'), async (tx) => {
    await countAttempt(tx, attempt, now);
    return credentialsByEmail(tx, address);
  });

  // Outside the transaction: the check takes its time on purpose.
  const right = await isRightPassword(found?.passwordHash ?? null, password, parts.argonMemoryKib);
  if (!found?.passwordHash || !right || !found.maySignIn)
    throw new ProblemError(401, { code: 'sign-in-refused', params: {} });
  const { person, passwordHash } = found;
  const newHash = isOutdated(passwordHash, parts.argonMemoryKib)
    ? await hashPassword(password, parts.argonMemoryKib)
    : null;

  const issued = await inTransaction(context.database, system('sign-in'), async (tx) => {
    await forgive(tx, attempt);
    if (newHash) await setPasswordHash(tx, person.id, newHash);
    if (person.application !== application) return null;
    return startSession(tx, now, { personId: person.id, application, device: context.userAgent });
  });
  if (!issued) {
    const code = person.application === 'admin' ? 'sign-in-at-desk' : 'sign-in-at-storefront';
    throw new ProblemError(403, { code, params: {} });
  }
  keepRefreshToken(context, application, now, issued);
  return presentSignedIn(parts, person);
}
