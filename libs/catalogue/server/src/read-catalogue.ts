import * as z from 'zod';
import type { Answer, CheckedInput } from '@seamwright/shared/contracts';
import type {
  PublicSpecification,
  SpecificationRow,
  StaffSpecification,
  searchSpecifications,
} from '@seamwright/catalogue/contracts';
import { primalOf, type BoneState, type CutNode, type Species } from '@seamwright/catalogue/domain';
import { notFound, pageFrom, ProblemError, readCursor, type Tx } from '@seamwright/shared/server';
import { cutNodes } from './cut-nodes.repository';
import { countByFilter, findSpecifications, type FilterCount } from './search.repository';
import { presentCard, presentPublic, presentStaff } from './specification.presenter';
import { currentVersions, namesOf, specificationByCode, versionEntries, versionOf } from './specifications.repository';
import { newestVersions } from './technical-list.repository';

type Query = CheckedInput<typeof searchSpecifications>['query'];
type SearchAnswer = Answer<typeof searchSpecifications>;

/** A page of the catalogue with the counts beside its filters. */
export async function searchCatalogue(tx: Tx, { cursor, limit, ...filters }: Query): Promise<SearchAnswer> {
  const nodes = await cutNodes(tx);
  const found = await findSpecifications(tx, filters, { limit, after: cursor ? placeOf(cursor) : null });
  const versions = await currentVersions(
    tx,
    found.map(({ specificationId }) => specificationId),
  );
  const page = pageFrom(
    found,
    limit,
    ({ score, code }) => [score, code],
    ({ specificationId }) => {
      const version = versions.get(specificationId);
      if (!version) throw new Error(`${specificationId} can be found but has no version in force`);
      return presentCard(version, nodes);
    },
  );
  return { ...page, counts: countsOf(await countByFilter(tx, filters), nodes) };
}

function placeOf(cursor: string): { score: number; code: string } {
  const [score, code] = readCursor(cursor, z.tuple([z.int(), z.string()]));
  return { score, code };
}

function countsOf(counts: readonly FilterCount[], nodes: ReadonlyMap<string, CutNode>): SearchAnswer['counts'] {
  const byFilter = (filter: FilterCount['filter']) =>
    new Map(counts.filter((each) => each.filter === filter).map(({ value, count }) => [value, count]));
  const [species, primals, boneStates] = [byFilter('species'), byFilter('primal'), byFilter('boneState')];
  return {
    species: [...nodes.values()]
      .filter(({ level }) => level === 'species')
      .map((node) => ({ species: node.species, count: species.get(node.species) ?? 0 })),
    primals: [...nodes.values()]
      .filter(({ id }) => primals.has(id))
      .map(({ id, name, species: of }) => ({ id, name, species: of, count: primals.get(id) ?? 0 })),
    boneStates: [...boneStates].sort().map(([boneState, count]) => ({ boneState: boneState as BoneState, count })),
  };
}

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
export async function readStaffSpecification(tx: Tx, code: string, asked?: number): Promise<StaffSpecification> {
  const specification = await specificationByCode(tx, code);
  if (!specification) throw notFound();
  const entries = await versionEntries(tx, specification.id);
  const inForce = entries.find(({ standing }) => standing === 'current');
  const version = await versionOf(tx, specification.id, asked ?? inForce?.version);
  if (!version) throw notFound();
  const people = [version.authoredBy, ...(version.approvedBy === null ? [] : [version.approvedBy])];
  return presentStaff(version, { nodes: await cutNodes(tx), entries, names: await namesOf(tx, people) });
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
