import type { Grams, PlantDate } from '@seamwright/shared/util';
import type { LotState } from './lot.states';

/** Where the animal was born, reared, slaughtered and cut, as the supplier's papers say; a country is its two-letter code. */
export interface LotOrigin {
  readonly bornIn: string;
  readonly rearedIn: string;
  readonly slaughteredIn: string;
  readonly slaughterhouse: string;
}

/** Pieces of one primal that came in together. `remainingGrams` is what packing has not used yet, by simple yield. */
export interface Lot {
  readonly id: string;
  readonly rowVersion: number;
  readonly code: string;
  readonly nodeId: string;
  readonly nodeName: string;
  readonly supplier: string;
  readonly killDate: PlantDate;
  readonly receivedOn: PlantDate;
  /** The primal's own limit; carcases may come without one. */
  readonly useBy: PlantDate | null;
  readonly receivedGrams: Grams;
  readonly receivedPieces: number;
  readonly remainingGrams: Grams;
  readonly state: LotState;
  readonly holdReason: string | null;
  readonly origin: LotOrigin;
}
