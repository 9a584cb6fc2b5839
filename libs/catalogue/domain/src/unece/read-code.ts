import { ok, type Refusal, type Result } from '@seamwright/shared/util';
import type { Species } from '../cut-words';
import { meaningOfUneceValue, valuesOfUneceField, type UneceFieldValue } from './field-values';
import {
  CHOSEN_UNECE_FIELDS,
  fillsUneceField,
  UNECE_LAYOUT,
  UNECE_LENGTH,
  type UneceField,
  type UneceFieldLayout,
} from './layout';

/** One field of a code, with what it stands for; `meaning` is null while no list of the field's values is kept. */
export interface UneceFieldReading extends UneceFieldLayout {
  readonly value: string;
  readonly meaning: Pick<UneceFieldValue, 'meaning' | 'seen' | 'source'> | null;
}

export interface UneceReading {
  readonly code: string;
  /** The house's species, null when the code is of another. */
  readonly species: Species | null;
  readonly fields: readonly UneceFieldReading[];
}

const NOT_USED = '00';

/**
 * Reads a code field by field. Refuses with `unece-code-length` (length, wanted), or with every field that is at fault,
 * pointing at `<pointer>/<field>`: `unece-field-digits` (number, digits), `unece-field-unused`, or
 * `unece-value-unlisted` (number, value). A field without a list of values takes any digits.
 */
export function readUneceCode(
  code: string,
  values: readonly UneceFieldValue[],
  pointer = '/fields',
): Result<UneceReading, readonly Refusal[]> {
  const packed = code.replace(/ /g, '');
  if (packed.length !== UNECE_LENGTH) {
    return refused([{ code: 'unece-code-length', params: { length: packed.length, wanted: UNECE_LENGTH } }]);
  }
  const parts = UNECE_LAYOUT.map((layout) => ({
    layout,
    value: packed.slice(layout.start, layout.start + layout.digits),
  }));
  const species = speciesOf(parts[0]?.value ?? '', values);
  const faults = parts.flatMap(
    ({ layout: { field }, value }) => faultOfUneceValue({ field, value, species }, values, pointer) ?? [],
  );
  if (faults.length > 0) return refused(faults);
  const fields = parts.map(({ layout, value }) => {
    const listed = meaningOfUneceValue(values, { field: layout.field, value, species });
    const meaning = listed && { meaning: listed.meaning, seen: listed.seen, source: listed.source };
    return { ...layout, value, meaning };
  });
  return ok({ code: packed, species, fields });
}

const refused = (refusal: readonly Refusal[]) => ({ ok: false, refusal }) as const;

const speciesOf = (value: string, values: readonly UneceFieldValue[]): Species | null =>
  meaningOfUneceValue(values, { field: 'species', value, species: null })?.species ?? null;

/** Zeros stand in a field that an author chooses when nothing was chosen, whether or not its list has them. */
const saysNothing = (field: UneceField, value: string): boolean =>
  /^0+$/.test(value) && (CHOSEN_UNECE_FIELDS as readonly UneceField[]).includes(field);

/** What is wrong with one field's value, or null. */
export function faultOfUneceValue(
  { field, value, species }: { field: UneceField; value: string; species: Species | null },
  values: readonly UneceFieldValue[],
  pointer: string,
): Refusal | null {
  const layout = UNECE_LAYOUT.find((each) => each.field === field);
  const { number, digits } = layout ?? { number: 0, digits: 0 };
  const at = { pointer: `${pointer}/${field}` };
  if (!fillsUneceField(field, value)) return { code: 'unece-field-digits', params: { number, digits }, ...at };
  if (field === 'unused') return value === NOT_USED ? null : { code: 'unece-field-unused', params: { number }, ...at };
  const listed = valuesOfUneceField(values, field, species);
  if (saysNothing(field, value)) return null;
  if (listed.length === 0 || listed.some((each) => each.value === value)) return null;
  return { code: 'unece-value-unlisted', params: { number, value }, ...at };
}
