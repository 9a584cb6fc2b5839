import { sql, type RawBuilder } from 'kysely';
import type { BoneState, Species } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

export interface SearchFilters {
  readonly q?: string | undefined;
  readonly species?: Species | undefined;
  readonly primal?: string | undefined;
  readonly boneState?: BoneState | undefined;
}

export interface Found {
  readonly specificationId: string;
  readonly code: string;
  /** How well the words fit; higher comes first. */
  readonly score: number;
}

const MOST_WORDS = 8;
/** How alike a word must be to count as mistyped; "shuolder" is like "shoulder" by 0.385, two letters changed over. */
const ALIKE = '0.38';

const wordsOf = (q = ''): string[] => q.split(/\s+/).filter(Boolean).slice(0, MOST_WORDS);
const contains = (word: string): string => `%${word.replace(/[\\%_]/g, '\\$&')}%`;

/** A page of what fits all words and filters, best first, then by code. */
export async function findSpecifications(
  tx: Tx,
  filters: SearchFilters,
  { limit, after }: { limit: number; after: Pick<Found, 'score' | 'code'> | null },
): Promise<Found[]> {
  await forgiveMistakes(tx, filters);
  const words = wordsOf(filters.q);
  const from = after ? sql`where score < ${after.score} or (score = ${after.score} and code > ${after.code})` : sql``;
  const { rows } = await sql<Found>`
    with found as (
      select specification_id as "specificationId", code, ${scoreOf(words)} as score
      from specification_search
      where ${fits(words)} and ${inSpecies(filters)} and ${inPrimal(filters)} and ${inBoneState(filters)}
    )
    select * from found ${from} order by score desc, code limit ${limit + 1}
  `.execute(tx);
  return rows;
}

export interface FilterCount {
  readonly filter: 'species' | 'primal' | 'boneState';
  readonly value: string;
  readonly count: number;
}

/** How many specifications each value of a filter would leave, the other filters kept. */
export async function countByFilter(tx: Tx, filters: SearchFilters): Promise<FilterCount[]> {
  await forgiveMistakes(tx, filters);
  const { rows } = await sql<FilterCount>`
    with found as materialized (
      select species, primal_node_id, bone_state from specification_search where ${fits(wordsOf(filters.q))}
    )
    select 'species' as filter, species as value, count(*)::int as count
      from found where ${inPrimal(filters)} and ${inBoneState(filters)} group by species
    union all
    select 'primal', primal_node_id::text, count(*)::int
      from found where primal_node_id is not null and ${inSpecies(filters)} and ${inBoneState(filters)} group by primal_node_id
    union all
    select 'boneState', bone_state, count(*)::int
      from found where ${inSpecies(filters)} and ${inPrimal(filters)} group by bone_state
  `.execute(tx);
  return rows;
}

/** The operator that the trigram index serves reads its limit from a setting, kept to this transaction. */
async function forgiveMistakes(tx: Tx, { q }: SearchFilters): Promise<void> {
  if (!q) return;
  await sql`select set_config('pg_trgm.word_similarity_threshold', ${ALIKE}, true)`.execute(tx);
}

type Condition = RawBuilder<unknown>;

const always: Condition = sql`true`;
const inSpecies = ({ species }: SearchFilters): Condition => (species ? sql`species = ${species}` : always);
const inPrimal = ({ primal }: SearchFilters): Condition => (primal ? sql`primal_node_id = ${primal}` : always);
const inBoneState = ({ boneState }: SearchFilters): Condition => (boneState ? sql`bone_state = ${boneState}` : always);

/** Every word stands in the text, whole, in part or nearly. */
function fits(words: readonly string[]): Condition {
  if (words.length === 0) return always;
  return sql.join(
    words.map((word) => sql`(words ilike ${contains(word)} or ${word}::text <% words)`),
    sql` and `,
  );
}

/** Whole numbers, so that a page's end can be written into its cursor: code before name before anything else. */
function scoreOf(words: readonly string[]): RawBuilder<number> {
  if (words.length === 0) return sql<number>`0`;
  const each = words.map(
    (word) => sql`(
      case when code ilike ${contains(word)} then 4000 when name ilike ${contains(word)} then 2000 else 0 end
      + round(word_similarity(${word}, name) * 1000)::int + round(word_similarity(${word}, words) * 300)::int
    )`,
  );
  return sql<number>`(${sql.join(each, sql` + `)})`;
}
