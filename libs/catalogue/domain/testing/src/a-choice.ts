import type { Choice, ChoiceValue } from '../../src';

/** A value that changes nothing but what is stated. */
export function aValue(value: string, stated: Partial<ChoiceValue> = {}): ChoiceValue {
  return {
    value,
    label: value,
    priceChangeMinorPerKg: 0,
    leadDays: 0,
    yieldFactorPpm: 1_000_000,
    extraSecondsPerKg: 0,
    extraSecondsPerPiece: 0,
    ...stated,
  };
}

/** A choice among values; the first is the default. */
export function aChoice(key: string, values: readonly ChoiceValue[], unit?: string): Choice {
  return { key, label: key, ...(unit === undefined ? {} : { unit }), values, defaultValue: values[0]?.value ?? '' };
}
