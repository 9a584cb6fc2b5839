import { grams } from '@seamwright/shared/util';
import type { TestSubject } from './cutting-test';
import { outliersAmong } from './outliers';
import { estimateYield, type StudentT } from './yield-estimate';
import { awaitingVerdict, yieldsOf, yieldsToAdopt, type RecordedTest } from './yields-of-subject';

/** Stands in for the distribution: twice the standard error either way. */
const two: StudentT = () => 2;
const SUBJECT: TestSubject = {
  kind: 'cutting',
  outputs: [
    { key: 'cut', name: 'Rump', kind: 'joint-product' },
    { key: 'bone', name: 'Bone', kind: 'by-product' },
  ],
};

const test = (id: string, cut: number, stated: Partial<RecordedTest> = {}): RecordedTest => ({
  id,
  supplier: 'Alder Farm',
  grade: 'R3L',
  inputGrams: 10_000,
  outputs: [
    { key: 'cut', grams: grams(cut) },
    { key: 'bone', grams: grams(2_000) },
  ],
  verdict: null,
  ...stated,
});
const observed = (id: string, outputGrams: number, inputGrams = 10_000) => ({ testId: id, inputGrams, outputGrams });

describe('the yield of several tests', () => {
  it('is what came out of all over what went into all, so that a heavy test counts for more', () => {
    const estimate = estimateYield([observed('a', 600, 1_000), observed('b', 27_000, 50_000)], two);
    expect(estimate).toMatchObject({ n: 2, inputGrams: 51_000, outputGrams: 27_600, yieldPpm: 541_176 });
    expect(estimate?.exact).toEqual({ n: 46n, d: 85n });
  });

  it('has no spread with one test, and is nothing with none', () => {
    expect(estimateYield([observed('a', 600)], two)).toMatchObject({ n: 1, deviationPpm: null, interval: null });
    expect(estimateYield([], two)).toBeNull();
  });
});

describe('a test that stands out', () => {
  const close = [observed('a', 6_000), observed('b', 6_050), observed('c', 5_950), observed('d', 6_020)];

  it('lies more than three deviations from the others, worked out without it', () => {
    expect([...outliersAmong([...close, observed('far', 6_300)])]).toEqual(['far']);
    // With itself counted in, no test of so few could ever lie that far away.
    expect([...outliersAmong([...close, observed('near', 6_100)])]).toEqual([]);
  });

  it('is not looked for among too few, and is found among others that are all alike', () => {
    expect([...outliersAmong([observed('a', 6_000), observed('b', 6_000), observed('c', 100)])]).toEqual([]);
    const alike = ['a', 'b', 'c', 'd'].map((id) => observed(id, 6_000));
    expect([...outliersAmong(alike)]).toEqual([]);
    expect([...outliersAmong([...alike, observed('e', 6_001)])]).toEqual(['e']);
  });
});

describe('the yields of a subject', () => {
  const tests = [
    test('a', 6_000),
    test('b', 6_050),
    test('c', 5_950, { supplier: 'Beck Farm', grade: '' }),
    test('d', 6_020, { supplier: 'Beck Farm', grade: 'U3' }),
    test('far', 6_300),
  ];

  it('are told whole, and by grade and supplier where those are known', () => {
    const [cut, bone] = yieldsOf(SUBJECT, tests, two);
    expect(cut?.measured).toMatchObject({ n: 5, yieldPpm: 606_400 });
    expect(cut?.byGrade.map(({ name, estimate }) => [name, estimate.n])).toEqual([
      ['R3L', 3],
      ['U3', 1],
    ]);
    expect(cut?.bySupplier.map(({ name, estimate }) => [name, estimate.yieldPpm])).toEqual([
      ['Alder Farm', 611_667],
      ['Beck Farm', 598_500],
    ]);
    expect(bone?.measured?.yieldPpm).toBe(200_000);
  });

  it('count a test that stands out until a person sets it aside, and show it even then', () => {
    const before = yieldsOf(SUBJECT, tests, two);
    expect(before[0]?.points.at(-1)).toEqual({ testId: 'far', yieldPpm: 630_000, standsOut: true, counts: true });
    expect(awaitingVerdict(before, tests)).toEqual(['far']);

    const judged = tests.map((each) => (each.id === 'far' ? { ...each, verdict: 'set-aside' as const } : each));
    const after = yieldsOf(SUBJECT, judged, two);
    expect(after[0]?.measured).toMatchObject({ n: 4, yieldPpm: 600_500 });
    expect(after[0]?.points.at(-1)).toMatchObject({ testId: 'far', counts: false });
    expect(awaitingVerdict(after, judged)).toEqual([]);
  });

  it('are adopted for all outputs at once, never adding to more than came out', () => {
    expect([...yieldsToAdopt(SUBJECT, tests)]).toEqual([
      ['cut', 606_400],
      ['bone', 200_000],
    ]);
    const thirds = test('e', 1, { inputGrams: 3, outputs: ['cut', 'bone'].map((key) => ({ key, grams: grams(1) })) });
    expect([...yieldsToAdopt(SUBJECT, [thirds]).values()]).toEqual([333_333, 333_333]);
    const lacking = test('f', 1, { outputs: [{ key: 'cut', grams: grams(9_000) }] });
    expect(yieldsToAdopt(SUBJECT, [lacking]).size).toBe(0);
  });
});
