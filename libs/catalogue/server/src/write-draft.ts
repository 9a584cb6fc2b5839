import {
  completeDraft,
  type DraftContent,
  type SpecificationVersion,
  type VersionContent,
} from '@seamwright/catalogue/domain';
import { conflict, notFound, ProblemError, violates, type Caller, type Tx } from '@seamwright/shared/server';
import { moveComments } from './comments.repository';
import { deleteDraft, draftOf, insertDraft, updateDraft, type DraftRow } from './drafts.repository';
import { specificationByCode, versionOf } from './specifications.repository';
import { actingPerson, createSpecification, createVersion, refuseAll, submitVersion } from './write-version';

interface Writing {
  readonly now: Date;
  readonly caller: Caller;
}

/** Opens a specification under a new code with a draft that says its name. Refuses with `specification-code-taken`. */
export async function openNewSpecification(
  tx: Tx,
  { now, caller }: Writing,
  { code, cutNodeId, name }: { code: string; cutNodeId: string; name: string },
): Promise<string> {
  const authoredBy = actingPerson(caller);
  if (await specificationByCode(tx, code)) throw taken(code);
  const specificationId = await createSpecification(tx, { now, code, cutNodeId }).catch((error: unknown) => {
    throw violates(error, 'specifications_code') ? taken(code) : error;
  });
  return insertDraft(tx, now, { specificationId, baseVersion: null, content: { name }, authoredBy });
}

const taken = (code: string): Error => conflict('specification-code-taken', { code });

/**
 * Opens a draft of the next version as a copy of the newest. Refuses with `draft-open` when there is one, and
 * `version-in-review` while the newest waits for its review.
 */
export async function openNextDraft(tx: Tx, { now, caller }: Writing, code: string): Promise<string> {
  const authoredBy = actingPerson(caller);
  const specification = await specificationByCode(tx, code);
  const newest = specification && (await versionOf(tx, specification.id));
  if (!specification) throw notFound();
  // Held, so that two who open one at once get one draft and a clear answer.
  await tx.selectFrom('specifications').select('id').where('id', '=', specification.id).forUpdate().execute();
  const open = await draftOf(tx, code);
  if (open) throw conflict('draft-open', { author: open.authorName });
  if (!newest) throw notFound();
  if (newest.state === 'in-review') throw conflict('version-in-review');
  return insertDraft(tx, now, {
    specificationId: specification.id,
    baseVersion: newest.version,
    content: contentOf(newest),
    authoredBy,
  });
}

/** Keeps what was typed. Refuses with `draft-of-another` unless the author saves, `stale` when it changed meanwhile. */
export async function saveDraftContent(
  tx: Tx,
  { now, caller }: Writing,
  { code, rowVersion, content }: { code: string; rowVersion: number; content: DraftContent },
): Promise<void> {
  const draft = await ownDraft(tx, caller, code);
  await updateDraft(tx, now, { id: draft.id, rowVersion, content });
}

/** Throws a draft away; a specification that never had a version goes with it. */
export async function discardOwnDraft(
  tx: Tx,
  caller: Caller,
  { code, rowVersion }: { code: string; rowVersion: number },
): Promise<void> {
  const draft = await ownDraft(tx, caller, code);
  await deleteDraft(tx, { id: draft.id, rowVersion });
  if (draft.baseVersion === null && !(await versionOf(tx, draft.specificationId))) {
    await tx.deleteFrom('specifications').where('id', '=', draft.specificationId).execute();
  }
}

/** Sends a draft to review as the next version; gives that version's id. Refuses all that is missing or wrong (422). */
export async function submitOwnDraft(
  tx: Tx,
  { caller }: Writing,
  { code, rowVersion }: { code: string; rowVersion: number },
): Promise<string> {
  const draft = await ownDraft(tx, caller, code);
  const complete = completeDraft(draft.content);
  if (!complete.ok) throw refuseAll(complete.refusal);
  await deleteDraft(tx, { id: draft.id, rowVersion });
  const versionId = await createVersion(tx, {
    caller,
    specificationId: draft.specificationId,
    content: complete.value,
  });
  await submitVersion(tx, versionId);
  const version = await versionOf(tx, draft.specificationId);
  await moveComments(tx, draft.specificationId, { from: null, to: version?.version ?? null });
  return versionId;
}

async function ownDraft(tx: Tx, caller: Caller, code: string): Promise<DraftRow> {
  const draft = await draftOf(tx, code);
  if (!draft) throw notFound();
  if (draft.authoredBy !== actingPerson(caller)) {
    throw new ProblemError(403, { code: 'draft-of-another', params: { author: draft.authorName } });
  }
  return draft;
}

/** What an author wrote of a version, without what the house knows of it. */
export function contentOf(version: SpecificationVersion): VersionContent {
  const {
    id: _id,
    rowVersion: _rowVersion,
    specificationId: _specificationId,
    code: _code,
    species: _species,
    cutNodeId: _cutNodeId,
    version: _version,
    state: _state,
    standing: _standing,
    authoredBy: _authoredBy,
    approvedBy: _approvedBy,
    approvedAt: _approvedAt,
    ...content
  } = version;
  return content;
}
