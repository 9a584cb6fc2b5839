import {
  grams,
  ok,
  refuse,
  toSafeNumber,
  type Grams,
  type PlantDate,
  type Refusal,
  type Result,
} from '@seamwright/shared/util';
import type { OutputKind } from '../cut-words';
import type { CuttingStep, SchemeKind } from '../schemes/cutting-scheme';

export interface WeighedOutput {
  readonly key: string;
  readonly grams: Grams;
}

/** What went into a test. `addedGrams` is what a recipe added to it; zero for anything else. */
export interface TestInput {
  readonly lotCode: string;
  readonly supplier: string;
  readonly grade: string;
  readonly pieces: number;
  readonly grams: Grams;
  readonly addedGrams: Grams;
}

/** One measured breakdown of a scheme or a specification. Texts are empty where nothing is known. */
export interface CuttingTestContent {
  readonly input: TestInput;
  readonly outputs: readonly WeighedOutput[];
  readonly testedOn: PlantDate;
  readonly note: string;
}

/** What may be tested: its outputs by key, and whether anything is added. */
export interface TestSubject {
  readonly kind: SchemeKind;
  readonly outputs: readonly { readonly key: string; readonly name: string; readonly kind: OutputKind }[];
}

/** The subject of tests behind a scheme or a specification. */
export const subjectOf = ({ kind, outputs }: CuttingStep): TestSubject => ({ kind, outputs });

type Weights = Pick<CuttingTestContent, 'outputs'> & { readonly input: Pick<TestInput, 'grams' | 'addedGrams'> };

/**
 * Weight that went in less every weight that came out: saw dust, drip, what stuck to the table. Input, additions,
 * outputs and loss reconcile to the gram. Refuses `test-outputs-over-input` (over, in grams) when more came out.
 */
export function cuttingLoss({ input, outputs }: Weights): Result<Grams> {
  const out = outputs.reduce((sum, output) => sum + BigInt(output.grams), 0n);
  const loss = BigInt(input.grams) + BigInt(input.addedGrams) - out;
  return loss < 0n
    ? refuse('test-outputs-over-input', { over: toSafeNumber(-loss) }, '/outputs')
    : ok(grams(toSafeNumber(loss)));
}

const fault = (code: string, pointer: string, params: Refusal['params'] = {}): Refusal => ({ code, params, pointer });

/** Everything that is wrong with a test, each with a pointer to its field; empty when it can be kept. */
export function faultsOfTest(test: CuttingTestContent, subject: TestSubject, today: PlantDate): Refusal[] {
  const { input, outputs, testedOn } = test;
  const faults: Refusal[] = [];
  if (input.grams <= 0) faults.push(fault('test-input-weight', '/input/grams'));
  if (input.pieces < 1) faults.push(fault('test-pieces', '/input/pieces'));
  if (input.addedGrams < 0) faults.push(fault('test-added-weight', '/input/addedGrams'));
  if (input.addedGrams > 0 && subject.kind !== 'recipe')
    faults.push(fault('test-only-recipes-add', '/input/addedGrams'));
  if (testedOn > today) faults.push(fault('test-in-the-future', '/testedOn'));
  faults.push(...faultsOfWeighed(outputs, subject));
  const loss = cuttingLoss(test);
  return loss.ok ? faults : [...faults, loss.refusal];
}

/** Each output of the subject is weighed once, at nothing where nothing came out; a part left out would raise the rest. */
function faultsOfWeighed(outputs: readonly WeighedOutput[], subject: TestSubject): Refusal[] {
  const known = new Map(subject.outputs.map(({ key, name }) => [key, name]));
  const wrong = outputs.flatMap(({ key, grams: weight }, at) => {
    const pointer = `/outputs/${at}`;
    if (!known.has(key)) return [fault('test-output-unknown', `${pointer}/key`, { key })];
    if (outputs.findIndex((other) => other.key === key) < at)
      return [fault('test-output-twice', `${pointer}/key`, { name: known.get(key) ?? key })];
    return weight < 0 ? [fault('test-output-weight', `${pointer}/grams`)] : [];
  });
  const missing = subject.outputs.filter(({ key }) => !outputs.some((output) => output.key === key));
  const nothing = outputs.length > 0 && outputs.every(({ grams: weight }) => weight === 0);
  return [
    ...wrong,
    ...missing.map(({ name }) => fault('test-output-missing', '/outputs', { name })),
    ...(nothing ? [fault('test-nothing-came-out', '/outputs')] : []),
  ];
}
