import type { Selectable } from 'kysely';
import type { DB } from '@seamwright/database';
import type { SpecificationVersion, VersionContent } from '@seamwright/catalogue/domain';
import { grams, ppm } from '@seamwright/shared/util';

/** What stands beside a version's own columns when it is read. */
interface Beside {
  readonly code: string;
  readonly species: string;
  readonly cutNodeId: string;
  readonly standing: string | null;
}

export type VersionRow = Selectable<DB['specificationVersions']> & Beside;

/** A version as the domain knows it. Words are checked by the table's constraints, lists by the use case that wrote them. */
export function toVersion(row: VersionRow): SpecificationVersion {
  const { ageingKind, ageingMinDays, ageingMaxDays, ...rest } = row;
  return {
    ...rest,
    pieceNominalGrams: grams(row.pieceNominalGrams),
    pieceMinGrams: grams(row.pieceMinGrams),
    pieceMaxGrams: grams(row.pieceMaxGrams),
    tareGrams: grams(row.tareGrams),
    yieldPpm: ppm(row.yieldPpm),
    cookingLossPpm: ppm(row.cookingLossPpm),
    ageing: ageingKind === null ? null : { kind: ageingKind, minDays: ageingMinDays ?? 0, maxDays: ageingMaxDays ?? 0 },
  } as SpecificationVersion;
}

/** The columns of what an author wrote. */
export function contentColumns(content: VersionContent) {
  const {
    ageing,
    removed,
    allergens,
    mayContain,
    uneceFields,
    steps,
    stations,
    choices,
    choiceRules,
    otherOutputs,
    ...rest
  } = content;
  return {
    ...rest,
    removed: [...removed],
    allergens: [...allergens],
    mayContain: [...mayContain],
    ageingKind: ageing?.kind ?? null,
    ageingMinDays: ageing?.minDays ?? null,
    ageingMaxDays: ageing?.maxDays ?? null,
    uneceFields: JSON.stringify(uneceFields),
    steps: JSON.stringify(steps),
    stations: JSON.stringify(stations),
    choices: JSON.stringify(choices),
    choiceRules: JSON.stringify(choiceRules),
    otherOutputs: JSON.stringify(otherOutputs),
  };
}
