import type { CutNode } from '@seamwright/catalogue/domain';
import {
  addCutNodes,
  addSynonym,
  approveVersion,
  createSpecification,
  createVersion,
  submitVersion,
} from '@seamwright/catalogue/server';
import { inTransaction, type Caller, type Database } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { CUT_TREE } from './cut-tree';
import { SPECIFICATIONS } from './specifications';
import { SYNONYMS } from './synonyms';

interface CatalogueSeed {
  readonly now: Date;
  /** Two different technical people: one writes, the other approves. */
  readonly author: Caller;
  readonly approver: Caller;
}

/** Loads cut tree, other names and specifications through the use cases; gives the specification ids by code. */
export async function seedCatalogue(
  database: Database,
  { now, author, approver }: CatalogueSeed,
): Promise<ReadonlyMap<string, string>> {
  const nodeIds = new Map(CUT_TREE.map(({ key }) => [key, newId()]));
  const nodeId = (key: string): string => {
    const id = nodeIds.get(key);
    if (id === undefined) throw new Error(`There is no cut "${key}" in the tree`);
    return id;
  };
  const specificationIds = new Map<string, string>();
  const versionIds = await inTransaction(database, author, async (tx) => {
    await addCutNodes(tx, nodesOf(nodeId));
    for (const { cut, region, terms } of SYNONYMS) {
      for (const term of terms) {
        await addSynonym(tx, { now, added: { nodeId: nodeId(cut), specificationId: null, term, region } });
      }
    }
    const written: string[] = [];
    for (const { code, cut, source, ...content } of SPECIFICATIONS) {
      const specificationId = await createSpecification(tx, { now, code, cutNodeId: nodeId(cut) });
      const versionId = await createVersion(tx, {
        caller: author,
        specificationId,
        content: { ...content, sourceNodeId: nodeId(source) },
      });
      await submitVersion(tx, versionId);
      specificationIds.set(code, specificationId);
      written.push(versionId);
    }
    return written;
  });
  await inTransaction(database, approver, async (tx) => {
    for (const versionId of versionIds) await approveVersion(tx, { now, caller: approver, versionId });
  });
  return specificationIds;
}

function nodesOf(nodeId: (key: string) => string): CutNode[] {
  return CUT_TREE.map(({ key, parent, species, level, name, unece, region }, at) => ({
    id: nodeId(key),
    parentId: parent === null ? null : nodeId(parent),
    species,
    level,
    name,
    uneceItem: unece?.[0] ?? null,
    uneceItemSeen: unece?.[1] ?? false,
    region,
    sort: at,
  }));
}
