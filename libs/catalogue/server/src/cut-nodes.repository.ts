import type { CutNode } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

/** The whole cut tree by id, parents before their children, siblings in their order. */
export async function cutNodes(tx: Tx): Promise<Map<string, CutNode>> {
  const rows = await tx.selectFrom('cutNodes').selectAll().orderBy('sort').orderBy('name').execute();
  const nodes = rows as CutNode[];
  const level = (parentId: string | null): CutNode[] => nodes.filter((node) => node.parentId === parentId);
  const ordered: CutNode[] = level(null);
  for (let at = 0; at < ordered.length; at++) ordered.push(...level(ordered[at]?.id ?? ''));
  return new Map(ordered.map((node) => [node.id, node]));
}

/** Adds nodes to the tree; parents must come before their children. */
export async function addCutNodes(tx: Tx, nodes: readonly CutNode[]): Promise<void> {
  if (nodes.length === 0) return;
  await tx.insertInto('cutNodes').values(nodes).execute();
}
