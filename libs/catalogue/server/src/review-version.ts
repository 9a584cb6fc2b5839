import { specificationStates, stageOf, type SpecificationVersion } from '@seamwright/catalogue/domain';
import { notFound, stale, type Caller, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import { insertComment, moveComments } from './comments.repository';
import { insertDraft } from './drafts.repository';
import { specificationByCode, versionOf } from './specifications.repository';
import { contentOf } from './write-draft';
import { actingPerson } from './write-version';

/** A version by its specification's code and its number. Refuses with `not-found`. */
export async function namedVersion(tx: Tx, code: string, version: number): Promise<SpecificationVersion> {
  const specification = await specificationByCode(tx, code);
  const found = specification && (await versionOf(tx, specification.id, version));
  if (!found) throw notFound();
  return found;
}

interface Return {
  readonly now: Date;
  readonly caller: Caller;
  readonly code: string;
  readonly version: number;
  readonly rowVersion: number;
  /** What is to be changed. */
  readonly reason: string;
}

/**
 * Gives a version in review back to its author: it is a draft again, its number is free, and the reason stands among the
 * comments. Refuses with `move-not-allowed` from any other state, `stale` when it is not the row version that was read.
 */
export async function sendBack(
  tx: Tx,
  { now, caller, code, version: number, rowVersion, reason }: Return,
): Promise<void> {
  const saidBy = actingPerson(caller);
  const version = await namedVersion(tx, code, number);
  unwrap(specificationStates.next(stageOf(version), 'send-back'));
  const gone = await tx
    .deleteFrom('specificationVersions')
    .where('id', '=', version.id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (gone.numDeletedRows === 0n) throw stale();
  const { specificationId, authoredBy } = version;
  const base = await versionOf(tx, specificationId);
  await insertDraft(tx, now, {
    specificationId,
    baseVersion: base?.version ?? null,
    content: contentOf(version),
    authoredBy,
  });
  await moveComments(tx, specificationId, { from: number, to: null });
  await insertComment(tx, now, { specificationId, version: null, pointer: null, body: reason, saidBy });
}
