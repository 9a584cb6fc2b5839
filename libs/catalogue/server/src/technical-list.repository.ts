import { sql } from 'kysely';
import type { Tx } from '@seamwright/shared/server';

export interface NewestVersion {
  readonly specificationId: string;
  readonly code: string;
  readonly name: string;
  readonly species: string;
  readonly cutNodeId: string;
  readonly version: number;
  readonly state: string;
  readonly standing: string | null;
  readonly since: Date | null;
}

/** The newest version of each specification by code, from the code after `after` on. */
export function newestVersions(
  tx: Tx,
  { q, after, limit }: { q: string | undefined; after: string | null; limit: number },
): Promise<NewestVersion[]> {
  let query = tx
    .selectFrom('specifications as s')
    .innerJoinLateral(
      (eb) =>
        eb
          .selectFrom('specificationVersions as sv')
          .select(['sv.id', 'sv.name', 'sv.version', 'sv.state'])
          .whereRef('sv.specificationId', '=', 's.id')
          .orderBy('sv.version', 'desc')
          .limit(1)
          .as('v'),
      (join) => join.onTrue(),
    )
    .leftJoin('specificationStandings as st', 'st.versionId', 'v.id')
    .select([
      's.id as specificationId',
      's.code',
      'v.name',
      's.species',
      's.cutNodeId',
      'v.version',
      'v.state',
      'st.standing',
      'st.since',
    ]);
  if (after !== null) query = query.where('s.code', '>', after);
  if (q) {
    const part = `%${q.replace(/[\\%_]/g, '\\$&')}%`;
    query = query.where(sql<boolean>`(s.code ilike ${part} or v.name ilike ${part})`);
  }
  return query.orderBy('s.code').limit(limit).execute();
}
