import { argon2id, hash, needsRehash, verify } from 'argon2';

const costs = (memoryKib: number) => ({ memoryCost: memoryKib, timeCost: 2, parallelism: 1 });

/** The same password typed on another keyboard gives the same characters. */
const plain = (password: string): string => password.normalize('NFKC');

/** Hashes with argon2id; the parameters stand in the hash. */
export const hashPassword = (password: string, memoryKib: number): Promise<string> =>
  hash(plain(password), { type: argon2id, ...costs(memoryKib) });

/** Whether a hash was made at other costs than today's. */
export const isOutdated = (stored: string, memoryKib: number): boolean => needsRehash(stored, costs(memoryKib));

const stand = new Map<number, Promise<string>>();

/**
 * Whether the password is right. Without a stored hash another one is checked, so that the time taken does not tell
 * whether somebody is known.
 */
export async function isRightPassword(stored: string | null, password: string, memoryKib: number): Promise<boolean> {
  if (stored !== null) return verify(stored, plain(password));
  let other = stand.get(memoryKib);
  if (!other) stand.set(memoryKib, (other = hashPassword('nobody has this one', memoryKib)));
  await verify(await other, plain(password));
  return false;
}
