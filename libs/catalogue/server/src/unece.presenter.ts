import type { UneceReadingWire, VersionUneceCode } from '@seamwright/catalogue/contracts';
import {
  gs1MeatCut,
  readUneceCode,
  uneceCodeOf,
  type SpecificationVersion,
  type UneceFieldValue,
  type UneceReading,
} from '@seamwright/catalogue/domain';
import { sayRefusal } from '@seamwright/shared/contracts';
import type { Refusal } from '@seamwright/shared/util';

export const presentUneceReading = ({ code, species, fields }: UneceReading): UneceReadingWire => ({
  code,
  species,
  gs1Element: gs1MeatCut(code),
  fields: [...fields],
});

/** Refusals as a problem document lists them. */
export const saidFaults = (refusals: readonly Refusal[]): { pointer: string; message: string }[] =>
  refusals.map((refusal) => ({ pointer: refusal.pointer ?? '', message: sayRefusal(refusal) }));

/** The code of a version read field by field, or what keeps it from having one. */
export function presentVersionCode(
  version: SpecificationVersion,
  values: readonly UneceFieldValue[],
): VersionUneceCode {
  const code = uneceCodeOf(version, version.species, values);
  if (!code.ok) return { reading: null, faults: saidFaults([code.refusal]) };
  const reading = readUneceCode(code.value, values, '/uneceFields');
  if (!reading.ok) return { reading: null, faults: saidFaults(reading.refusal) };
  return { reading: presentUneceReading(reading.value), faults: [] };
}
