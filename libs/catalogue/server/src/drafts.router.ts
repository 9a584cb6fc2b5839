import {
  addComment,
  approveReviewed,
  discardDraft,
  getDraft,
  listComments,
  listDrafts,
  openDraft,
  openSpecification,
  saveDraft,
  sendBackReviewed,
  submitDraft,
  type SpecificationDraft,
} from '@seamwright/catalogue/contracts';
import type { DraftContent, Species } from '@seamwright/catalogue/domain';
import {
  implement,
  implementOnce,
  inTransaction,
  notFound,
  type Implementation,
  type Tx,
} from '@seamwright/shared/server';
import { approveVersion } from './approve-version';
import { commentById, commentsOf, insertComment } from './comments.repository';
import { draftById, draftOf, openDrafts, type DraftRow } from './drafts.repository';
import { readStaffSpecification } from './read-catalogue';
import { namedVersion, sendBack } from './review-version';
import { specificationByCode } from './specifications.repository';
import { discardOwnDraft, openNewSpecification, openNextDraft, saveDraftContent, submitOwnDraft } from './write-draft';
import { actingPerson } from './write-version';

function presentDraft(draft: DraftRow | undefined): SpecificationDraft {
  if (!draft) throw notFound();
  const { specificationId: _, authoredBy, updatedAt, species, ...rest } = draft;
  return {
    ...rest,
    species: species as Species,
    content: draft.content as SpecificationDraft['content'],
    authorId: authoredBy,
    updatedAt: updatedAt.toISOString(),
  };
}

function presentRow({ content, cutNodeId: _, ...draft }: SpecificationDraft) {
  return { ...draft, name: content.name ?? '' };
}

const readDraft = async (tx: Tx, code: string): Promise<SpecificationDraft> => presentDraft(await draftOf(tx, code));

async function specificationIdOf(tx: Tx, code: string): Promise<string> {
  const specification = await specificationByCode(tx, code);
  if (!specification) throw notFound();
  return specification.id;
}

/** Writing, reviewing and approving versions. */
export const draftsImplementations: readonly Implementation[] = [
  implement(listDrafts, ({ database, caller }) =>
    inTransaction(database, caller, async (tx) => ({
      items: (await openDrafts(tx)).map(presentDraft).map(presentRow),
    })),
  ),
  implementOnce(openSpecification, {
    make: (tx, context, { body }) => openNewSpecification(tx, context, body),
    present: async (tx, _context, id) => presentDraft(await draftById(tx, id)),
  }),
  implementOnce(openDraft, {
    make: (tx, context, { params }) => openNextDraft(tx, context, params.code),
    present: async (tx, _context, id) => presentDraft(await draftById(tx, id)),
  }),
  implement(getDraft, ({ database, caller }, { params }) =>
    inTransaction(database, caller, (tx) => readDraft(tx, params.code)),
  ),
  implement(saveDraft, (context, { params, body }) =>
    inTransaction(context.database, context.caller, async (tx) => {
      const content = body.content as DraftContent;
      await saveDraftContent(tx, context, { code: params.code, rowVersion: context.ifMatch, content });
      return readDraft(tx, params.code);
    }),
  ),
  implement(discardDraft, ({ database, caller, ifMatch }, { params }) =>
    inTransaction(database, caller, async (tx) => {
      await discardOwnDraft(tx, caller, { code: params.code, rowVersion: ifMatch });
      return undefined;
    }),
  ),
  implement(submitDraft, (context, { params }) =>
    inTransaction(context.database, context.caller, async (tx) => {
      await submitOwnDraft(tx, context, { code: params.code, rowVersion: context.ifMatch });
      return readStaffSpecification(tx, params.code, 'newest');
    }),
  ),
  implement(approveReviewed, ({ database, caller, now, ifMatch }, { params }) =>
    inTransaction(database, caller, async (tx) => {
      const { id } = await namedVersion(tx, params.code, params.version);
      await approveVersion(tx, { now, caller, versionId: id, rowVersion: ifMatch });
      return readStaffSpecification(tx, params.code, params.version);
    }),
  ),
  implement(sendBackReviewed, ({ database, caller, now, ifMatch }, { params, body }) =>
    inTransaction(database, caller, async (tx) => {
      await sendBack(tx, { now, caller, ...params, rowVersion: ifMatch, reason: body.reason });
      return readDraft(tx, params.code);
    }),
  ),
  implement(listComments, ({ database, caller }, { params }) =>
    inTransaction(database, caller, async (tx) => ({
      items: await commentsOf(tx, await specificationIdOf(tx, params.code)),
    })),
  ),
  implementOnce(addComment, {
    make: async (tx, { now, caller }, { params, body }) =>
      insertComment(tx, now, {
        ...body,
        specificationId: await specificationIdOf(tx, params.code),
        saidBy: actingPerson(caller),
      }),
    present: (tx, _context, id) => commentById(tx, id),
  }),
];
