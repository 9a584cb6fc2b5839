import { randomBytes } from 'node:crypto';

const alphabet = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789';

/** `length` random letters and digits. */
export function randomText(length: number): string {
  return Array.from(randomBytes(length), (byte) => alphabet[byte % alphabet.length]).join('');
}

/** A new id with the prefix that tells its kind: `newId('pi')` → `pi_…`. */
export function newId(prefix: string): string {
  return `${prefix}_${randomText(24)}`;
}
