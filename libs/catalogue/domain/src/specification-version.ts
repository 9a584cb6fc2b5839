import type { Grams, Ppm } from '@seamwright/shared/util';
import type { Choice, ChoiceRule, ChoiceValue, OfferedValue } from './choices';
import type {
  AgeingKind,
  BoneState,
  DrawingKind,
  Finish,
  OutputKind,
  PackType,
  PieceKind,
  Species,
  Station,
  TemperatureState,
} from './cut-words';
import type { Standing, VersionState } from './specification.states';
import type { UneceFields } from './unece/version-code';

/** Length, width and height in whole millimetres, as the drawing kind reads them. */
export interface Dimensions {
  readonly lengthMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
}

/** The numbers that a buyer chooses over and that a drawing is made from. */
export interface OfferedNumbers<Value extends OfferedValue = OfferedValue> extends Dimensions {
  readonly boneState: BoneState;
  readonly fatCoverMm: number;
  readonly finish: Finish;
  readonly drawingKind: DrawingKind;
  /** How many ribs a rack keeps; null for anything else. */
  readonly ribs: number | null;
  readonly pieceNominalGrams: Grams;
  readonly pieceMinGrams: Grams;
  readonly pieceMaxGrams: Grams;
  readonly piecesPerPack: number;
  readonly packsPerCase: number;
  readonly packType: PackType;
  readonly choices: readonly Choice<Value>[];
  readonly choiceRules: readonly ChoiceRule[];
}

export interface MethodStep {
  readonly text: string;
  readonly caution?: string;
}

/** Time at a station: to set up once, per kg going in, and per piece. Whole seconds. */
export interface StationTime {
  readonly station: Station;
  readonly setUpSeconds: number;
  readonly secondsPerKg: number;
  readonly secondsPerPiece: number;
}

/** What else the same cut gives. Its value per kg may be below zero: collection is paid for. */
export interface OtherOutput {
  readonly name: string;
  readonly kind: OutputKind;
  readonly yieldPpm: number;
  readonly valueMinorPerKg: number;
  /** Visual lean of edible trim, per cent: 85 is 85VL. */
  readonly visualLean?: number;
}

export interface Ageing {
  readonly kind: AgeingKind;
  /** Counted from kill. */
  readonly minDays: number;
  readonly maxDays: number;
}

/** What an author writes of a version: everything but who, when and where it stands. */
export interface VersionContent extends OfferedNumbers<ChoiceValue> {
  readonly name: string;
  readonly summary: string;
  readonly sourceNodeId: string;
  readonly uneceItem: string | null;
  readonly uneceItemSeen: boolean;
  readonly fatCode: string | null;
  /** The fields of the UNECE code that don't follow from the version itself. */
  readonly uneceFields: UneceFields;
  /** Where it is separated, in anatomical words. */
  readonly cuttingLines: string;
  readonly removed: readonly string[];
  readonly toleranceMm: number;
  readonly pieceKind: PieceKind;
  readonly tareGrams: Grams;
  readonly gtin: string | null;
  readonly temperatureState: TemperatureState;
  readonly storageMinC: number;
  readonly storageMaxC: number;
  /** From cutting. */
  readonly shelfLifeDays: number;
  readonly minLifeAtDeliveryDays: number;
  readonly ageing: Ageing | null;
  readonly allergens: readonly string[];
  readonly mayContain: readonly string[];
  /** From the source primal. */
  readonly yieldPpm: Ppm;
  readonly cookingLossPpm: Ppm;
  readonly steps: readonly MethodStep[];
  readonly stations: readonly StationTime[];
  readonly otherOutputs: readonly OtherOutput[];
}

/** One agreed way to make a cut. Approved, it never changes; `standing` tells what became of it since. */
export interface SpecificationVersion extends VersionContent {
  readonly id: string;
  readonly rowVersion: number;
  readonly specificationId: string;
  readonly code: string;
  readonly species: Species;
  readonly cutNodeId: string;
  readonly version: number;
  readonly state: VersionState;
  readonly standing: Standing | null;
  readonly authoredBy: string;
  readonly approvedBy: string | null;
  readonly approvedAt: Date | null;
}
