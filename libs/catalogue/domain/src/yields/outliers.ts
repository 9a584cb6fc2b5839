import { weightedDeviation, type YieldObservation } from './yield-estimate';

/** Fewer others than this tell nothing of how far tests lie apart. */
const FEWEST_OTHERS = 3;
const FAR = 3;

/**
 * The tests that lie more than three standard deviations from the others, mean and deviation worked out without them.
 * They are for a person to look at: nothing is dropped by it.
 */
export function outliersAmong(tests: readonly YieldObservation[]): ReadonlySet<string> {
  return new Set(tests.filter((test) => isFar(test, tests)).map(({ testId }) => testId));
}

function isFar(test: YieldObservation, tests: readonly YieldObservation[]): boolean {
  const others = tests.filter((other) => other !== test);
  const deviation = others.length < FEWEST_OTHERS ? null : weightedDeviation(others);
  if (deviation === null) return false;
  const input = others.reduce((sum, { inputGrams }) => sum + inputGrams, 0);
  const output = others.reduce((sum, { outputGrams }) => sum + outputGrams, 0);
  return Math.abs(test.outputGrams / test.inputGrams - output / input) > FAR * deviation + ROUNDING;
}

/** Others that are all alike differ by nothing but the last digits of a float. */
const ROUNDING = 1e-9;
