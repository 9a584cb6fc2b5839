import { sql } from 'kysely';
import type { Tx } from '@seamwright/shared/server';

export interface Synonym {
  readonly id: string;
  readonly nodeId: string | null;
  readonly specificationId: string | null;
  /** The name of the cut, or the code of the specification, that it is another name of. */
  readonly ofName: string;
  readonly term: string;
  readonly plain: string;
  readonly region: string | null;
  readonly createdAt: Date;
}

const synonyms = (tx: Tx) =>
  tx
    .selectFrom('cutSynonyms as y')
    .leftJoin('cutNodes as n', 'n.id', 'y.nodeId')
    .leftJoin('specifications as s', 's.id', 'y.specificationId')
    .select(['y.id', 'y.nodeId', 'y.specificationId', 'y.term', 'y.plain', 'y.region', 'y.createdAt'])
    .select(sql<string>`coalesce(n.name, s.code, '')`.as('ofName'));

export interface SynonymsWanted {
  readonly q: string | undefined;
  readonly nodeId: string | undefined;
  readonly specificationId: string | undefined;
  readonly after: readonly [plain: string, id: string] | null;
  readonly limit: number;
}

/** By term; one more than `limit`. `q` in plain words. */
export function listSynonyms(tx: Tx, wanted: SynonymsWanted): Promise<Synonym[]> {
  const { q, nodeId, specificationId, after, limit } = wanted;
  let query = synonyms(tx);
  if (q) query = query.where('y.plain', 'like', `%${q.replace(/[\\%_]/g, '\\$&')}%`);
  if (nodeId) query = query.where('y.nodeId', '=', nodeId);
  if (specificationId) query = query.where('y.specificationId', '=', specificationId);
  if (after) query = query.where(sql<boolean>`(y.plain, y.id) > (${after[0]}, ${after[1]}::uuid)`);
  return query
    .orderBy('y.plain')
    .orderBy('y.id')
    .limit(limit + 1)
    .execute();
}

export const synonymById = (tx: Tx, id: string): Promise<Synonym | undefined> =>
  synonyms(tx).where('y.id', '=', id).executeTakeFirst();

export async function insertSynonym(tx: Tx, synonym: Omit<Synonym, 'ofName'>): Promise<void> {
  await tx.insertInto('cutSynonyms').values(synonym).execute();
}

export async function deleteSynonym(tx: Tx, id: string): Promise<void> {
  await tx.deleteFrom('cutSynonyms').where('id', '=', id).execute();
}

/** Every other name of a specification, its own and those of the cuts above it, in plain words. */
export async function namesBeside(
  tx: Tx,
  { specificationId, nodeIds }: { specificationId: string; nodeIds: readonly string[] },
): Promise<string> {
  const rows = await tx
    .selectFrom('cutSynonyms')
    .select('plain')
    .where((where) =>
      where.or([
        where('specificationId', '=', specificationId),
        where('nodeId', '=', sql<string>`any(${nodeIds}::uuid[])`),
      ]),
    )
    .orderBy('plain')
    .execute();
  return rows.map(({ plain }) => plain).join(' ');
}
