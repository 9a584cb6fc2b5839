// The quantile and the interval made with it, against published tables and other statistics packages.
import { estimateYield, type YieldObservation } from '@seamwright/catalogue/domain';
import { studentT } from './student-t';

describe('the quantile of Student’s t', () => {
  // Critical values at 0.975, NIST/SEMATECH e-Handbook of Statistical Methods, section 1.3.6.7.2.
  it.each([
    [1, 12.706],
    [2, 4.303],
    [3, 3.182],
    [4, 2.776],
    [5, 2.571],
    [9, 2.262],
    [10, 2.228],
    [19, 2.093],
    [29, 2.045],
    [30, 2.042],
    [60, 2.0],
    [100, 1.984],
  ])('is the table’s at %d degrees of freedom', (degrees, critical) => {
    expect(studentT(0.975, degrees)).toBeCloseTo(critical, 3);
  });

  // scipy.stats.t.ppf(0.975, df), SciPy 1.17.1.
  it.each([
    [1, 12.706204736174694],
    [2, 4.302652729749462],
    [4, 2.7764451051977934],
    [29, 2.045229642132703],
    [149, 1.976013177689192],
  ])('is SciPy’s at %d degrees of freedom, to seven digits', (degrees, quantile) => {
    expect(studentT(0.975, degrees) / quantile).toBeCloseTo(1, 7);
  });
});

/** Tests with these yields over weights; a weight counts as grams. */
const tests = (values: readonly number[], weights: readonly number[]): YieldObservation[] =>
  values.map((value, at) => {
    const inputGrams = weights[at] ?? 0;
    return { testId: String(at), inputGrams, outputGrams: Math.round(value * inputGrams) };
  });

describe('the interval of a yield', () => {
  it('is the textbook’s with equal weights: numpy.std(ddof=1) and scipy.stats.t.interval, SciPy 1.17.1', () => {
    const six = tests([0.562, 0.578, 0.569, 0.581, 0.574, 0.566], [10_000, 10_000, 10_000, 10_000, 10_000, 10_000]);
    expect(estimateYield(six, studentT)).toMatchObject({
      yieldPpm: 571_667, // 0.5716666…
      deviationPpm: 7_285, // 0.0072846871…
      interval: { leastPpm: 564_022, mostPpm: 579_311 }, // 0.5640218563…, 0.5793114769…
    });
  });

  it('is SciPy’s with unequal weights: scipy.stats.t.interval(0.95, 4, 0.57115…, 0.0057185…), SciPy 1.17.1', () => {
    const five = tests([0.57, 0.56, 0.58, 0.55, 0.58], [20_000, 25_000, 30_000, 15_000, 40_000]);
    expect(estimateYield(five, studentT)).toMatchObject({
      yieldPpm: 571_154,
      deviationPpm: 12_140,
      interval: { leastPpm: 555_277, mostPpm: 587_031 },
    });
  });
});

describe('the weighted standard deviation', () => {
  const deviation = (values: readonly number[], weights: readonly number[]) =>
    estimateYield(tests(values, weights), studentT)?.deviationPpm;

  // NIST Dataplot Reference Manual, volume 2, page 2-67: 5.82 by weights of 1 1 0 0 4 1 2 1 0, 7.46 without them. A test
  // that weighs nothing is no test, so those of weight 0 are left out, as N' there leaves them out.
  it('is Dataplot’s', () => {
    const [values, weights] = [
      [2, 3, 11, 13, 17, 19],
      [1, 1, 4, 1, 2, 1],
    ];
    expect(deviation(values, weights)).toBe(5_822_371);
    const all = [2, 3, 5, 7, 11, 13, 17, 19, 23];
    expect(
      Math.round(
        (deviation(
          all,
          all.map(() => 1),
        ) ?? 0) / 10_000,
      ),
    ).toBe(746);
  });

  // Minitab support, "Example of calculating the weighted mean and the weighted standard deviation": 36.2898 and 41.0060.
  it('is Minitab’s', () => {
    // Weights times 100, so that every output is whole.
    const values = [49.01, 2.2, 16.7, 93.97, 6.16, 27.75];
    const weights = [500, 1200, 800, 1400, 900, 400];
    const estimate = estimateYield(tests(values, weights), studentT);
    expect(Math.round((estimate?.yieldPpm ?? 0) / 100)).toBe(362_898);
    expect(Math.round((estimate?.deviationPpm ?? 0) / 100)).toBe(410_060);
  });
});
