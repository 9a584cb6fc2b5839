import * as z from 'zod';
import type { PublicSpecification, SpecificationRow, StaffSpecification } from '@seamwright/catalogue/contracts';
import { primalOf, type Species } from '@seamwright/catalogue/domain';
import { notFound, pageFrom, ProblemError, readCursor, type Tx } from '@seamwright/shared/server';
import { cutNodes } from './cut-nodes.repository';
import { presentPublic, presentStaff } from './specification.presenter';
import { currentVersions, namesOf, specificationByCode, versionEntries, versionOf } from './specifications.repository';
import { newestVersions } from './technical-list.repository';
import { uneceFieldValues } from './unece-values.repository';

/** The version in force of a code as a buyer sees it. Refuses with `specification-withdrawn` or `not-found`, both 404. */
export async function readSpecification(tx: Tx, code: string): Promise<PublicSpecification> {
  const specification = await specificationByCode(tx, code);
  if (!specification) throw notFound();
  const version = (await currentVersions(tx, [specification.id])).get(specification.id);
  if (version) return presentPublic(version, await cutNodes(tx));
  const entries = await versionEntries(tx, specification.id);
  if (!entries.some(({ standing }) => standing === 'withdrawn')) throw notFound();
  throw new ProblemError(404, { code: 'specification-withdrawn', params: { code } });
}

/** A version as staff see it: the one asked for, else the one in force, else the newest. */
export async function readStaffSpecification(
  tx: Tx,
  code: string,
  asked?: number | 'newest',
): Promise<StaffSpecification> {
  const specification = await specificationByCode(tx, code);
  if (!specification) throw notFound();
  const entries = await versionEntries(tx, specification.id);
  const inForce = entries.find(({ standing }) => standing === 'current');
  const version = await versionOf(tx, specification.id, asked === 'newest' ? undefined : (asked ?? inForce?.version));
  if (!version) throw notFound();
  const people = [version.authoredBy, ...(version.approvedBy === null ? [] : [version.approvedBy])];
  return presentStaff(version, {
    nodes: await cutNodes(tx),
    entries,
    names: await namesOf(tx, people),
    uneceValues: await uneceFieldValues(tx),
  });
}

/** A page of the technical list. */
export async function listNewestVersions(
  tx: Tx,
  { cursor, limit, q }: { cursor?: string | undefined; limit: number; q?: string | undefined },
): Promise<{ items: SpecificationRow[]; nextCursor: string | null }> {
  const nodes = await cutNodes(tx);
  const after = cursor ? readCursor(cursor, z.tuple([z.string()]))[0] : null;
  const rows = await newestVersions(tx, { q, after, limit: limit + 1 });
  return pageFrom(
    rows,
    limit,
    ({ code }) => [code],
    ({ cutNodeId, since, ...row }) => ({
      ...row,
      species: row.species as Species,
      state: row.state as SpecificationRow['state'],
      standing: row.standing as SpecificationRow['standing'],
      primalName: primalOf(nodes, cutNodeId)?.name ?? null,
      since: since?.toISOString() ?? null,
    }),
  );
}
