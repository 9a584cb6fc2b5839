import { isGtin, type Refusal } from '@seamwright/shared/util';
import { choiceKey } from './choice-key';
import { brokenRule, withDefaults } from './choice-rules';
import type { Choice, ChoiceRule } from './choices';
import type { Species } from './cut-words';
import type { VersionContent } from './specification-version';
import type { UneceFieldValue } from './unece/field-values';
import { faultsOfUneceFields } from './unece/version-code';

/** What the fields of the UNECE code can hold, and the species that they are read for. */
export interface UneceLists {
  readonly species: Species;
  readonly values: readonly UneceFieldValue[];
}

/**
 * Everything that is wrong with what an author wrote, each with a pointer to its field; empty when it may be sent to
 * review. Codes begin with `version-`, those of the UNECE code with `unece-`; without the lists only its form is checked.
 */
export function faultsOfVersion(content: VersionContent, unece?: UneceLists): Refusal[] {
  return [
    ...faultsOfLimits(content),
    ...faultsOfNumbers(content),
    ...faultsOfText(content),
    ...faultsOfWeights(content),
    ...content.choices.flatMap((choice, at) => faultsOfChoice(choice, `/choices/${at}`)),
    ...faultsOfRules(content.choices, content.choiceRules),
    ...faultsOfUneceFields(content, unece?.species, unece?.values),
  ];
}

const fault = (code: string, pointer: string, params: Refusal['params'] = {}): Refusal => ({ code, params, pointer });

/** The least and the most of each plain number; null where there is no most. */
const LIMITS: readonly (readonly [field: keyof VersionContent, least: number, most: number | null])[] = [
  ['lengthMm', 1, null],
  ['widthMm', 1, null],
  ['heightMm', 1, null],
  ['toleranceMm', 0, null],
  ['ribs', 1, 14],
  ['piecesPerPack', 1, null],
  ['packsPerCase', 1, null],
  ['tareGrams', 0, null],
  ['shelfLifeDays', 1, null],
  ['minLifeAtDeliveryDays', 0, null],
  ['yieldPpm', 1, null],
  ['cookingLossPpm', 0, 999_999],
];

function faultsOfLimits(content: VersionContent): Refusal[] {
  const plain = LIMITS.flatMap(([field, least, most]) => {
    const value = content[field];
    return typeof value === 'number' ? outOf(value, least, most, `/${field}`) : [];
  });
  const times = content.stations.flatMap((time, at) =>
    [time.setUpSeconds, time.secondsPerKg, time.secondsPerPiece].some((seconds) => seconds < 0)
      ? [fault('version-time-negative', `/stations/${at}`)]
      : [],
  );
  const { ageing } = content;
  const aged =
    ageing && (ageing.minDays < 0 || ageing.minDays > ageing.maxDays) ? [fault('version-ageing', '/ageing')] : [];
  return [...plain, ...times, ...aged];
}

function outOf(value: number, least: number, most: number | null, pointer: string): Refusal[] {
  if (value < least) return [fault('version-at-least', pointer, { least })];
  return most !== null && value > most ? [fault('version-at-most', pointer, { most })] : [];
}

function faultsOfNumbers(content: VersionContent): Refusal[] {
  const faults: Refusal[] = [];
  const outputs = content.yieldPpm + content.otherOutputs.reduce((sum, { yieldPpm }) => sum + yieldPpm, 0);
  if (outputs > 1_000_000) {
    faults.push(fault('version-yields-over-one', '/yieldPpm', { percent: `${Math.ceil(outputs / 10_000)} %` }));
  }
  if (content.fatCoverMm < 0 || content.fatCoverMm > 60) faults.push(fault('version-fat-cover', '/fatCoverMm'));
  if (content.minLifeAtDeliveryDays > content.shelfLifeDays) {
    faults.push(fault('version-life', '/minLifeAtDeliveryDays'));
  }
  if (content.storageMinC > content.storageMaxC) faults.push(fault('version-storage', '/storageMinC'));
  return faults;
}

function faultsOfText({ name, cuttingLines, steps, gtin }: VersionContent): Refusal[] {
  const unsaid = Object.entries({ name, cuttingLines })
    .filter(([, text]) => text.trim() === '')
    .map(([field]) => fault('version-missing', `/${field}`));
  const empty = steps.flatMap(({ text }, at) =>
    text.trim() === '' ? [fault('version-step-empty', `/steps/${at}`)] : [],
  );
  const found = [...unsaid, ...empty];
  return gtin === null || isGtin(gtin) ? found : [...found, fault('version-gtin', '/gtin')];
}

/** The version's own weights and those that each single value makes of them. */
function faultsOfWeights(content: VersionContent): Refusal[] {
  const own = isOrdered(content) ? [] : [fault('version-weights-order', '/pieceNominalGrams')];
  const changed = content.choices.flatMap(({ values }, at) =>
    values.flatMap(({ changes }, valueAt) =>
      isOrdered({ ...content, ...changes })
        ? []
        : [fault('version-weights-order', `/choices/${at}/values/${valueAt}/changes`)],
    ),
  );
  return own.length > 0 ? own : changed;
}

interface Weights {
  readonly pieceMinGrams: number;
  readonly pieceNominalGrams: number;
  readonly pieceMaxGrams: number;
}

const isOrdered = ({ pieceMinGrams, pieceNominalGrams, pieceMaxGrams }: Weights): boolean =>
  pieceMinGrams > 0 && pieceMinGrams <= pieceNominalGrams && pieceNominalGrams <= pieceMaxGrams;

/** Keys and values go into the canonical key, so its own signs can't be among them. */
const SLUG = /^[a-z0-9][a-z0-9-]*$/;

function faultsOfChoice({ key, values, defaultValue }: Choice, pointer: string): Refusal[] {
  const words = [key, ...values.map(({ value }) => value)];
  const twice = values.find(({ value }, at) => values.findIndex((other) => other.value === value) < at);
  return [
    ...words.filter((word) => !SLUG.test(word)).map((value) => fault('version-choice-form', pointer, { value })),
    ...(twice ? [fault('version-choice-twice', pointer, { value: twice.value })] : []),
    ...(values.some(({ value }) => value === defaultValue)
      ? []
      : [fault('version-default-unknown', pointer, { choice: key })]),
  ];
}

function faultsOfRules(choices: readonly Choice[], rules: readonly ChoiceRule[]): Refusal[] {
  const known = new Set(choices.flatMap(({ key, values }) => values.map(({ value }) => choiceKey({ [key]: value }))));
  const unknown = rules.flatMap(({ when, forbids }, at) =>
    [...Object.entries(when), [forbids.choice, forbids.value] as const]
      .map(([key, value]) => choiceKey({ [key]: value }))
      .filter((pair) => !known.has(pair))
      .map((value) => fault('version-rule-unknown', `/choiceRules/${at}`, { value })),
  );
  const broken = brokenRule(rules, withDefaults(choices, {}));
  return broken ? [...unknown, fault('version-defaults-impossible', '/choices', { reason: broken.reason })] : unknown;
}
