import { sql } from 'kysely';
import { findable, pathTo, plainWords, type CutNode, type SpecificationVersion } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';
import { namesBeside } from './synonyms.repository';

/** Makes the version the one that is found for its specification. */
export async function makeFindable(
  tx: Tx,
  version: SpecificationVersion,
  nodes: ReadonlyMap<string, CutNode>,
): Promise<void> {
  const path = pathTo(nodes, version.cutNodeId);
  const found = findable(version);
  const nodeIds = path.map(({ id }) => id);
  const row = {
    versionId: version.id,
    code: version.code,
    name: version.name,
    species: version.species,
    cutNodeId: version.cutNodeId,
    primalNodeId: path.find(({ level }) => level === 'primal')?.id ?? null,
    nodeIds,
    sourceNodeId: version.sourceNodeId,
    usualChoiceKey: found.usualChoiceKey,
    usualPriceChangeMinor: found.usualPriceChangeMinorPerKg,
    pieceGrams: found.pieceGrams,
    piecesPerCase: found.piecesPerCase,
    boneStates: [...found.boneStates],
    fatBands: [...found.fatBands],
    portions: `{${found.portions.map((weight) => `[${weight},${weight}]`).join(',')}}`,
    portionBands: [...found.portionBands],
    packTypes: [...found.packTypes],
    ageingKind: version.ageing?.kind ?? null,
    ageingMinDays: version.ageing?.minDays ?? null,
    place: path.map(({ name }) => name).join(' '),
    also: await namesBeside(tx, { specificationId: version.specificationId, nodeIds }),
    rest: restOf(version),
  };
  await tx
    .insertInto('specificationSearch')
    .values({ specificationId: version.specificationId, ...row })
    .onConflict((conflict) => conflict.column('specificationId').doUpdateSet(row))
    .execute();
}

/** Takes a specification out of what can be found. */
export async function makeUnfindable(tx: Tx, specificationId: string): Promise<void> {
  await tx.deleteFrom('specificationSearch').where('specificationId', '=', specificationId).execute();
}

/** What a person may look for beside name, place and other names; the name again where it is written with accents. */
function restOf({ name, summary, boneState, finish, pieceKind, uneceItem }: SpecificationVersion): string {
  const plain = plainWords(name);
  return [
    summary,
    boneState,
    finish,
    pieceKind,
    uneceItem ?? '',
    ...(plain === name.toLowerCase() ? [] : [plain]),
  ].join(' ');
}

/** Brings what is found by other names up to date: of one specification, or of all under a node of the cut tree. */
export async function renameFindable(
  tx: Tx,
  { nodeId, specificationId }: { nodeId: string | null; specificationId: string | null },
): Promise<void> {
  await sql`
    update specification_search as found set also = coalesce((
      select string_agg(plain, ' ' order by plain) from cut_synonyms
      where specification_id = found.specification_id or node_id = any(found.node_ids)
    ), '')
    where ${nodeId === null ? sql`specification_id = ${specificationId}` : sql`node_ids @> array[${nodeId}]::uuid[]`}
  `.execute(tx);
}
