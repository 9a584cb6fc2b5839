import { sql, type RawBuilder } from 'kysely';
import type { Tx } from '@seamwright/shared/server';
import { activeFilters, isStocked, type FilterName, type SearchFilters } from './search-filters';
import { fits, type SearchWord } from './search-words';

/** The filters whose values are counted, each with its column of the marked rows. */
const COUNTED = [
  ['species', 'species'],
  ['primal', 'primal_node_id'],
  ['node', 'cut_node_id'],
  ['boneState', 'bone_states'],
  ['fat', 'fat_bands'],
  ['portion', 'portion_bands'],
  ['ageing', 'ageing_kind'],
  ['pack', 'pack_types'],
  ['stock', 'stocked'],
] as const satisfies readonly (readonly [FilterName, string])[];
export type CountedFilter = (typeof COUNTED)[number][0];

/** How many there are of each value of a filter, the other filters kept. */
export type FilterCounts = ReadonlyMap<CountedFilter, ReadonlyMap<string, number>>;

interface CountRow {
  /** One bit for each filter that is on and does not hold; never more than one. */
  readonly fails: number;
  /** Which of the counted columns the row is of, from 0. */
  readonly at: number;
  /** A list where a specification can be had as several. */
  readonly value: string | boolean | readonly string[] | null;
  readonly count: number;
}

/**
 * Counts in one pass over what fits the words: first how many there are of each kind of row, then which filters a kind misses. One
 * that misses a single filter counts for that filter's other values, one that misses none for all, any other for nothing.
 */
export async function countByFilter(
  tx: Tx,
  { words, filters }: { words: readonly SearchWord[]; filters: SearchFilters },
): Promise<FilterCounts> {
  const active = activeFilters(filters);
  const bits = new Map(active.map(({ name }, at) => [name, 1 << at]));
  const price = active.find(({ name }) => name === 'price')?.condition ?? sql`true`;
  const misses = active.map(({ name, condition }, at) => {
    const holds = name === 'price' ? sql`priced` : condition;
    return sql`case when ${holds} then 0 else ${sql.lit(1 << at)} end`;
  });
  const fails = misses.length === 0 ? sql`0` : sql.join(misses, sql` + `);
  const sets = COUNTED.map(([, column]) => sql`(fails, ${sql.raw(column)})`);
  // The bits of grouping() say which columns a row is not of.
  const ofColumn = (place: number) => sql.lit(all - (1 << (COUNTED.length - 1 - place)));
  const whens = (then: (place: number, column: string) => RawBuilder<unknown>) =>
    sql.join(
      COUNTED.map(([, column], place) => sql`when ${ofColumn(place)} then ${then(place, column)}`),
      sql` `,
    );
  const grouped = sql`grouping(${sql.join(COUNTED.map(([, column]) => sql.raw(column)))})`;
  const { rows } = await sql<CountRow>`
    with counted as materialized (
      select kind, ${price} as priced, count(*) as many, min(code) as code
      from specification_search where ${fits(words)} group by kind, priced
    ), kinds as (
      select one.*, priced, many from counted join specification_search as one on one.code = counted.code
    ), marked as materialized (
      select species, primal_node_id, cut_node_id, bone_states, fat_bands, portion_bands, ageing_kind, pack_types, many,
        ${filters.stocked ? isStocked(filters.stocked) : sql`false`} as stocked, ${fails} as fails from kinds
    )
    select fails, case ${grouped} ${whens((place) => sql.lit(place))} end as at,
      case ${grouped} ${whens((_, column) => sql`to_jsonb(${sql.raw(column)})`)} end as value, sum(many)::int as count
    from marked where fails in (${sql.join([0, ...bits.values()].map((bit) => sql.lit(bit)))})
    group by grouping sets (${sql.join(sets)})
  `.execute(tx);
  return added(rows, bits);
}

const all = (1 << COUNTED.length) - 1;

function added(rows: readonly CountRow[], bits: ReadonlyMap<FilterName, number>): FilterCounts {
  const counts = new Map<CountedFilter, Map<string, number>>(COUNTED.map(([name]) => [name, new Map()]));
  for (const { fails, at, value, count } of rows) {
    const name = COUNTED[at]?.[0];
    const own = name && counts.get(name);
    if (!own || value === null || (fails !== 0 && fails !== bits.get(name))) continue;
    for (const each of Array.isArray(value) ? (value as readonly string[]) : [String(value)]) {
      own.set(each, (own.get(each) ?? 0) + count);
    }
  }
  return counts;
}
