import { grams, ok, ppm, type Refusal, type Result } from '@seamwright/shared/util';
import { faultsOfVersion } from './check-version';
import type { VersionContent } from './specification-version';

/** What an author wrote so far: any field may still be missing, or be wrong. */
export type DraftContent = Partial<VersionContent>;

/** What stands for a field that may be left open. */
const LEFT_OPEN = {
  summary: '',
  uneceItem: null,
  uneceItemSeen: false,
  fatCode: null,
  removed: [],
  finish: 'plain',
  ribs: null,
  toleranceMm: 0,
  gtin: null,
  ageing: null,
  allergens: [],
  mayContain: [],
  cookingLossPpm: ppm(0),
  steps: [],
  stations: [],
  choices: [],
  choiceRules: [],
  otherOutputs: [],
  uneceFields: {},
} as const satisfies DraftContent;

type MustBeSaid = Omit<VersionContent, keyof typeof LEFT_OPEN>;

/**
 * Something in the place of every field that must be said before review, in the order in which a version is written:
 * what agrees with what the author wrote, so that the rest can be checked while a field is still missing.
 */
function standIns(draft: DraftContent): MustBeSaid {
  const weight = draft.pieceNominalGrams ?? draft.pieceMinGrams ?? draft.pieceMaxGrams ?? grams(1);
  return {
    name: '–',
    sourceNodeId: '',
    cuttingLines: '–',
    boneState: 'boneless',
    fatCoverMm: 0,
    drawingKind: 'joint',
    pieceKind: 'piece',
    lengthMm: 1,
    widthMm: 1,
    heightMm: 1,
    pieceNominalGrams: weight,
    pieceMinGrams: weight,
    pieceMaxGrams: weight,
    piecesPerPack: 1,
    packsPerCase: 1,
    packType: 'vacuum',
    tareGrams: grams(0),
    temperatureState: 'chilled',
    storageMinC: draft.storageMaxC ?? 0,
    storageMaxC: draft.storageMinC ?? 0,
    shelfLifeDays: Math.max(1, draft.minLifeAtDeliveryDays ?? 1),
    minLifeAtDeliveryDays: 0,
    yieldPpm: ppm(1),
  };
}

/** Everything that is missing or wrong in a draft, each with a pointer to its field. Codes begin with `version-`. */
export function faultsOfDraft(draft: DraftContent): Refusal[] {
  const instead = standIns(draft);
  const missing = Object.keys(instead)
    .filter((field) => draft[field as keyof MustBeSaid] === undefined)
    .map((field): Refusal => ({ code: 'version-missing', params: {}, pointer: `/${field}` }));
  return [...missing, ...faultsOfVersion({ ...LEFT_OPEN, ...instead, ...draft })];
}

/** A draft as a version's content, what may be left open filled; refused with all that is missing or wrong. */
export function completeDraft(draft: DraftContent): Result<VersionContent, readonly Refusal[]> {
  const faults = faultsOfDraft(draft);
  return faults.length > 0 ? { ok: false, refusal: faults } : ok({ ...LEFT_OPEN, ...standIns(draft), ...draft });
}
