import type { BoneState, DrawingKind, Finish } from '../cut-words';
import type { OfferedNumbers } from '../specification-version';
import type { ResolvedOffer } from '../resolve-offer';

/** What a drawing is made from: whole millimetres and grams of one piece. */
export interface DrawnNumbers {
  readonly kind: DrawingKind;
  readonly lengthMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
  readonly fatCoverMm: number;
  readonly ribs: number | null;
  readonly boneState: BoneState;
  readonly finish: Finish;
  readonly nominalGrams: number;
  readonly minGrams: number;
  readonly maxGrams: number;
}

/** The numbers of a version with everything chosen. */
export function drawnNumbers(resolved: ResolvedOffer<OfferedNumbers>): DrawnNumbers {
  const { version, dims, fatCoverMm, boneState, finish, piece } = resolved;
  return { kind: version.drawingKind, ribs: version.ribs, ...dims, fatCoverMm, boneState, finish, ...piece };
}
