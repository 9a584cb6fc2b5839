import type { Species } from '../cut-words';
import type { UneceField } from './layout';

/** What a value of a field means. Reference data: an administrator completes and corrects it. */
export interface UneceFieldValue {
  readonly field: UneceField;
  readonly value: string;
  readonly meaning: string;
  /** The species that it is for, null for all; of the field `species` itself, the house's species that it stands for. */
  readonly species: Species | null;
  /** False where it was not read in a standard: it is from memory until somebody corrects it with a source. */
  readonly seen: boolean;
  readonly source: string | null;
}

/** The values of a field that hold for a species; empty when none are kept yet. */
export function valuesOfUneceField(
  values: readonly UneceFieldValue[],
  field: UneceField,
  species: Species | null,
): UneceFieldValue[] {
  return values.filter(
    (each) => each.field === field && (field === 'species' || each.species === null || each.species === species),
  );
}

/** What a value stands for: one of the species' own before one for all. Null when it is not in the list. */
export function meaningOfUneceValue(
  values: readonly UneceFieldValue[],
  { field, value, species }: { field: UneceField; value: string; species: Species | null },
): UneceFieldValue | null {
  const meant = valuesOfUneceField(values, field, species).filter((each) => each.value === value);
  return meant.find((each) => each.species !== null) ?? meant[0] ?? null;
}

/** The two digits that stand for a species of the house; null when the list has none. */
export function uneceSpeciesCode(values: readonly UneceFieldValue[], species: Species): string | null {
  return values.find((each) => each.field === 'species' && each.species === species)?.value ?? null;
}
