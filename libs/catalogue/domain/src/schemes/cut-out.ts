import {
  addFractions,
  fraction,
  multiplyFractions,
  ok,
  refuse,
  roundFraction,
  shareByLargestRemainder,
  subtractFractions,
  toSafeNumber,
  type Fraction,
  type Grams,
  type Result,
} from '@seamwright/shared/util';
import type { OutputKind } from '../cut-words';
import type { CuttingStep, SchemeOutput } from './cutting-scheme';

/** Something that is not cut further, with its exact share of what the chain began with. */
export interface CutOutLine {
  readonly key: string;
  readonly name: string;
  readonly kind: OutputKind;
  readonly nodeId: string | null;
  readonly visualLean: number | null;
  readonly valueMinorPerKg: number;
  /** Codes of the steps that lead to it, the first one first. */
  readonly through: readonly string[];
  readonly share: Fraction;
}

export interface CutOut {
  readonly lines: readonly CutOutLine[];
  /** Lost in cutting by all steps together, of what the chain began with. */
  readonly loss: Fraction;
}

/**
 * Breaks one piece of `nodeId` down through the steps that are chosen for each node, to the end: carcase → primals →
 * sub-primals → specifications. Shares are exact; with the loss they add to exactly 1. Refuses `scheme-cycle` when a
 * node would come out of itself, and `scheme-not-cutting` (code) for a recipe or blend, which only chains end in.
 */
export function cutOut(nodeId: string, steps: ReadonlyMap<string, CuttingStep>): Result<CutOut> {
  const lines: CutOutLine[] = [];
  let loss = fraction(0n);
  const open: Open[] = [{ nodeId, share: fraction(1n), through: [], nodes: [] }];
  for (let at = 0; at < open.length; at++) {
    const piece = open[at];
    const step = piece && steps.get(piece.nodeId);
    if (!piece || !step) continue;
    if (step.kind !== 'cutting') return refuse('scheme-not-cutting', { code: step.code });
    if (piece.nodes.includes(piece.nodeId)) return refuse('scheme-cycle', { code: step.code });
    let rest = piece.share;
    for (const output of step.outputs) {
      const share = multiplyFractions(piece.share, fraction(BigInt(output.yieldPpm), 1_000_000n));
      rest = subtractFractions(rest, share);
      const through = [...piece.through, step.code];
      if (output.nodeId !== null && steps.has(output.nodeId))
        open.push({ nodeId: output.nodeId, share, through, nodes: [...piece.nodes, piece.nodeId] });
      else lines.push(lineOf(output, share, through));
    }
    loss = addFractions(loss, rest);
  }
  return ok({ lines, loss });
}

interface Open {
  readonly nodeId: string;
  readonly share: Fraction;
  readonly through: readonly string[];
  /** The nodes above it, so that none comes out of itself. */
  readonly nodes: readonly string[];
}

const lineOf = (
  { key, name, kind, nodeId, visualLean, valueMinorPerKg }: SchemeOutput,
  share: Fraction,
  through: readonly string[],
): CutOutLine => ({
  key,
  name,
  kind,
  nodeId,
  visualLean: visualLean ?? null,
  valueMinorPerKg,
  through,
  share,
});

export interface CutOutTotals {
  readonly jointProducts: Fraction;
  readonly coProducts: Fraction;
  readonly byProducts: Fraction;
  readonly loss: Fraction;
}

/** What a piece comes to by kind; the four add to exactly 1. */
export function cutOutTotals({ lines, loss }: CutOut): CutOutTotals {
  const of = (kind: OutputKind): Fraction =>
    lines.filter((line) => line.kind === kind).reduce((sum, { share }) => addFractions(sum, share), fraction(0n));
  return { jointProducts: of('joint-product'), coProducts: of('co-product'), byProducts: of('by-product'), loss };
}

/** A piece of so many grams in whole grams of each line, the loss last; they add to its weight exactly. */
export function cutOutGrams({ lines, loss }: CutOut, whole: Grams): Grams[] {
  const shares = [...lines.map(({ share }) => share), loss];
  const common = shares.reduce((left, { d }) => leastCommonMultiple(left, d), 1n);
  return shareByLargestRemainder(
    whole,
    shares.map(({ n, d }) => n * (common / d)),
  );
}

/** A share over 1,000,000, rounded half up: for showing, never for going on with. */
export const shareInPpm = ({ n, d }: Fraction): number =>
  toSafeNumber(roundFraction({ n: n * 1_000_000n, d }, 'half-up'));

function leastCommonMultiple(a: bigint, b: bigint): bigint {
  let [left, right] = [a, b];
  while (right !== 0n) [left, right] = [right, left % right];
  return (a / left) * b;
}
