import { ok, refuse, type Result } from '@seamwright/shared/util';
import { COMMON_PASSWORDS } from './common-passwords';
import { normaliseEmail } from './email';

export const MIN_PASSWORD_LENGTH = 12;
/** Long enough for any sentence, short enough that hashing can't be made expensive by its input. */
export const MAX_PASSWORD_LENGTH = 200;

/** One letter or one short run again and again: "aaaaaaaaaaaa", "abcabcabcabc". */
const REPEATED = /^(.{1,4})\1+$/su;

/**
 * Whether a password may be used: at least 12 characters (as people count them), not the e-mail address or its name
 * part, not one that is tried first everywhere. No rule asks for kinds of characters: length is what counts.
 * Refuses with `password-short`, `password-long`, `password-is-email` or `password-common`.
 */
export function checkPassword(password: string, email: string): Result<string> {
  const length = [...password].length;
  if (length < MIN_PASSWORD_LENGTH) return refuse('password-short', { least: MIN_PASSWORD_LENGTH }, '/password');
  if (length > MAX_PASSWORD_LENGTH) return refuse('password-long', { most: MAX_PASSWORD_LENGTH }, '/password');
  const plain = password.normalize('NFKC').trim().toLowerCase();
  const address = normaliseEmail(email);
  if (address !== '' && (plain === address || plain === address.split('@')[0]))
    return refuse('password-is-email', {}, '/password');
  if (COMMON_PASSWORDS.has(plain) || REPEATED.test(plain)) return refuse('password-common', {}, '/password');
  return ok(password);
}
