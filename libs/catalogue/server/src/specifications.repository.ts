import type { SpecificationVersion } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';
import { toVersion } from './version-row';

export interface SpecificationIdentity {
  readonly id: string;
  readonly code: string;
  readonly species: string;
  readonly cutNodeId: string;
}

const versions = (tx: Tx) =>
  tx
    .selectFrom('specificationVersions as v')
    .innerJoin('specifications as s', 's.id', 'v.specificationId')
    // By both: the index of what is in force knows the specification only.
    .leftJoin('specificationStandings as st', (join) =>
      join.onRef('st.versionId', '=', 'v.id').onRef('st.specificationId', '=', 'v.specificationId'),
    )
    .selectAll('v')
    .select(['s.code', 's.species', 's.cutNodeId', 'st.standing']);

/** Versions in force by specification id. A withdrawn or absent specification is simply missing. */
export async function currentVersions(
  tx: Tx,
  specificationIds: readonly string[],
): Promise<Map<string, SpecificationVersion>> {
  if (specificationIds.length === 0) return new Map();
  const rows = await versions(tx)
    .where('v.specificationId', 'in', specificationIds)
    .where('st.standing', '=', 'current')
    .execute();
  return new Map(rows.map((row) => [row.specificationId, toVersion(row)]));
}

/** Which piece the specifications in force are cut from and which place they have themselves, each pair once. */
export function placesCut(tx: Tx): Promise<{ sourceNodeId: string; cutNodeId: string }[]> {
  return tx
    .selectFrom('specificationVersions as v')
    .innerJoin('specifications as s', 's.id', 'v.specificationId')
    .innerJoin('specificationStandings as st', 'st.versionId', 'v.id')
    .select(['v.sourceNodeId', 's.cutNodeId'])
    .distinct()
    .where('st.standing', '=', 'current')
    .execute();
}

export interface NamedSpecification {
  readonly specificationId: string;
  readonly code: string;
  readonly name: string;
}

/** Specifications in force that are cut from one of these pieces, by code. */
export async function specificationsCutFrom(tx: Tx, nodeIds: readonly string[]): Promise<NamedSpecification[]> {
  if (nodeIds.length === 0) return [];
  return tx
    .selectFrom('specificationVersions as v')
    .innerJoin('specifications as s', 's.id', 'v.specificationId')
    .innerJoin('specificationStandings as st', 'st.versionId', 'v.id')
    .select(['v.specificationId', 's.code', 'v.name'])
    .where('st.standing', '=', 'current')
    .where('v.sourceNodeId', 'in', nodeIds)
    .orderBy('s.code')
    .execute();
}

/** Versions in force by code. A withdrawn or absent specification is simply missing. */
export async function specificationsByCodes(
  tx: Tx,
  codes: readonly string[],
): Promise<Map<string, SpecificationVersion>> {
  if (codes.length === 0) return new Map();
  const rows = await versions(tx).where('s.code', 'in', codes).where('st.standing', '=', 'current').execute();
  return new Map(rows.map((row) => [row.code, toVersion(row)]));
}

/** Versions by their own ids, wherever they stand. */
export async function versionsByIds(tx: Tx, versionIds: readonly string[]): Promise<Map<string, SpecificationVersion>> {
  if (versionIds.length === 0) return new Map();
  const rows = await versions(tx).where('v.id', 'in', versionIds).execute();
  return new Map(rows.map((row) => [row.id, toVersion(row)]));
}

/** The specification of a code, whether or not it is offered. */
export function specificationByCode(tx: Tx, code: string): Promise<SpecificationIdentity | undefined> {
  return tx
    .selectFrom('specifications')
    .select(['id', 'code', 'species', 'cutNodeId'])
    .where('code', '=', code)
    .executeTakeFirst();
}

/** One version of a specification: the one asked for, else the newest. */
export async function versionOf(
  tx: Tx,
  specificationId: string,
  version?: number,
): Promise<SpecificationVersion | undefined> {
  let query = versions(tx).where('v.specificationId', '=', specificationId);
  if (version !== undefined) query = query.where('v.version', '=', version);
  const row = await query.orderBy('v.version', 'desc').limit(1).executeTakeFirst();
  return row && toVersion(row);
}

export interface VersionEntry {
  readonly versionId: string;
  readonly version: number;
  readonly state: string;
  readonly standing: string | null;
  readonly since: Date | null;
  readonly reason: string | null;
  readonly standingRowVersion: number | null;
}

/** All versions of a specification with where they stand, newest first. */
export function versionEntries(tx: Tx, specificationId: string): Promise<VersionEntry[]> {
  return tx
    .selectFrom('specificationVersions as v')
    .leftJoin('specificationStandings as st', 'st.versionId', 'v.id')
    .select([
      'v.id as versionId',
      'v.version',
      'v.state',
      'st.standing',
      'st.since',
      'st.reason',
      'st.rowVersion as standingRowVersion',
    ])
    .where('v.specificationId', '=', specificationId)
    .orderBy('v.version', 'desc')
    .execute();
}

/** Names of people by id; those that the caller may not see are missing. */
export async function namesOf(tx: Tx, personIds: readonly string[]): Promise<Map<string, string>> {
  if (personIds.length === 0) return new Map();
  const rows = await tx.selectFrom('people').select(['id', 'name']).where('id', 'in', personIds).execute();
  return new Map(rows.map(({ id, name }) => [id, name]));
}
