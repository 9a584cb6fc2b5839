import { specificationStates, stageOf } from '@seamwright/catalogue/domain';
import { emit, notFound, stale, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import { makeUnfindable } from './search-index.repository';
import { specificationByCode, versionEntries, versionsByIds } from './specifications.repository';

interface Withdrawal {
  readonly now: Date;
  readonly code: string;
  readonly reason: string;
  /** The row version of the standing that was read. */
  readonly rowVersion: number;
}

/**
 * Withdraws the version in force: from now on the specification is neither found nor ordered. Refuses with
 * `move-not-allowed` when nothing of it is in force, `stale` when its standing changed since it was read.
 */
export async function withdrawSpecification(tx: Tx, { now, code, reason, rowVersion }: Withdrawal): Promise<void> {
  const specification = await specificationByCode(tx, code);
  if (!specification) throw notFound();
  const entries = await versionEntries(tx, specification.id);
  const latest = entries.find(({ standing }) => standing === 'current') ?? entries[0];
  const version = latest && (await versionsByIds(tx, [latest.versionId])).get(latest.versionId);
  if (!version) throw notFound();
  unwrap(specificationStates.next(stageOf(version), 'withdraw'));
  const changed = await tx
    .updateTable('specificationStandings')
    .set((eb) => ({ standing: 'withdrawn', since: now, reason, rowVersion: eb('rowVersion', '+', 1) }))
    .where('versionId', '=', version.id)
    .where('standing', '=', 'current')
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  if (changed.numUpdatedRows === 0n) throw stale();
  await makeUnfindable(tx, specification.id);
  await emit(tx, now, {
    type: 'specification-withdrawn',
    subjectId: specification.id,
    customerId: null,
    payload: { versionId: version.id },
  });
}
