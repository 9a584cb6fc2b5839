import type { Species, StationTime } from '@seamwright/catalogue/domain';
import type { Grams, Ppm } from '@seamwright/shared/util';

export interface Primal {
  readonly id: string;
  readonly name: string;
  readonly species: Species;
}

/** What is cut: one specification version with one set of choices. */
export interface Cut {
  readonly versionId: string;
  readonly choiceKey: string;
  readonly code: string;
  readonly name: string;
  /** The choices in words. */
  readonly summary: string;
  readonly primal: Primal;
  readonly pieceNominalGrams: Grams;
  readonly piecesPerCase: number;
  readonly yieldPpm: Ppm;
  readonly stations: readonly StationTime[];
}

export interface CutFor {
  readonly id: string;
  readonly name: string;
}

/** One order line as the cutting room sees it: still to be cut, so without what was marked short. */
export interface CuttingLine {
  readonly cut: Cut;
  readonly customer: CutFor;
  readonly orderNumber: number;
  /** True when the line was ordered in whole cases. */
  readonly inCases: boolean;
  readonly pieces: number;
}

/** Which lines are added up: the same version and the same choices. */
export const cutKey = ({ versionId, choiceKey }: Pick<Cut, 'versionId' | 'choiceKey'>): string =>
  `${versionId}|${choiceKey}`;
