import { newId } from '@seamwright/shared/util';
import type { Tx } from '../database/in-transaction';

export interface NewDocument {
  readonly customerId: string | null;
  /** `invoice`, … */
  readonly kind: string;
  readonly fileName: string;
  readonly mediaType: string;
  readonly bytes: Buffer;
}

/** Keeps a paper in the database, under row-level security like all else; gives its id. */
export async function storeDocument(tx: Tx, now: Date, document: NewDocument): Promise<string> {
  const id = newId();
  await tx
    .insertInto('documents')
    .values({ id, ...document, createdAt: now })
    .execute();
  return id;
}

export async function documentById(
  tx: Tx,
  id: string,
): Promise<{ fileName: string; mediaType: string; bytes: Buffer } | undefined> {
  return tx.selectFrom('documents').select(['fileName', 'mediaType', 'bytes']).where('id', '=', id).executeTakeFirst();
}
