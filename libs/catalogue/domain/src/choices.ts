import type { BoneState, Finish, PackType, Station } from './cut-words';

/** Choice key → value, as chosen: {trim: '6', finish: 'tied'}. */
export type ChosenValues = Readonly<Record<string, string>>;

/** What a value changes in the numbers of its version. What it doesn't name stays. */
export interface VersionChanges {
  readonly fatCoverMm?: number;
  readonly boneState?: BoneState;
  readonly finish?: Finish;
  readonly packType?: PackType;
  readonly piecesPerPack?: number;
  readonly packsPerCase?: number;
  readonly pieceNominalGrams?: number;
  readonly pieceMinGrams?: number;
  readonly pieceMaxGrams?: number;
  readonly lengthMm?: number;
  readonly widthMm?: number;
  readonly heightMm?: number;
}

/** A value as a buyer sees it. Price changes are whole minor units per kg. */
export interface OfferedValue {
  readonly value: string;
  readonly label: string;
  readonly priceChangeMinorPerKg: number;
  readonly leadDays: number;
  readonly changes?: VersionChanges;
}

/** A value with what it costs the plant: a factor on the yield (over 1,000,000) and seconds of work. */
export interface ChoiceValue extends OfferedValue {
  readonly yieldFactorPpm: number;
  readonly extraSecondsPerKg: number;
  readonly extraSecondsPerPiece: number;
  /** The station that does the extra work; without it, the last one before packing. */
  readonly station?: Station;
}

/** Something a customer may decide about a specification. */
export interface Choice<Value extends OfferedValue = ChoiceValue> {
  readonly key: string;
  readonly label: string;
  /** What the labels count: "g", "mm fat". */
  readonly unit?: string;
  readonly values: readonly Value[];
  readonly defaultValue: string;
}

/** An impossible pair. It holds both ways: `when` all hold, the forbidden value can't be, and the reverse. */
export interface ChoiceRule {
  readonly when: ChosenValues;
  readonly forbids: { readonly choice: string; readonly value: string };
  readonly reason: string;
}
