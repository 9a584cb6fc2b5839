/** A step as far as a circle needs it. */
interface Broken {
  readonly inputNodeId: string;
  readonly outputs: readonly { readonly nodeId: string | null }[];
}

/**
 * The way round when `candidate` would close a circle with the steps that stand: node ids from its input back to its
 * input; null when it wouldn't. What is cut from a piece can never be cut into that piece again.
 */
export function cycleThrough(candidate: Broken, standing: readonly Broken[]): string[] | null {
  const next = new Map<string, Set<string>>();
  for (const { inputNodeId, outputs } of standing) {
    const to = next.get(inputNodeId) ?? new Set();
    for (const { nodeId } of outputs) if (nodeId !== null) to.add(nodeId);
    next.set(inputNodeId, to);
  }
  const goal = candidate.inputNodeId;
  const seen = new Set<string>();
  const ways = candidate.outputs.flatMap(({ nodeId }) => (nodeId === null ? [] : [[goal, nodeId]]));
  for (let at = 0; at < ways.length; at++) {
    const way = ways[at] ?? [];
    const last = way.at(-1) ?? '';
    if (last === goal) return way;
    if (seen.has(last)) continue;
    seen.add(last);
    for (const to of next.get(last) ?? []) ways.push([...way, to]);
  }
  return null;
}
