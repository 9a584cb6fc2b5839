import { ok, refuse, type Refusal, type Result } from '@seamwright/shared/util';
import type { Species, TemperatureState } from '../cut-words';
import { uneceSpeciesCode, type UneceFieldValue } from './field-values';
import { CHOSEN_UNECE_FIELDS, UNECE_LAYOUT, type ChosenUneceField, type UneceField } from './layout';
import { faultOfUneceValue } from './read-code';

/** What an author chose of the code; a field that is left out is written as zeros. */
export type UneceFields = Readonly<Partial<Record<ChosenUneceField, string>>>;

/** What of a version goes into its code. */
export interface CodedVersion {
  readonly uneceItem: string | null;
  readonly fatCode: string | null;
  readonly temperatureState: TemperatureState;
  readonly storageMaxC: number;
  readonly uneceFields: UneceFields;
}

const DEEP_FROZEN_C = -18;

/** The digit of the refrigeration field, from memory of the standards. They say nothing of what was defrosted: zero. */
function refrigerationOf({ temperatureState, storageMaxC }: CodedVersion): string {
  if (temperatureState === 'chilled') return '1';
  if (temperatureState === 'defrosted') return '0';
  return storageMaxC <= DEEP_FROZEN_C ? '3' : '2';
}

/** What the author chose; the fat thickness that stands on the version counts as chosen. */
const chosenFields = ({ uneceFields, fatCode }: CodedVersion): UneceFields =>
  fatCode === null ? uneceFields : { fatThickness: fatCode, ...uneceFields };

/**
 * The 20 digits of a version. Species, item and refrigeration follow from the version, the rest is the author's. Refuses
 * with `unece-item-missing` (pointing at `/uneceItem`) or `unece-species-unlisted` (species).
 */
export function uneceCodeOf(
  version: CodedVersion,
  species: Species,
  values: readonly UneceFieldValue[],
): Result<string> {
  if (version.uneceItem === null) return refuse('unece-item-missing', {}, '/uneceItem');
  const speciesCode = uneceSpeciesCode(values, species);
  if (speciesCode === null) return refuse('unece-species-unlisted', { species });
  const written: Readonly<Partial<Record<UneceField, string>>> = {
    ...chosenFields(version),
    species: speciesCode,
    item: version.uneceItem,
    refrigeration: refrigerationOf(version),
  };
  return ok(UNECE_LAYOUT.map(({ field, digits }) => written[field] ?? '0'.repeat(digits)).join(''));
}

/**
 * What is wrong with what an author chose, each pointing at `/uneceFields/<field>`: `unece-field-unknown` (field),
 * `unece-fat-differs` (fatCode), `unece-field-digits` (number, digits) and, where the lists are given,
 * `unece-value-unlisted` (number, value).
 */
export function faultsOfUneceFields(
  version: CodedVersion,
  species: Species | null = null,
  values: readonly UneceFieldValue[] = [],
): Refusal[] {
  const { uneceFields, fatCode } = version;
  const unknown = Object.keys(uneceFields).filter(
    (field) => !(CHOSEN_UNECE_FIELDS as readonly string[]).includes(field),
  );
  const chosen = chosenFields(version);
  const differs = fatCode !== null && chosen.fatThickness !== fatCode;
  return [
    ...unknown.map((field) => fault('unece-field-unknown', field, { field })),
    ...(differs ? [fault('unece-fat-differs', 'fatThickness', { fatCode })] : []),
    ...CHOSEN_UNECE_FIELDS.flatMap((field) => {
      const value = chosen[field];
      if (value === undefined) return [];
      return faultOfUneceValue({ field, value, species }, values, '/uneceFields') ?? [];
    }),
  ];
}

const fault = (code: string, field: string, params: Refusal['params']): Refusal => ({
  code,
  params,
  pointer: `/uneceFields/${field}`,
});
