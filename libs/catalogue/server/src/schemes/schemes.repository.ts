import type { SchemeContent, Species, Standing, VersionState } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

/** One version of a scheme as it is kept; `standing` tells what became of it since its approval. */
export interface SchemeVersion {
  readonly id: string;
  /** What an edit sends back: the standing's once there is one, else the version's. */
  readonly rowVersion: number;
  readonly schemeId: string;
  readonly code: string;
  readonly species: Species;
  readonly version: number;
  readonly state: VersionState;
  readonly standing: Standing | null;
  readonly since: Date | null;
  readonly reason: string | null;
  readonly content: SchemeContent;
  readonly authoredBy: string;
  readonly approvedBy: string | null;
  readonly approvedAt: Date | null;
}

const versions = (tx: Tx) =>
  tx
    .selectFrom('cuttingSchemeVersions as v')
    .innerJoin('cuttingSchemes as s', 's.id', 'v.schemeId')
    .leftJoin('cuttingSchemeStandings as st', 'st.versionId', 'v.id')
    .selectAll('v')
    .select(['s.code', 's.species', 'st.standing', 'st.since', 'st.reason', 'st.rowVersion as standingRowVersion']);

type Row = Awaited<ReturnType<ReturnType<typeof versions>['execute']>>[number];

function toVersion({ name, kind, inputNodeId, outputs, ingredients, blend, note, ...row }: Row): SchemeVersion {
  const content = { name, kind, inputNodeId, outputs, ingredients, blend, note } as unknown as SchemeContent;
  const { standingRowVersion, ...rest } = row;
  return { ...rest, rowVersion: standingRowVersion ?? row.rowVersion, content } as SchemeVersion;
}

/** Every version of a scheme, newest first; empty where there is none of that code. */
export async function schemeVersions(tx: Tx, code: string): Promise<SchemeVersion[]> {
  const rows = await versions(tx).where('s.code', '=', code).orderBy('v.version', 'desc').execute();
  return rows.map(toVersion);
}

/** Versions in force, by the code of their scheme. */
export async function currentSchemes(tx: Tx): Promise<SchemeVersion[]> {
  const rows = await versions(tx).where('st.standing', '=', 'current').orderBy('s.code').execute();
  return rows.map(toVersion);
}

interface Wanted {
  readonly q: string | undefined;
  readonly inputNodeId: string | undefined;
  readonly after: string | null;
  readonly limit: number;
}

/** The newest version of each scheme by code, from the code after `after` on. */
export async function newestSchemes(tx: Tx, { q, inputNodeId, after, limit }: Wanted): Promise<SchemeVersion[]> {
  let query = versions(tx).where(({ eb, selectFrom }) =>
    eb(
      'v.version',
      '=',
      selectFrom('cuttingSchemeVersions as n')
        .select(({ fn }) => fn.max('n.version').as('newest'))
        .whereRef('n.schemeId', '=', 'v.schemeId'),
    ),
  );
  if (after !== null) query = query.where('s.code', '>', after);
  if (inputNodeId) query = query.where('v.inputNodeId', '=', inputNodeId);
  if (q) {
    const part = `%${q.replace(/[\\%_]/g, '\\$&')}%`;
    query = query.where(({ or, eb }) => or([eb('s.code', 'ilike', part), eb('v.name', 'ilike', part)]));
  }
  const rows = await query.orderBy('s.code').limit(limit).execute();
  return rows.map(toVersion);
}

/** Two people who write or move a scheme at once follow each other. Undefined where there is none of that code. */
export async function lockScheme(tx: Tx, code: string): Promise<string | undefined> {
  const row = await tx
    .selectFrom('cuttingSchemes')
    .select('id')
    .where('code', '=', code)
    .forUpdate()
    .executeTakeFirst();
  return row?.id;
}

export async function insertScheme(
  tx: Tx,
  scheme: { readonly id: string; readonly code: string; readonly species: string; readonly createdAt: Date },
): Promise<void> {
  await tx.insertInto('cuttingSchemes').values(scheme).execute();
}

const columnsOf = ({ outputs, ingredients, blend, ...rest }: SchemeContent) => ({
  ...rest,
  outputs: JSON.stringify(outputs),
  ingredients: JSON.stringify(ingredients),
  blend: blend === null ? null : JSON.stringify(blend),
});

interface NewVersion {
  readonly id: string;
  readonly schemeId: string;
  readonly version: number;
  readonly state: 'draft' | 'in-review';
  readonly content: SchemeContent;
  readonly authoredBy: string;
}

export async function insertSchemeVersion(tx: Tx, { content, ...rest }: NewVersion): Promise<void> {
  await tx
    .insertInto('cuttingSchemeVersions')
    .values({ ...rest, ...columnsOf(content) })
    .execute();
}

/** Changes a version that is not approved yet. */
export async function updateSchemeVersion(
  tx: Tx,
  id: string,
  change: {
    readonly content?: SchemeContent;
    readonly state?: VersionState;
    readonly approvedBy?: string;
    readonly approvedAt?: Date;
  },
): Promise<void> {
  const { content, ...columns } = change;
  await tx
    .updateTable('cuttingSchemeVersions')
    .set((eb) => ({ ...columns, ...(content ? columnsOf(content) : {}), rowVersion: eb('rowVersion', '+', 1) }))
    .where('id', '=', id)
    .execute();
}

/** Puts an approved version in force; the one before it is superseded. */
export async function makeSchemeCurrent(
  tx: Tx,
  { versionId, schemeId, since }: { readonly versionId: string; readonly schemeId: string; readonly since: Date },
): Promise<void> {
  await tx
    .updateTable('cuttingSchemeStandings')
    .set((eb) => ({ standing: 'superseded', since, rowVersion: eb('rowVersion', '+', 1) }))
    .where('schemeId', '=', schemeId)
    .where('standing', '=', 'current')
    .execute();
  await tx.insertInto('cuttingSchemeStandings').values({ versionId, schemeId, standing: 'current', since }).execute();
}

export async function withdrawSchemeVersion(tx: Tx, versionId: string, since: Date, reason: string): Promise<void> {
  await tx
    .updateTable('cuttingSchemeStandings')
    .set((eb) => ({ standing: 'withdrawn', since, reason, rowVersion: eb('rowVersion', '+', 1) }))
    .where('versionId', '=', versionId)
    .execute();
}

/** The code of a scheme that is there. */
export async function schemeCodeOf(tx: Tx, id: string): Promise<string> {
  const { code } = await tx.selectFrom('cuttingSchemes').select('code').where('id', '=', id).executeTakeFirstOrThrow();
  return code;
}

/** The code of the scheme that a version is of; undefined where it is of none. */
export async function schemeCodeOfVersion(tx: Tx, versionId: string): Promise<string | undefined> {
  const row = await tx
    .selectFrom('cuttingSchemeVersions as v')
    .innerJoin('cuttingSchemes as s', 's.id', 'v.schemeId')
    .select('s.code')
    .where('v.id', '=', versionId)
    .executeTakeFirst();
  return row?.code;
}
