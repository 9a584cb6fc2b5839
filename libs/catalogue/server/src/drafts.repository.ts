import type { DraftContent } from '@seamwright/catalogue/domain';
import { stale, type Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

/** A draft with its specification and its author. */
export interface DraftRow {
  readonly id: string;
  readonly rowVersion: number;
  readonly specificationId: string;
  readonly code: string;
  readonly species: string;
  readonly cutNodeId: string;
  readonly baseVersion: number | null;
  readonly content: DraftContent;
  readonly authoredBy: string;
  readonly authorName: string;
  readonly updatedAt: Date;
}

const drafts = (tx: Tx) =>
  tx
    .selectFrom('specificationDrafts as d')
    .innerJoin('specifications as s', 's.id', 'd.specificationId')
    .innerJoin('people as p', 'p.id', 'd.authoredBy')
    .select([
      'd.id',
      'd.rowVersion',
      'd.specificationId',
      's.code',
      's.species',
      's.cutNodeId',
      'd.baseVersion',
      'd.content',
      'd.authoredBy',
      'p.name as authorName',
      'd.updatedAt',
    ]);

export async function draftOf(tx: Tx, code: string): Promise<DraftRow | undefined> {
  return (await drafts(tx).where('s.code', '=', code).executeTakeFirst()) as DraftRow | undefined;
}

export async function draftById(tx: Tx, id: string): Promise<DraftRow | undefined> {
  return (await drafts(tx).where('d.id', '=', id).executeTakeFirst()) as DraftRow | undefined;
}

/** Every open draft, the latest touched first. */
export async function openDrafts(tx: Tx): Promise<DraftRow[]> {
  return (await drafts(tx).orderBy('d.updatedAt', 'desc').execute()) as unknown as DraftRow[];
}

export interface NewDraft {
  readonly specificationId: string;
  readonly baseVersion: number | null;
  readonly content: DraftContent;
  readonly authoredBy: string;
}

export async function insertDraft(tx: Tx, now: Date, { content, ...draft }: NewDraft): Promise<string> {
  const id = newId();
  await tx
    .insertInto('specificationDrafts')
    .values({ id, ...draft, content: JSON.stringify(content), createdAt: now, updatedAt: now })
    .execute();
  return id;
}

/** Refuses `stale` when the draft changed since it was read. */
export async function updateDraft(
  tx: Tx,
  now: Date,
  { id, rowVersion, content }: { id: string; rowVersion: number; content: DraftContent },
): Promise<void> {
  const changed = await tx
    .updateTable('specificationDrafts')
    .set((eb) => ({ content: JSON.stringify(content), updatedAt: now, rowVersion: eb('rowVersion', '+', 1) }))
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (changed.numUpdatedRows === 0n) throw stale();
}

/** Refuses `stale` when the draft changed since it was read. */
export async function deleteDraft(tx: Tx, { id, rowVersion }: { id: string; rowVersion: number }): Promise<void> {
  const gone = await tx
    .deleteFrom('specificationDrafts')
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (gone.numDeletedRows === 0n) throw stale();
}
