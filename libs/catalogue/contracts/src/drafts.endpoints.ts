import * as z from 'zod';
import { SPECIES } from '@seamwright/catalogue/domain';
import { defineEndpoint, id, instant, line, note, rowVersion, staffOnly } from '@seamwright/shared/contracts';
import { code } from './code';
import { draftContent, staffSpecification } from './specification.wire';

const technical = staffOnly('technical');
const number = z.int().positive();

const draft = z.strictObject({
  id,
  rowVersion,
  code,
  species: z.enum(SPECIES),
  cutNodeId: id,
  /** The version it was copied from; null for a new specification. */
  baseVersion: number.nullable(),
  content: draftContent,
  authorId: id,
  authorName: z.string(),
  updatedAt: instant,
});
export type SpecificationDraft = z.infer<typeof draft>;

const draftRow = draft.omit({ content: true, cutNodeId: true }).extend({ name: z.string() }).strict();
export type SpecificationDraftRow = z.infer<typeof draftRow>;

export const listDrafts = defineEndpoint({
  id: 'specification-drafts.list',
  summary: 'What technical staff are writing, the latest touched first',
  method: 'GET',
  path: '/specification-drafts',
  access: technical,
  response: z.strictObject({ items: z.array(draftRow) }),
});

export const openSpecification = defineEndpoint({
  id: 'specification-drafts.open-new',
  summary: 'Opens a specification under a new code with an empty draft of its first version',
  method: 'POST',
  path: '/specification-drafts',
  access: technical,
  body: z.strictObject({ code, cutNodeId: id, name: line(120) }),
  response: draft,
  status: 201,
  idempotent: true,
});

export const openDraft = defineEndpoint({
  id: 'specification-drafts.open',
  summary: 'Opens a draft of the next version, as a copy of the newest',
  method: 'POST',
  path: '/specifications/:code/draft',
  access: technical,
  params: { code },
  response: draft,
  status: 201,
  idempotent: true,
});

export const getDraft = defineEndpoint({
  id: 'specification-drafts.get',
  summary: 'The draft of a specification as it was typed',
  method: 'GET',
  path: '/specifications/:code/draft',
  access: technical,
  params: { code },
  response: draft,
});

export const saveDraft = defineEndpoint({
  id: 'specification-drafts.save',
  summary: 'Keeps a draft as it is typed; only its author may',
  method: 'PUT',
  path: '/specifications/:code/draft',
  access: technical,
  params: { code },
  body: z.strictObject({ content: draftContent }),
  response: draft,
  guarded: true,
});

export const discardDraft = defineEndpoint({
  id: 'specification-drafts.discard',
  summary: 'Throws a draft away, and with it a specification that has no version yet',
  method: 'DELETE',
  path: '/specifications/:code/draft',
  access: technical,
  params: { code },
  guarded: true,
});

export const submitDraft = defineEndpoint({
  id: 'specification-drafts.submit',
  summary: 'Sends a draft to review as the next version; refused field by field while something is missing or wrong',
  method: 'POST',
  path: '/specifications/:code/draft/submission',
  access: technical,
  params: { code },
  response: staffSpecification,
  guarded: true,
});

export const approveReviewed = defineEndpoint({
  id: 'specification-versions.approve',
  summary: 'Puts a version in review into force; never by its author',
  method: 'POST',
  path: '/specifications/:code/versions/:version/approval',
  access: technical,
  params: { code, version: number },
  response: staffSpecification,
  guarded: true,
});

export const sendBackReviewed = defineEndpoint({
  id: 'specification-versions.send-back',
  summary: 'Gives a version in review back to its author as a draft, with what is to be changed',
  method: 'POST',
  path: '/specifications/:code/versions/:version/return',
  access: technical,
  params: { code, version: number },
  body: z.strictObject({ reason: line(1000) }),
  response: draft,
  guarded: true,
});

const comment = z.strictObject({
  id,
  version: number.nullable(),
  /** The field it is about, as a JSON pointer into the content. */
  pointer: z.string().nullable(),
  body: z.string(),
  saidByName: z.string(),
  saidAt: instant,
});
export type SpecificationComment = z.infer<typeof comment>;

export const listComments = defineEndpoint({
  id: 'specification-comments.list',
  summary: 'What technical staff said to each other about a specification, oldest first',
  method: 'GET',
  path: '/specifications/:code/comments',
  access: technical,
  params: { code },
  response: z.strictObject({ items: z.array(comment) }),
});

export const addComment = defineEndpoint({
  id: 'specification-comments.add',
  summary: 'Says something about a version, or about a field of it',
  method: 'POST',
  path: '/specifications/:code/comments',
  access: technical,
  params: { code },
  body: z.strictObject({
    version: number.nullable(),
    pointer: z
      .string()
      .regex(/^(\/[A-Za-z0-9-]+)+$/)
      .max(120)
      .nullable(),
    body: note(2000).min(1),
  }),
  response: comment,
  status: 201,
  idempotent: true,
});
