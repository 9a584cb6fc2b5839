import type { CuttingStep, SchemeContent, SchemeOutput } from '@seamwright/catalogue/domain';
import { stepOfScheme } from '@seamwright/catalogue/domain';
import { BEEF_SCHEMES } from './beef-schemes';
import { LAMB_SCHEMES } from './lamb-schemes';
import { PORK_SCHEMES } from './pork-schemes';
import type { OutputData, SchemeData } from './scheme-data';

export const SCHEMES: readonly SchemeData[] = [...LAMB_SCHEMES, ...BEEF_SCHEMES, ...PORK_SCHEMES];

/** The scheme as it is written, its places by `nodeId`. */
export function contentOf(data: SchemeData, nodeId: (key: string) => string): SchemeContent {
  return {
    name: data.name,
    kind: data.kind ?? 'cutting',
    inputNodeId: nodeId(data.input),
    outputs: data.outputs.map((output) => outputOf(output, nodeId)),
    ingredients: data.ingredients ?? [],
    blend: data.blend ?? null,
    note: data.note ?? '',
  };
}

function outputOf(output: OutputData, nodeId: (key: string) => string): SchemeOutput {
  const yieldPpm = output.perMille * 1_000;
  if ('joint' in output) {
    const { joint, name } = output;
    return { key: joint, name, kind: 'joint-product', nodeId: nodeId(joint), yieldPpm, valueMinorPerKg: 0 };
  }
  const rest = { nodeId: null, yieldPpm, valueMinorPerKg: output.value };
  if ('waste' in output) return { key: keyOf(output.waste), name: output.waste, kind: 'by-product', ...rest };
  const name = output.name ?? `Trim ${output.trim}VL`;
  return { key: keyOf(name), name, kind: 'co-product', visualLean: output.trim, ...rest };
}

const keyOf = (name: string): string => name.toLowerCase().replace(/[^a-z0-9]+/g, '-');

/** The schemes by code as steps over the keys of the cut tree. */
export const schemeSteps = (): ReadonlyMap<string, CuttingStep> =>
  new Map(
    SCHEMES.map((data) => [
      data.code,
      stepOfScheme(
        data.code,
        contentOf(data, (key) => key),
      ),
    ]),
  );
