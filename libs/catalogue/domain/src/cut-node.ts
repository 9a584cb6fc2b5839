import type { Species } from './cut-words';

export const CUT_LEVELS = ['species', 'primal', 'sub-primal', 'cut'] as const;
export type CutLevel = (typeof CUT_LEVELS)[number];

/** A place in the tree species → primal → cut. `uneceItemSeen` is false where the number is only from memory. */
export interface CutNode {
  readonly id: string;
  readonly parentId: string | null;
  readonly species: Species;
  readonly level: CutLevel;
  readonly name: string;
  readonly uneceItem: string | null;
  readonly uneceItemSeen: boolean;
  /** The region of the carcase diagram it belongs to. */
  readonly region: string | null;
  readonly sort: number;
}

/** The way from the species down to the node, the node last; empty when the node is not in the tree. */
export function pathTo(nodes: ReadonlyMap<string, CutNode>, nodeId: string): CutNode[] {
  const path: CutNode[] = [];
  for (let node = nodes.get(nodeId); node && !path.includes(node); node = nodes.get(node.parentId ?? '')) {
    path.unshift(node);
  }
  return path;
}

/** The primal a node belongs to, itself included; null above the primals. */
export function primalOf(nodes: ReadonlyMap<string, CutNode>, nodeId: string): CutNode | null {
  return pathTo(nodes, nodeId).find(({ level }) => level === 'primal') ?? null;
}
