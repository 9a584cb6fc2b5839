import { formatPercent, ppm, roundFraction, toSafeNumber, type Refusal } from '@seamwright/shared/util';
import type { CutNode } from '../cut-node';
import { blendLean, leanWithin } from './blend-lean';
import { addedPpm, schemeLossPpm, type Blend, type SchemeContent, type SchemeOutput } from './cutting-scheme';

const fault = (code: string, pointer: string, params: Refusal['params'] = {}): Refusal => ({ code, params, pointer });

/** Everything that is wrong with a scheme, each with a pointer to its field; empty when it may be sent to review. */
export function faultsOfScheme(scheme: SchemeContent, nodes: ReadonlyMap<string, CutNode>): Refusal[] {
  return [
    ...faultsOfInput(scheme, nodes),
    ...scheme.outputs.flatMap((output, at) => faultsOfOutput(scheme, output, at, nodes)),
    ...faultsOfSum(scheme),
    ...faultsOfIngredients(scheme),
    ...faultsOfBlend(scheme),
  ];
}

function faultsOfInput({ inputNodeId, outputs }: SchemeContent, nodes: ReadonlyMap<string, CutNode>): Refusal[] {
  return [
    ...(nodes.has(inputNodeId) ? [] : [fault('scheme-node-unknown', '/inputNodeId')]),
    ...(outputs.length > 0 ? [] : [fault('scheme-without-outputs', '/outputs')]),
  ];
}

/** Keys stand in heads of workbooks and addresses. */
const SLUG = /^[a-z0-9][a-z0-9-]*$/;

function faultsOfOutput(
  { inputNodeId, outputs }: SchemeContent,
  { key, name, kind, nodeId, yieldPpm, valueMinorPerKg, visualLean }: SchemeOutput,
  at: number,
  nodes: ReadonlyMap<string, CutNode>,
): Refusal[] {
  const pointer = `/outputs/${at}`;
  const earlier = outputs.slice(0, at);
  const faults: Refusal[] = [];
  if (!SLUG.test(key)) faults.push(fault('scheme-key-form', `${pointer}/key`, { key }));
  if (earlier.some((other) => other.key === key)) faults.push(fault('scheme-output-twice', `${pointer}/key`, { name }));
  if (earlier.some((other) => other.name === name))
    faults.push(fault('scheme-output-twice', `${pointer}/name`, { name }));
  if (yieldPpm <= 0) faults.push(fault('scheme-yield-size', `${pointer}/yieldPpm`));
  if (valueMinorPerKg < 0 && kind !== 'by-product')
    faults.push(fault('scheme-value-below-zero', `${pointer}/valueMinorPerKg`));
  if (kind === 'co-product' && visualLean === undefined)
    faults.push(fault('scheme-lean-missing', `${pointer}/visualLean`));
  if (visualLean !== undefined && (visualLean < 0 || visualLean > 100))
    faults.push(fault('scheme-lean-range', `${pointer}/visualLean`));
  const nodeFault = faultOfNode(kind, nodeId, inputNodeId, nodes);
  return nodeFault ? [...faults, fault(nodeFault, `${pointer}/nodeId`)] : faults;
}

function faultOfNode(
  kind: SchemeOutput['kind'],
  nodeId: string | null,
  inputNodeId: string,
  nodes: ReadonlyMap<string, CutNode>,
): string | null {
  if (kind !== 'joint-product') return nodeId === null ? null : 'scheme-place-for-joints-only';
  if (nodeId === null) return 'scheme-joint-without-place';
  const node = nodes.get(nodeId);
  if (!node) return 'scheme-node-unknown';
  if (nodeId === inputNodeId) return 'scheme-output-is-input';
  const species = nodes.get(inputNodeId)?.species;
  return species === undefined || node.species === species ? null : 'scheme-other-species';
}

/** Outputs add to at most 1; a recipe's to 1 and what its ingredients weigh. */
function faultsOfSum(scheme: SchemeContent): Refusal[] {
  if (schemeLossPpm(scheme) >= 0) return [];
  const most = 1_000_000 + addedPpm(scheme);
  const percent = formatPercent(ppm(most - schemeLossPpm(scheme)));
  return [fault('scheme-yields-over', '/outputs', { percent, most: formatPercent(ppm(most)) })];
}

function faultsOfIngredients({ kind, ingredients }: SchemeContent): Refusal[] {
  if (kind !== 'recipe') return ingredients.length > 0 ? [fault('scheme-only-recipes-add', '/ingredients')] : [];
  if (ingredients.length === 0) return [fault('scheme-recipe-adds-nothing', '/ingredients')];
  return ingredients.flatMap(({ name, ppmOfInput }, at) => [
    ...(ppmOfInput > 0 ? [] : [fault('scheme-ingredient-size', `/ingredients/${at}/ppmOfInput`)]),
    ...(ingredients.slice(0, at).some((other) => other.name === name)
      ? [fault('scheme-output-twice', `/ingredients/${at}/name`, { name })]
      : []),
  ]);
}

function faultsOfBlend({ kind, blend }: SchemeContent): Refusal[] {
  if (kind !== 'blend') return blend === null ? [] : [fault('scheme-only-blends-mix', '/blend')];
  if (blend === null || blend.parts.length < 2) return [fault('scheme-blend-parts', '/blend')];
  const lean = blend.parts.flatMap(({ visualLean, tolerance }, at) =>
    visualLean < 0 || visualLean > 100 || tolerance < 0 || tolerance > 100
      ? [fault('scheme-lean-range', `/blend/parts/${at}/visualLean`)]
      : [],
  );
  const sizes = blend.parts.flatMap(({ sharePpm }, at) =>
    sharePpm > 0 ? [] : [fault('scheme-yield-size', `/blend/parts/${at}/sharePpm`)],
  );
  const wrong = [...lean, ...sizes];
  return wrong.length > 0 ? wrong : faultsOfMixture(blend);
}

function faultsOfMixture(blend: Blend): Refusal[] {
  if (blend.leastLean < 0 || blend.mostLean > 100 || blend.leastLean > blend.mostLean)
    return [fault('scheme-blend-band', '/blend/leastLean')];
  const sum = blend.parts.reduce((total, { sharePpm }) => total + sharePpm, 0);
  if (sum !== 1_000_000) return [fault('scheme-blend-shares', '/blend/parts', { percent: formatPercent(ppm(sum)) })];
  const lean = blendLean(blend.parts.map(({ sharePpm, ...part }) => ({ ...part, weight: sharePpm })));
  if (leanWithin(blend, lean) !== 'no') return [];
  const stated = toSafeNumber(roundFraction({ n: lean.stated.n * 10_000n, d: lean.stated.d }, 'half-up'));
  return [
    fault('scheme-blend-outside', '/blend/parts', {
      lean: formatPercent(ppm(stated), 'en-GB', 1),
      least: blend.leastLean,
      most: blend.mostLean,
    }),
  ];
}
