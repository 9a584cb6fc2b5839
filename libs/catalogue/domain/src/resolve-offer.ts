import { grams, minorUnits, ok, refuse, type Grams, type MinorUnits, type Result } from '@seamwright/shared/util';
import { choiceKey } from './choice-key';
import { brokenRule, withDefaults } from './choice-rules';
import type { ChosenValues, OfferedValue, VersionChanges } from './choices';
import type { BoneState, Finish, PackType } from './cut-words';
import type { Dimensions, OfferedNumbers } from './specification-version';

export interface PieceWeights {
  readonly nominalGrams: Grams;
  readonly minGrams: Grams;
  readonly maxGrams: Grams;
}

/** A version with everything chosen, as far as a buyer may know it. */
export interface ResolvedOffer<Version = OfferedNumbers> {
  readonly version: Version;
  /** Every choice of the version, defaults filled in. */
  readonly chosen: ChosenValues;
  readonly choiceKey: string;
  /** "280 g · 6 mm fat · plain", in the order of the choices; empty when there is nothing to choose. */
  readonly summary: string;
  readonly piece: PieceWeights;
  readonly piecesPerPack: number;
  readonly piecesPerCase: number;
  readonly priceChangeMinorPerKg: MinorUnits;
  /** The most that any chosen value asks for: work is done side by side. */
  readonly leadDays: number;
  readonly fatCoverMm: number;
  readonly boneState: BoneState;
  readonly finish: Finish;
  readonly packType: PackType;
  readonly dims: Dimensions;
}

/**
 * Applies choices to a version. Refuses with `choice-unknown` (choice), `choice-value-unknown` (choice, value) or
 * `choice-pair-forbidden` (reason), pointing at `/choices/<key>`.
 */
export function resolveOffer<Version extends OfferedNumbers>(
  version: Version,
  chosen: ChosenValues,
): Result<ResolvedOffer<Version>> {
  const unknown = Object.keys(chosen).find((key) => !version.choices.some((choice) => choice.key === key));
  if (unknown !== undefined) return refuse('choice-unknown', { choice: unknown }, `/choices/${unknown}`);
  const full = withDefaults(version.choices, chosen);
  for (const { key, values } of version.choices) {
    const value = full[key] ?? '';
    if (!values.some((offered) => offered.value === value)) {
      return refuse('choice-value-unknown', { choice: key, value }, `/choices/${key}`);
    }
  }
  const broken = brokenRule(version.choiceRules, full);
  if (broken) return refuse('choice-pair-forbidden', { reason: broken.reason }, `/choices/${broken.forbids.choice}`);
  return ok(applied(version, full));
}

/** The value chosen of each choice, in the version's order. */
export function chosenValues<Value extends OfferedValue>(
  { choices }: OfferedNumbers<Value>,
  full: ChosenValues,
): Value[] {
  return choices.flatMap(({ key, values }) => values.filter(({ value }) => value === full[key]));
}

function applied<Version extends OfferedNumbers>(version: Version, full: ChosenValues): ResolvedOffer<Version> {
  const values = chosenValues(version, full);
  const now = { ...numbersOf(version), ...merged(values.map(({ changes }) => changes ?? {})) };
  return {
    version,
    chosen: full,
    choiceKey: choiceKey(full),
    summary: summaryOf(version, full),
    piece: {
      nominalGrams: grams(now.pieceNominalGrams),
      minGrams: grams(now.pieceMinGrams),
      maxGrams: grams(now.pieceMaxGrams),
    },
    piecesPerPack: now.piecesPerPack,
    piecesPerCase: now.piecesPerPack * now.packsPerCase,
    priceChangeMinorPerKg: minorUnits(values.reduce((sum, value) => sum + value.priceChangeMinorPerKg, 0)),
    leadDays: Math.max(0, ...values.map(({ leadDays }) => leadDays)),
    fatCoverMm: now.fatCoverMm,
    boneState: now.boneState,
    finish: now.finish,
    packType: now.packType,
    dims: { lengthMm: now.lengthMm, widthMm: now.widthMm, heightMm: now.heightMm },
  };
}

/** Later choices overrule earlier ones where both change the same number. */
const merged = (changes: readonly VersionChanges[]): VersionChanges => Object.assign({}, ...changes) as VersionChanges;

function numbersOf(version: OfferedNumbers): Required<VersionChanges> {
  const { fatCoverMm, boneState, finish, packType, piecesPerPack, packsPerCase } = version;
  const { pieceNominalGrams, pieceMinGrams, pieceMaxGrams, lengthMm, widthMm, heightMm } = version;
  return {
    fatCoverMm,
    boneState,
    finish,
    packType,
    piecesPerPack,
    packsPerCase,
    pieceNominalGrams,
    pieceMinGrams,
    pieceMaxGrams,
    lengthMm,
    widthMm,
    heightMm,
  };
}

function summaryOf({ choices }: OfferedNumbers, full: ChosenValues): string {
  return choices
    .flatMap(({ key, unit, values }) =>
      values
        .filter(({ value }) => value === full[key])
        .map(({ label }) => (unit === undefined ? label : `${label} ${unit}`)),
    )
    .join(' · ');
}
