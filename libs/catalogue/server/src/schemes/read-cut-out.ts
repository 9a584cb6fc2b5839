import type { CutOutAnswer } from '@seamwright/catalogue/contracts';
import {
  cutOut,
  cutOutGrams,
  cutOutTotals,
  schemeOfVersion,
  shareInPpm,
  stepOfScheme,
  type CuttingStep,
} from '@seamwright/catalogue/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { grams, RefusalError, unwrap } from '@seamwright/shared/util';
import { cutNodes } from '../cut-nodes.repository';
import { specificationsByCodes } from '../specifications.repository';
import { currentSchemes } from './schemes.repository';

interface Asked {
  readonly nodeId: string;
  readonly grams: number;
  /** Codes that are gone through at the pieces that they start from. */
  readonly through: readonly string[];
}

/**
 * A piece of a node broken down to the end: at each node by what was named, else by the first cutting scheme in force.
 * Refuses `scheme-through-unknown`, `scheme-through-twice` (code), and as the chain does.
 */
export async function readCutOut(tx: Tx, asked: Asked): Promise<CutOutAnswer> {
  const node = (await cutNodes(tx)).get(asked.nodeId);
  if (!node) throw notFound();
  const whole = grams(asked.grams);
  const out = unwrap(cutOut(asked.nodeId, await chosenSteps(tx, asked.through)));
  const weights = cutOutGrams(out, whole);
  const { jointProducts, coProducts, byProducts, loss } = cutOutTotals(out);
  return {
    nodeId: node.id,
    nodeName: node.name,
    grams: whole,
    lines: out.lines.map(({ share, through, ...line }, at) => ({
      ...line,
      through: [...through],
      sharePpm: shareInPpm(share),
      grams: weights[at] ?? 0,
    })),
    loss: { sharePpm: shareInPpm(loss), grams: weights.at(-1) ?? 0 },
    totals: {
      jointPpm: shareInPpm(jointProducts),
      coPpm: shareInPpm(coProducts),
      byPpm: shareInPpm(byProducts),
      lossPpm: shareInPpm(loss),
    },
  };
}

/** A specification is one of many ways to finish a piece: it is gone through only when it is named. */
async function chosenSteps(tx: Tx, codes: readonly string[]): Promise<ReadonlyMap<string, CuttingStep>> {
  const schemes = (await currentSchemes(tx)).map(({ code, content }) => stepOfScheme(code, content));
  const named = new Map(schemes.map((step) => [step.code, step]));
  for (const [code, version] of await specificationsByCodes(tx, codes)) named.set(code, schemeOfVersion(version));
  const chosen = new Map<string, CuttingStep>();
  for (const code of new Set(codes)) {
    const step = named.get(code);
    if (!step) throw new RefusalError({ code: 'scheme-through-unknown', params: { code }, pointer: '/through' });
    if (chosen.has(step.inputNodeId))
      throw new RefusalError({ code: 'scheme-through-twice', params: { code }, pointer: '/through' });
    chosen.set(step.inputNodeId, step);
  }
  for (const step of schemes)
    if (step.kind === 'cutting' && !chosen.has(step.inputNodeId)) chosen.set(step.inputNodeId, step);
  return chosen;
}
