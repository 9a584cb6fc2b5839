import { mayApprove } from '@seamwright/catalogue/domain';
import { emit, notFound, stale, type Caller, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import { cutNodes } from './cut-nodes.repository';
import { makeFindable } from './search-index.repository';
import { versionsByIds } from './specifications.repository';
import { actingPerson } from './write-version';

/**
 * Approves a version in review: it takes the place of the one in force and can be found and ordered from now on.
 * Refuses with `own-version` when the author asks, `move-not-allowed` from any other state, and `stale` when it is not the
 * row version that was read.
 */
export async function approveVersion(
  tx: Tx,
  { now, caller, versionId, rowVersion }: { now: Date; caller: Caller; versionId: string; rowVersion?: number },
): Promise<void> {
  const approvedBy = actingPerson(caller);
  // Locked first, so that two approvals of one specification follow each other.
  await tx
    .selectFrom('specifications as s')
    .innerJoin('specificationVersions as v', 'v.specificationId', 's.id')
    .select('s.id')
    .where('v.id', '=', versionId)
    .forUpdate()
    .execute();
  const version = (await versionsByIds(tx, [versionId])).get(versionId);
  if (!version) throw notFound();
  unwrap(mayApprove(version, approvedBy));
  if (rowVersion !== undefined && rowVersion !== version.rowVersion) throw stale();
  await tx
    .updateTable('specificationVersions')
    .set((eb) => ({ state: 'approved', approvedBy, approvedAt: now, rowVersion: eb('rowVersion', '+', 1) }))
    .where('id', '=', versionId)
    .execute();
  await tx
    .updateTable('specificationStandings')
    .set((eb) => ({ standing: 'superseded', since: now, rowVersion: eb('rowVersion', '+', 1) }))
    .where('specificationId', '=', version.specificationId)
    .where('standing', '=', 'current')
    .execute();
  await tx
    .insertInto('specificationStandings')
    .values({ versionId, specificationId: version.specificationId, standing: 'current', since: now })
    .execute();
  await makeFindable(tx, version, await cutNodes(tx));
  await emit(tx, now, {
    type: 'specification-approved',
    subjectId: version.specificationId,
    customerId: null,
    payload: { versionId },
  });
}
