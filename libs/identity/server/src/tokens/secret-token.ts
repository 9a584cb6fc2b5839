import { createHash, createHmac, randomBytes } from 'node:crypto';

/** A secret that is handed out once: 256 random bits, safe in an address. */
export const newSecretToken = (): string => randomBytes(32).toString('base64url');

/** What is kept of a secret. It has all its randomness, so a plain hash is enough. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('base64url');

/** A name for something that could be guessed (an address), which tells nothing without the key. */
export const keyedHash = (key: string, text: string): string =>
  createHmac('sha256', key).update(text).digest('base64url');
