import { formatKgWithUnit, grams, UNIT_SPACE } from '@seamwright/shared/util';

/** A piece's weight as the trade says it: grams below a kilogram, kilograms from there on. */
export const weightText = (weight: number): string =>
  weight < 1000 ? `${weight}${UNIT_SPACE}g` : formatKgWithUnit(grams(weight));
