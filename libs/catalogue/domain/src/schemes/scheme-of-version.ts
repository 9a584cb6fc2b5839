import type { SpecificationVersion } from '../specification-version';
import type { CuttingStep } from './cutting-scheme';

/** The key of the cut itself among the outputs of a specification. */
export const CUT_KEY = 'cut';

type Cut = Pick<SpecificationVersion, 'code' | 'name' | 'sourceNodeId' | 'cutNodeId' | 'yieldPpm' | 'otherOutputs'>;

/**
 * A specification read as a scheme with one joint product, so that carcase, primals and specifications are one chain.
 * Its other outputs are known by the words of their names: "Trim 85VL" → `trim-85vl`.
 */
export function schemeOfVersion({ code, name, sourceNodeId, cutNodeId, yieldPpm, otherOutputs }: Cut): CuttingStep {
  const keys = keysOf(otherOutputs.map((output) => output.name));
  return {
    code,
    name,
    kind: 'cutting',
    inputNodeId: sourceNodeId,
    outputs: [
      { key: CUT_KEY, name, kind: 'joint-product', nodeId: cutNodeId, yieldPpm, valueMinorPerKg: 0 },
      ...otherOutputs.map((output, at) => ({ ...output, key: keys[at] ?? '', nodeId: null })),
    ],
    addedPpm: 0,
  };
}

/** Two outputs of one name get two keys: the second ends in -2. */
function keysOf(names: readonly string[]): string[] {
  const times = new Map<string, number>([[CUT_KEY, 1]]);
  return names.map((name) => {
    const slug = slugOf(name);
    const count = (times.get(slug) ?? 0) + 1;
    times.set(slug, count);
    return count === 1 ? slug : `${slug}-${count}`;
  });
}

const slugOf = (name: string): string =>
  name
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '') || 'output';
