import { sql, type RawBuilder } from 'kysely';
import type { SearchSort } from '@seamwright/catalogue/contracts';
import type { Tx } from '@seamwright/shared/server';
import { activeFilters, allOf, type PriceLists, type SearchFilters } from './search-filters';
import type { UsualOffer } from './search-ports';
import { fits, scoreOf, type SearchWord } from './search-words';

export interface Found {
  readonly specificationId: string;
  readonly code: string;
  /** What it is sorted by, before its code: the fit, the name, the grams of a piece or the price. */
  readonly place: number | string;
}

export interface Wanted {
  readonly words: readonly SearchWord[];
  readonly filters: SearchFilters;
  readonly sort: SearchSort;
  /** For the sort by price: what has none is not found. */
  readonly prices: PriceLists | null;
  readonly after: Pick<Found, 'place' | 'code'> | null;
  readonly limit: number;
}

/** A page of what fits all words and filters, in the order asked, then by code; one more than `limit`. */
export async function findSpecifications(tx: Tx, wanted: Wanted): Promise<Found[]> {
  const { words, filters, sort, prices, after, limit } = wanted;
  const { place, from, type } = orderOf(sort, words, prices);
  const bestFirst = sort === 'fit' && words.length > 0;
  const beyond = after && {
    place: sql`${after.place}::${sql.raw(type)}`,
    later: bestFirst ? sql`<` : sql`>`,
  };
  const { rows } = await sql<Found>`
    with found as (
      select specification_id as "specificationId", code, ${place} as place
      from ${from} where ${fits(words)} and ${allOf(activeFilters(filters))}
    )
    select * from found
    ${beyond ? sql`where place ${beyond.later} ${beyond.place} or (place = ${beyond.place} and code > ${after.code})` : sql``}
    order by ${bestFirst ? sql`place desc, code` : sql`place, code`} limit ${limit + 1}
  `.execute(tx);
  return rows;
}

interface Order {
  readonly place: RawBuilder<unknown>;
  readonly type: 'integer' | 'text' | 'bigint';
  readonly from: RawBuilder<unknown>;
}

function orderOf(sort: SearchSort, words: readonly SearchWord[], prices: PriceLists | null): Order {
  const from = sql`specification_search`;
  if (sort === 'name') return { place: sql`name`, type: 'text', from };
  if (sort === 'portion') return { place: sql`piece_grams`, type: 'bigint', from };
  if (sort === 'price' && prices) return { place: sql`minor`, type: 'bigint', from: pricedSpecifications(prices) };
  return { place: scoreOf(words), type: 'integer', from };
}

const pricedSpecifications = ({ ids, minor }: PriceLists): RawBuilder<unknown> =>
  sql`specification_search join unnest(${ids}::uuid[], ${minor}::bigint[]) as priced (id, minor) on id = specification_id`;

/** What has a price among what fits all words and filters, and from what to what per kg. */
export async function countPriced(
  tx: Tx,
  { words, filters, prices }: { words: readonly SearchWord[]; filters: SearchFilters; prices: PriceLists },
): Promise<{ count: number; lowestMinor: number | null; highestMinor: number | null }> {
  const { rows } = await sql<{ count: number; lowestMinor: number | null; highestMinor: number | null }>`
    select count(*)::int as count, min(minor) as "lowestMinor", max(minor) as "highestMinor"
    from ${pricedSpecifications(prices)} where ${fits(words)} and ${allOf(activeFilters(filters))}
  `.execute(tx);
  return rows[0] ?? { count: 0, lowestMinor: null, highestMinor: null };
}

/** Everything that fits the words, as it is offered when nothing is chosen. */
export async function usualOffers(tx: Tx, words: readonly SearchWord[]): Promise<UsualOffer[]> {
  const { rows } = await sql<UsualOffer>`
    select specification_id as "specificationId", usual_choice_key as "usualChoiceKey",
      usual_price_change_minor as "usualPriceChangeMinorPerKg", piece_grams as "pieceGrams",
      pieces_per_case as "piecesPerCase"
    from specification_search where ${fits(words)}
  `.execute(tx);
  return rows;
}
