import { createHash } from 'node:crypto';
import { RefusalError } from '@seamwright/shared/util';
import { personOf, type Caller } from '../database/caller';
import type { Tx } from '../database/in-transaction';
import { ProblemError } from '../http/problems';

export interface IdempotentRequest {
  readonly caller: Caller;
  readonly endpoint: string;
  readonly key: string;
  readonly hash: string;
  readonly now: Date;
}

export const isIdempotencyKey = (key: string): boolean => /^[\x21-\x7e]{8,100}$/.test(key);

/** What makes two requests the same: what was asked, in a fixed order of fields. */
export function hashRequest(input: unknown, file: Buffer | null): string {
  const hash = createHash('sha256').update(JSON.stringify(input, sortedFields));
  if (file) hash.update(file);
  return hash.digest('hex');
}

function sortedFields(_key: string, value: unknown): unknown {
  if (value === null || typeof value !== 'object' || Array.isArray(value)) return value;
  return Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)));
}

/**
 * Does a deed once per caller, endpoint and key. A second request that comes while the first is running waits for it
 * on the unique index. The same key with another request is refused.
 */
export async function once(
  tx: Tx,
  request: IdempotentRequest,
  make: () => Promise<string>,
): Promise<{ id: string; repeated: boolean }> {
  const caller = personOf(request.caller) ?? request.caller.kind;
  const mine = { caller, endpoint: request.endpoint, key: request.key };
  const stored = await tx
    .insertInto('idempotencyKeys')
    .values({ ...mine, requestHash: request.hash, createdAt: request.now })
    .onConflict((conflict) => conflict.doNothing())
    .returning('key')
    .executeTakeFirst();
  const row = () =>
    tx
      .selectFrom('idempotencyKeys')
      .select(['requestHash', 'resourceId'])
      .where('caller', '=', caller)
      .where('endpoint', '=', request.endpoint)
      .where('key', '=', request.key);
  if (!stored) {
    const first = await row().executeTakeFirst();
    if (!first?.resourceId) throw new RefusalError({ code: 'key-in-use', params: {} });
    if (first.requestHash !== request.hash) throw new ProblemError(422, { code: 'key-reused', params: {} });
    return { id: first.resourceId, repeated: true };
  }
  const id = await make();
  await tx
    .updateTable('idempotencyKeys')
    .set({ resourceId: id })
    .where('caller', '=', caller)
    .where('endpoint', '=', request.endpoint)
    .where('key', '=', request.key)
    .execute();
  return { id, repeated: false };
}
