import { pathTo, type CutNode, type SpecificationVersion } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

/** Makes the version the one that is found for its specification. */
export async function makeFindable(
  tx: Tx,
  version: SpecificationVersion,
  nodes: ReadonlyMap<string, CutNode>,
): Promise<void> {
  const path = pathTo(nodes, version.cutNodeId);
  const row = {
    versionId: version.id,
    code: version.code,
    name: version.name,
    species: version.species,
    primalNodeId: path.find(({ level }) => level === 'primal')?.id ?? null,
    boneState: version.boneState,
    words: wordsOf(version, path),
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

function wordsOf(
  { code, name, summary, boneState, finish, pieceKind }: SpecificationVersion,
  path: readonly CutNode[],
) {
  return [code, name, summary, ...path.map((node) => node.name), boneState, finish, pieceKind].join(' ');
}
