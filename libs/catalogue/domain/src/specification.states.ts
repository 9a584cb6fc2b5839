import { ok, refuse, stateTable, type Result } from '@seamwright/shared/util';

export const VERSION_STATES = ['draft', 'in-review', 'approved'] as const;
export type VersionState = (typeof VERSION_STATES)[number];

/** What became of a version after its approval. */
export const STANDINGS = ['current', 'superseded', 'withdrawn'] as const;
export type Standing = (typeof STANDINGS)[number];

/** Where a version is in its life: what it says of itself until approval, its standing after. */
export type VersionStage = 'draft' | 'in-review' | Standing;
export type VersionMove = 'submit' | 'send-back' | 'approve' | 'supersede' | 'withdraw';

/** The life of a version; approval makes it current. */
export const specificationStates = stateTable<VersionStage, VersionMove>({
  draft: { submit: 'in-review' },
  'in-review': { 'send-back': 'draft', approve: 'current' },
  current: { supersede: 'superseded', withdraw: 'withdrawn' },
  superseded: {},
  withdrawn: {},
});

interface StagedVersion {
  readonly state: VersionState;
  readonly standing: Standing | null;
}

/** Approved without a standing can't be: an approval writes both at once. */
export const stageOf = ({ state, standing }: StagedVersion): VersionStage =>
  state === 'approved' ? (standing ?? 'superseded') : state;

/** Whether this person may approve: never the author. Refuses with `own-version` or `move-not-allowed`. */
export function mayApprove(
  version: StagedVersion & { readonly authoredBy: string },
  personId: string,
): Result<VersionStage> {
  const next = specificationStates.next(stageOf(version), 'approve');
  if (!next.ok) return next;
  return version.authoredBy === personId ? refuse('own-version') : ok(next.value);
}
