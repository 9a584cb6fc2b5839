import {
  faultsOfVersion,
  specificationStates,
  stageOf,
  type Species,
  type VersionContent,
} from '@seamwright/catalogue/domain';
import { notFound, personOf, ProblemError, type Caller, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError, unwrap, type Refusal } from '@seamwright/shared/util';
import { cutNodes } from './cut-nodes.repository';
import { versionsByIds } from './specifications.repository';
import { saidFaults } from './unece.presenter';
import { uneceFieldValues } from './unece-values.repository';
import { contentColumns } from './version-row';

/** Who acts on a version; only a person may. Refuses with `not-allowed`. */
export function actingPerson(caller: Caller): string {
  const personId = personOf(caller);
  if (personId === null) throw new RefusalError({ code: 'not-allowed', params: {} });
  return personId;
}

/** Opens a specification under its code, without a version yet; gives its id. */
export async function createSpecification(
  tx: Tx,
  { now, code, cutNodeId }: { now: Date; code: string; cutNodeId: string },
): Promise<string> {
  const node = (await cutNodes(tx)).get(cutNodeId);
  if (!node) throw notFound();
  const id = newId();
  await tx
    .insertInto('specifications')
    .values({ id, code, species: node.species, cutNodeId, createdAt: now })
    .execute();
  return id;
}

/** Writes the next version of a specification as a draft; gives its id. Refuses faults field by field (422). */
export async function createVersion(
  tx: Tx,
  { caller, specificationId, content }: { caller: Caller; specificationId: string; content: VersionContent },
): Promise<string> {
  const authoredBy = actingPerson(caller);
  const specification = await tx
    .selectFrom('specifications')
    .select('species')
    .where('id', '=', specificationId)
    // Two people who write the next version at once get two numbers.
    .forUpdate()
    .executeTakeFirst();
  if (!specification) throw notFound();
  await refuseFaults(tx, content, specification.species as Species);
  const { last } = await tx
    .selectFrom('specificationVersions')
    .select((eb) => eb.fn.max('version').as('last'))
    .where('specificationId', '=', specificationId)
    .executeTakeFirstOrThrow();
  const id = newId();
  await tx
    .insertInto('specificationVersions')
    .values({
      ...contentColumns(content),
      id,
      specificationId,
      version: (last ?? 0) + 1,
      state: 'draft',
      authoredBy,
    })
    .execute();
  return id;
}

/** Sends a draft to review. */
export async function submitVersion(tx: Tx, versionId: string): Promise<void> {
  const version = (await versionsByIds(tx, [versionId])).get(versionId);
  if (!version) throw notFound();
  unwrap(specificationStates.next(stageOf(version), 'submit'));
  await refuseFaults(tx, version, version.species);
  await tx
    .updateTable('specificationVersions')
    .set((eb) => ({ state: 'in-review', rowVersion: eb('rowVersion', '+', 1) }))
    .where('id', '=', versionId)
    .where('state', '=', 'draft')
    .executeTakeFirstOrThrow();
}

async function refuseFaults(tx: Tx, content: VersionContent, species: Species): Promise<void> {
  const faults = faultsOfVersion(content, { species, values: await uneceFieldValues(tx) });
  if (faults.length > 0) throw refuseAll(faults);
}

/** Faults of a version as one answer, each at its field (422). */
export const refuseAll = (faults: readonly Refusal[]): ProblemError =>
  new ProblemError(422, { code: 'invalid', params: {} }, saidFaults(faults));
