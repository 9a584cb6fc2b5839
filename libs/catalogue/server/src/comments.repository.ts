import type { SpecificationComment } from '@seamwright/catalogue/contracts';
import type { Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

export interface NewComment {
  readonly specificationId: string;
  /** Null while it is about the draft. */
  readonly version: number | null;
  readonly pointer: string | null;
  readonly body: string;
  readonly saidBy: string;
}

export async function insertComment(tx: Tx, now: Date, comment: NewComment): Promise<string> {
  const id = newId();
  await tx
    .insertInto('specificationComments')
    .values({ id, ...comment, saidAt: now })
    .execute();
  return id;
}

const comments = (tx: Tx) =>
  tx
    .selectFrom('specificationComments as c')
    .innerJoin('people as p', 'p.id', 'c.saidBy')
    .select(['c.id', 'c.version', 'c.pointer', 'c.body', 'p.name as saidByName', 'c.saidAt']);

/** What was said of a specification, oldest first. */
export async function commentsOf(tx: Tx, specificationId: string): Promise<SpecificationComment[]> {
  const rows = await comments(tx).where('c.specificationId', '=', specificationId).orderBy('c.saidAt').execute();
  return rows.map((row) => ({ ...row, saidAt: row.saidAt.toISOString() }));
}

export async function commentById(tx: Tx, id: string): Promise<SpecificationComment> {
  const row = await comments(tx).where('c.id', '=', id).executeTakeFirstOrThrow();
  return { ...row, saidAt: row.saidAt.toISOString() };
}

/** What was said of the draft becomes said of the version that it became, and back. */
export async function moveComments(
  tx: Tx,
  specificationId: string,
  { from, to }: { from: number | null; to: number | null },
): Promise<void> {
  await tx
    .updateTable('specificationComments')
    .set({ version: to })
    .where('specificationId', '=', specificationId)
    .where('version', 'is not distinct from', from)
    .execute();
}
