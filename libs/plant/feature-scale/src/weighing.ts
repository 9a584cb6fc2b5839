import type { PackingLineWire } from '@seamwright/plant/contracts';
import { openPieces } from '@seamwright/plant/domain';
import { judgePack, netWeight, packLimits, withinLimits, type PackLimits } from '@seamwright/stock/domain';

/** Where a pack stands against its limits; `none` while nothing is on the scale. */
export type Verdict = 'none' | 'within' | 'light' | 'heavy';

export interface Weighing {
  readonly netGrams: number | null;
  readonly limits: PackLimits;
  readonly nominalGrams: number;
  readonly verdict: Verdict;
  /** Grams past the limit that was missed. */
  readonly offGrams: number;
  /** Whether it may be packed as it is. */
  readonly ready: boolean;
}

interface OnTheScale {
  readonly line: Pick<PackingLineWire, 'piece'>;
  readonly pieces: number;
  readonly grossGrams: number;
  readonly tareGrams: number;
  readonly reason: string | null;
}

/** What the scale says of a pack, by the same rules that the server keeps. */
export function weighingOf({ line, pieces, grossGrams, tareGrams, reason }: OnTheScale): Weighing {
  const limits = packLimits(line, pieces);
  const nominalGrams = line.piece.nominalGrams * pieces;
  const net = netWeight(grossGrams, tareGrams);
  if (!net.ok) return { netGrams: null, limits, nominalGrams, verdict: 'none', offGrams: 0, ready: false };
  const netGrams = net.value;
  const within = withinLimits(limits, netGrams);
  return {
    netGrams,
    limits,
    nominalGrams,
    verdict: within ? 'within' : netGrams < limits.minGrams ? 'light' : 'heavy',
    offGrams: Math.max(0, limits.minGrams - netGrams, netGrams - limits.maxGrams),
    ready: judgePack(limits, netGrams, reason).ok,
  };
}

/** Pieces that the line still waits for. */
export const openOf = (line: PackingLineWire): number => openPieces(line);

/** The line to go on with: the first that waits for pieces, else the first. */
export const nextLine = (lines: readonly PackingLineWire[]): PackingLineWire | null =>
  lines.find((line) => openOf(line) > 0) ?? lines[0] ?? null;
