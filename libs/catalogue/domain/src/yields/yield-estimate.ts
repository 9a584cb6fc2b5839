import { fraction, ppm, roundFraction, toSafeNumber, type Fraction, type Ppm } from '@seamwright/shared/util';

/**
 * The quantile of Student's t distribution: (0.975, 4) → 2.776…. It is given from outside, since whoever only shows an
 * estimate need not carry the sums behind it.
 */
export type StudentT = (probability: number, degreesOfFreedom: number) => number;

/** One output of one test. */
export interface YieldObservation {
  readonly testId: string;
  readonly inputGrams: number;
  readonly outputGrams: number;
}

/**
 * A yield as tests show it. The yield is exact and rounded once; deviation and interval are estimates of what other
 * tests would show, so they are worked out in floating point and rounded to parts per million. Nothing is charged,
 * weighed or posted by them.
 */
export interface YieldEstimate {
  readonly n: number;
  readonly inputGrams: number;
  readonly outputGrams: number;
  readonly exact: Fraction;
  readonly yieldPpm: Ppm;
  /** Null with fewer than two tests. */
  readonly deviationPpm: number | null;
  /** 95 %, two-sided; null with fewer than two tests. May reach past 0 or 1 where tests are few. */
  readonly interval: { readonly leastPpm: number; readonly mostPpm: number } | null;
}

const UPPER_TAIL = 0.975;

/**
 * Σ output ÷ Σ input of the tests, so that each counts by its input weight, with the weighted standard deviation
 *   s² = n/(n − 1) · Σ w (x − x̄)² ÷ Σ w     (NIST Dataplot Reference Manual, "weighted standard deviation")
 * and x̄ ± t(0.975, n − 1) · s · √(Σ w²) ÷ Σ w. With equal weights these are the textbook's s and s ÷ √n. Null
 * without tests.
 */
export function estimateYield(tests: readonly YieldObservation[], studentT: StudentT): YieldEstimate | null {
  const inputGrams = tests.reduce((sum, test) => sum + test.inputGrams, 0);
  if (inputGrams === 0) return null;
  const outputGrams = tests.reduce((sum, test) => sum + test.outputGrams, 0);
  const exact = fraction(BigInt(outputGrams), BigInt(inputGrams));
  const deviation = weightedDeviation(tests);
  const half = deviation === null ? null : studentT(UPPER_TAIL, tests.length - 1) * standardError(tests, deviation);
  const mean = outputGrams / inputGrams;
  return {
    n: tests.length,
    inputGrams,
    outputGrams,
    exact,
    yieldPpm: ppm(toSafeNumber(roundFraction({ n: exact.n * 1_000_000n, d: exact.d }, 'half-up'))),
    deviationPpm: deviation === null ? null : inPpm(deviation),
    interval: half === null ? null : { leastPpm: inPpm(mean - half), mostPpm: inPpm(mean + half) },
  };
}

/** The yield of one test, over 1,000,000. */
export const yieldOfTest = ({ inputGrams, outputGrams }: Omit<YieldObservation, 'testId'>): number =>
  toSafeNumber(roundFraction(fraction(BigInt(outputGrams) * 1_000_000n, BigInt(inputGrams)), 'half-up'));

/** The weighted standard deviation of the yields; null with fewer than two tests. */
export function weightedDeviation(tests: readonly YieldObservation[]): number | null {
  if (tests.length < 2) return null;
  const weight = tests.reduce((sum, { inputGrams }) => sum + inputGrams, 0);
  const mean = tests.reduce((sum, { outputGrams }) => sum + outputGrams, 0) / weight;
  const squares = tests.reduce(
    (sum, { inputGrams, outputGrams }) => sum + inputGrams * (outputGrams / inputGrams - mean) ** 2,
    0,
  );
  return Math.sqrt(((squares / weight) * tests.length) / (tests.length - 1));
}

function standardError(tests: readonly YieldObservation[], deviation: number): number {
  const weight = tests.reduce((sum, { inputGrams }) => sum + inputGrams, 0);
  return (deviation * Math.sqrt(tests.reduce((sum, { inputGrams }) => sum + inputGrams ** 2, 0))) / weight;
}

const inPpm = (value: number): number => Math.round(value * 1_000_000);
