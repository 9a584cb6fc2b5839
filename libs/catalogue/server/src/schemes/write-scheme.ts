import { mayApprove, specificationStates, stageOf, type SchemeContent } from '@seamwright/catalogue/domain';
import { conflict, emit, notFound, stale, type Caller, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError, unwrap } from '@seamwright/shared/util';
import { cutNodes } from '../cut-nodes.repository';
import { actingPerson } from '../write-version';
import { refuseAll, schemeFaults } from './scheme-faults';
import {
  insertScheme,
  insertSchemeVersion,
  lockScheme,
  makeSchemeCurrent,
  schemeVersions,
  updateSchemeVersion,
  withdrawSchemeVersion,
  type SchemeVersion,
} from './schemes.repository';

export interface Acting {
  readonly now: Date;
  readonly caller: Caller;
}

/** Opens a scheme with a first draft; gives its id. The species is that of the piece that goes in. */
export async function createScheme(
  tx: Tx,
  { now, caller }: Acting,
  { code, content }: { readonly code: string; readonly content: SchemeContent },
): Promise<string> {
  const authoredBy = actingPerson(caller);
  const node = await inputNode(tx, content, '/content/inputNodeId');
  const id = newId();
  await insertScheme(tx, { id, code, species: node.species, createdAt: now });
  await insertSchemeVersion(tx, { id: newId(), schemeId: id, version: 1, state: 'draft', content, authoredBy });
  return id;
}

/**
 * Keeps a draft as typed, faults and all. Where the newest version is approved the next one begins. Refuses
 * `move-not-allowed` while it is in review, `scheme-draft-of-another`, and `stale`.
 */
export async function saveSchemeDraft(
  tx: Tx,
  { caller }: Acting,
  {
    code,
    content,
    rowVersion,
  }: { readonly code: string; readonly content: SchemeContent; readonly rowVersion: number },
): Promise<void> {
  const person = actingPerson(caller);
  const newest = await newestOf(tx, code, rowVersion);
  const { species } = await inputNode(tx, content, '/inputNodeId');
  if (species !== newest.species)
    throw new RefusalError({ code: 'scheme-species-kept', params: {}, pointer: '/inputNodeId' });
  if (newest.state === 'approved') return insertNext(tx, newest, { content, state: 'draft', authoredBy: person });
  if (newest.state === 'in-review')
    throw new RefusalError({ code: 'move-not-allowed', params: { from: 'in-review', move: 'save' } });
  if (newest.authoredBy !== person) throw conflict('scheme-draft-of-another');
  await updateSchemeVersion(tx, newest.id, { content });
}

/** Writes the version after `newest`; gives nothing, since it can be read by the scheme's code. */
export async function insertNext(
  tx: Tx,
  newest: SchemeVersion,
  next: {
    readonly content: SchemeContent;
    readonly state: 'draft' | 'in-review';
    readonly authoredBy: string;
    readonly id?: string;
  },
): Promise<void> {
  const { id = newId(), ...rest } = next;
  await insertSchemeVersion(tx, { id, schemeId: newest.schemeId, version: newest.version + 1, ...rest });
}

async function inputNode(tx: Tx, { inputNodeId }: SchemeContent, pointer: string) {
  const node = (await cutNodes(tx)).get(inputNodeId);
  if (!node) throw new RefusalError({ code: 'scheme-node-unknown', params: {}, pointer });
  return node;
}

/** Locks the scheme and gives its newest version. Refuses `stale` when it is not the one that was read. */
async function newestOf(tx: Tx, code: string, rowVersion: number): Promise<SchemeVersion> {
  await lockScheme(tx, code);
  const [newest] = await schemeVersions(tx, code);
  if (!newest) throw notFound();
  if (newest.rowVersion !== rowVersion) throw stale();
  return newest;
}

export type SchemeMove = 'submit' | 'send-back' | 'approve' | 'withdraw';

interface Moving {
  readonly code: string;
  readonly move: SchemeMove;
  readonly reason?: string | undefined;
  readonly rowVersion: number;
}

/**
 * Moves a scheme. Submitting and approving refuse every fault at its field, approving refuses the author
 * (`own-version`); sending back and withdrawing refuse without a reason. Any other move is `move-not-allowed`.
 */
export async function moveScheme(tx: Tx, acting: Acting, { code, move, reason, rowVersion }: Moving): Promise<void> {
  const person = actingPerson(acting.caller);
  const needsReason = move === 'withdraw' || move === 'send-back';
  if (needsReason && reason === undefined)
    throw new RefusalError({ code: 'reason-missing', params: {}, pointer: '/reason' });
  const version = move === 'withdraw' ? await inForce(tx, code, rowVersion) : await newestOf(tx, code, rowVersion);
  if (move === 'approve') unwrap(mayApprove(version, person));
  else unwrap(specificationStates.next(stageOf(version), move));
  if (move === 'submit' || move === 'approve') refuseAll(await schemeFaults(tx, code, version.content));
  await moved(tx, acting, version, { move, reason: reason ?? '', person });
}

/** The version in force, or the newest where none is, so that the refusal tells where it stands. */
async function inForce(tx: Tx, code: string, rowVersion: number): Promise<SchemeVersion> {
  await lockScheme(tx, code);
  const versions = await schemeVersions(tx, code);
  const version = versions.find(({ standing }) => standing === 'current') ?? versions[0];
  if (!version) throw notFound();
  if (version.rowVersion !== rowVersion) throw stale();
  return version;
}

async function moved(
  tx: Tx,
  { now }: Acting,
  version: SchemeVersion,
  { move, reason, person }: { readonly move: SchemeMove; readonly reason: string; readonly person: string },
): Promise<void> {
  const { id, schemeId } = version;
  const told = (type: string) =>
    emit(tx, now, { type, subjectId: schemeId, customerId: null, payload: { versionId: id } });
  switch (move) {
    case 'submit':
      return updateSchemeVersion(tx, id, { state: 'in-review' });
    case 'send-back':
      await updateSchemeVersion(tx, id, { state: 'draft' });
      return emit(tx, now, { type: 'scheme-sent-back', subjectId: schemeId, customerId: null, payload: { reason } });
    case 'approve':
      await updateSchemeVersion(tx, id, { state: 'approved', approvedBy: person, approvedAt: now });
      await makeSchemeCurrent(tx, { versionId: id, schemeId, since: now });
      return told('scheme-approved');
    case 'withdraw':
      await withdrawSchemeVersion(tx, id, now, reason);
      return told('scheme-withdrawn');
  }
}
