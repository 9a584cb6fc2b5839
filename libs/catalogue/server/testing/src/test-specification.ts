import type { SpecificationVersion, VersionContent } from '@seamwright/catalogue/domain';
import { aContent } from '@seamwright/catalogue/domain/testing';
import { inTransaction, type Database } from '@seamwright/shared/server';
import { approveVersion, createSpecification, createVersion, submitVersion, versionsByIds } from '../../src';
import type { TestPeople } from './test-people';

interface Stated {
  readonly now: Date;
  readonly people: TestPeople;
  readonly code: string;
  readonly cutNodeId: string;
  readonly sourceNodeId: string;
  readonly content?: Partial<VersionContent>;
}

/** Writes, submits and approves a specification as the two people; gives its version in force. */
export async function addTestSpecification(database: Database, stated: Stated): Promise<SpecificationVersion> {
  const { now, people, code, cutNodeId, sourceNodeId, content } = stated;
  const versionId = await inTransaction(database, people.author, async (tx) => {
    const specificationId = await createSpecification(tx, { now, code, cutNodeId });
    const written = aContent({ ...content, sourceNodeId });
    const id = await createVersion(tx, { caller: people.author, specificationId, content: written });
    await submitVersion(tx, id);
    return id;
  });
  const version = await inTransaction(database, people.approver, async (tx) => {
    await approveVersion(tx, { now, caller: people.approver, versionId });
    return (await versionsByIds(tx, [versionId])).get(versionId);
  });
  if (!version) throw new Error(`${code} was approved but can't be read`);
  return version;
}
