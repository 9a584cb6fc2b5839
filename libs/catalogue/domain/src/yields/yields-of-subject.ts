import { shareByLargestRemainder, toSafeNumber } from '@seamwright/shared/util';
import type { OutputKind } from '../cut-words';
import type { WeighedOutput, TestSubject } from './cutting-test';
import { outliersAmong } from './outliers';
import { estimateYield, yieldOfTest, type StudentT, type YieldEstimate } from './yield-estimate';

/** What a technical person decided about a test that stood out; null while nobody has. */
export const TEST_VERDICTS = ['kept', 'set-aside'] as const;
export type TestVerdict = (typeof TEST_VERDICTS)[number];

/** A recorded test as far as yields need it. */
export interface RecordedTest {
  readonly id: string;
  readonly supplier: string;
  readonly grade: string;
  readonly inputGrams: number;
  readonly outputs: readonly WeighedOutput[];
  readonly verdict: TestVerdict | null;
}

export interface YieldPoint {
  readonly testId: string;
  readonly yieldPpm: number;
  /** More than three deviations from the other tests that count. */
  readonly standsOut: boolean;
  /** False once it was set aside. */
  readonly counts: boolean;
}

export interface GroupYield {
  readonly name: string;
  readonly estimate: YieldEstimate;
}

/** One output over all tests of a subject. */
export interface OutputYield {
  readonly key: string;
  readonly name: string;
  readonly kind: OutputKind;
  /** Null while no test counts. */
  readonly measured: YieldEstimate | null;
  readonly byGrade: readonly GroupYield[];
  readonly bySupplier: readonly GroupYield[];
  readonly points: readonly YieldPoint[];
}

const counts = ({ verdict }: RecordedTest): boolean => verdict !== 'set-aside';

/** The yield of every output of a subject by its tests, whole and by grade and supplier. */
export function yieldsOf(
  subject: TestSubject,
  tests: readonly RecordedTest[],
  studentT: StudentT,
): readonly OutputYield[] {
  return subject.outputs.map(({ key, name, kind }) => {
    const seen = tests.flatMap((test) => {
      const weighed = test.outputs.find((output) => output.key === key);
      return weighed
        ? [{ test, testId: test.id, inputGrams: test.inputGrams, outputGrams: Number(weighed.grams) }]
        : [];
    });
    const counted = seen.filter(({ test }) => counts(test));
    const far = outliersAmong(counted);
    const grouped = (nameOf: (test: RecordedTest) => string): GroupYield[] =>
      [...new Set(counted.map(({ test }) => nameOf(test)))].sort().flatMap((group) => {
        const estimate = estimateYield(
          counted.filter(({ test }) => nameOf(test) === group),
          studentT,
        );
        return group === '' || !estimate ? [] : [{ name: group, estimate }];
      });
    return {
      key,
      name,
      kind,
      measured: estimateYield(counted, studentT),
      byGrade: grouped(({ grade }) => grade),
      bySupplier: grouped(({ supplier }) => supplier),
      points: seen.map(({ test, ...observed }) => ({
        testId: test.id,
        yieldPpm: yieldOfTest(observed),
        standsOut: far.has(test.id),
        counts: counts(test),
      })),
    };
  });
}

/** Tests that stand out in any output and that nobody has looked at yet. */
export function awaitingVerdict(yields: readonly OutputYield[], tests: readonly RecordedTest[]): string[] {
  const far = new Set(
    yields.flatMap(({ points }) => points.filter((point) => point.standsOut)).map((each) => each.testId),
  );
  return tests.filter(({ id, verdict }) => verdict === null && far.has(id)).map(({ id }) => id);
}

/** The tests that can speak for all outputs of a subject at once: none set aside, none that lacks one. */
export const testsToAdopt = (subject: TestSubject, tests: readonly RecordedTest[]): RecordedTest[] =>
  tests.filter(
    (test) => counts(test) && subject.outputs.every(({ key }) => test.outputs.some((output) => output.key === key)),
  );

/**
 * The yields to adopt from tests, over 1,000,000, by key. All outputs together are the exact sum cut to a whole part
 * and shared by largest remainder, so that they never add to more than came out. Empty without tests.
 */
export function yieldsToAdopt(subject: TestSubject, tests: readonly RecordedTest[]): ReadonlyMap<string, number> {
  const used = testsToAdopt(subject, tests);
  const input = used.reduce((sum, { inputGrams }) => sum + BigInt(inputGrams), 0n);
  if (input === 0n) return new Map();
  const weights = subject.outputs.map(({ key }) =>
    used.reduce((sum, { outputs }) => sum + BigInt(outputs.find((output) => output.key === key)?.grams ?? 0), 0n),
  );
  const out = weights.reduce((sum, weight) => sum + weight, 0n);
  const shares = shareByLargestRemainder(toSafeNumber((out * 1_000_000n) / input), weights);
  return new Map(subject.outputs.map(({ key }, at) => [key, shares[at] ?? 0]));
}
