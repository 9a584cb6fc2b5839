import * as z from 'zod';
import { CHOSEN_UNECE_FIELDS, SPECIES, UNECE_FIELDS, type ChosenUneceField } from '@seamwright/catalogue/domain';
import { id, rowVersion } from '@seamwright/shared/contracts';

const seen = z.boolean().meta({ description: 'False where it was not read in a standard but is from memory' });
const chosenField = z.string().max(4);

/** What an author chose of the code: field → digits. */
export const uneceFieldsWire = z
  .strictObject(
    Object.fromEntries(CHOSEN_UNECE_FIELDS.map((field) => [field, chosenField])) as Record<
      ChosenUneceField,
      typeof chosenField
    >,
  )
  .partial();

const meaning = z.strictObject({ meaning: z.string(), seen, source: z.string().nullable() });

const fieldReading = z.strictObject({
  number: z.int().meta({ description: 'Of the 14 fields, from 1' }),
  field: z.enum(UNECE_FIELDS),
  digits: z.int(),
  start: z.int().meta({ description: 'Where it begins in the code, from 0' }),
  seen,
  value: z.string(),
  meaning: meaning.nullable().meta({ description: 'Null while no list of the values of the field is kept' }),
});

/** A code read field by field. */
export const uneceReading = z.strictObject({
  code: z.string(),
  species: z.enum(SPECIES).nullable(),
  gs1Element: z.string().meta({ description: 'As it stands in a GS1 bar code, written for people' }),
  fields: z.array(fieldReading),
});
export type UneceReadingWire = z.infer<typeof uneceReading>;

/** The code of a version, with what keeps it from having one. */
export const versionUneceCode = z.strictObject({
  reading: uneceReading.nullable(),
  faults: z.array(z.strictObject({ pointer: z.string(), message: z.string() })),
});
export type VersionUneceCode = z.infer<typeof versionUneceCode>;

/** A value of a field with what it stands for. */
export const uneceValueWire = z.strictObject({
  id,
  rowVersion,
  field: z.enum(UNECE_FIELDS),
  value: z.string(),
  meaning: z.string(),
  species: z.enum(SPECIES).nullable().meta({
    description: 'Null for all species; of the field `species`, the species of the house that the value stands for',
  }),
  seen,
  source: z.string().nullable(),
});
export type UneceValueWire = z.infer<typeof uneceValueWire>;
