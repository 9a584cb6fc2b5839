import * as z from 'zod';
import type { searchSpecifications, SearchSort } from '@seamwright/catalogue/contracts';
import {
  AGEING_KINDS,
  BONE_STATES,
  FAT_BANDS,
  PACK_TYPES,
  pathTo,
  PORTION_BANDS,
  portionBandGrams,
  type CutNode,
} from '@seamwright/catalogue/domain';
import type { Answer, CheckedInput } from '@seamwright/shared/contracts';
import { pageFrom, readCursor, type Caller, type Tx } from '@seamwright/shared/server';
import { plantToday, RefusalError, type PlantDate } from '@seamwright/shared/util';
import { cutNodes } from './cut-nodes.repository';
import { countByFilter, type CountedFilter, type FilterCounts } from './search-counts.repository';
import type { PriceLists, SearchFilters } from './search-filters';
import type { PricePort, StockPort } from './search-ports';
import { countPriced, findSpecifications, usualOffers, type Found } from './search.repository';
import { searchWords, type SearchWord } from './search-words';
import { presentCard } from './specification.presenter';
import { currentVersions } from './specifications.repository';

type Query = CheckedInput<typeof searchSpecifications>['query'];
type SearchAnswer = Answer<typeof searchSpecifications>;
type Counts = SearchAnswer['counts'];

/** What the search is furnished with by the composition root. */
export interface SearchParts {
  readonly stock: StockPort;
  readonly prices: PricePort;
  /** The plant's time zone, an IANA name. */
  readonly timeZone: string;
}

interface Asking {
  readonly now: Date;
  readonly caller: Caller;
  readonly query: Query;
}

/**
 * A page of the catalogue with the counts beside its filters. Refuses with `search-range` where a range ends before it
 * begins, and with `search-price-customer` where somebody without a customer asks for prices.
 */
export async function searchCatalogue(
  tx: Tx,
  parts: SearchParts,
  { now, caller, query }: Asking,
): Promise<SearchAnswer> {
  refuseRange(query.portionFrom, query.portionTo, '/portionTo');
  refuseRange(query.priceFrom, query.priceTo, '/priceTo');
  const { cursor, limit, sort } = query;
  const nodes = await cutNodes(tx);
  const words = await searchWords(tx, query.q);
  const day = (query.priceOn as PlantDate | undefined) ?? plantToday(now, parts.timeZone);
  const prices = asksForPrices(query) ? await pricesFor(tx, parts.prices, { caller, words, day }) : null;
  const filters = await filtersOf(tx, parts.stock, query, prices);
  const after = cursor ? placeOf(cursor, sort) : null;
  const found = await findSpecifications(tx, { words, filters, sort, prices, after, limit });
  const versions = await currentVersions(
    tx,
    found.map(({ specificationId }) => specificationId),
  );
  const page = pageFrom(
    found,
    limit,
    ({ place, code }) => [sort, place, code],
    ({ specificationId }) => {
      const version = versions.get(specificationId);
      if (!version) throw new Error(`${specificationId} can be found but has no version in force`);
      return presentCard(version, nodes);
    },
  );
  const counted = await countByFilter(tx, { words, filters });
  const priced = prices && (await countPriced(tx, { words, filters: { ...filters, priced: undefined }, prices }));
  return { ...page, counts: { ...presentCounts(counted, nodes, filters), prices: priced } };
}

function refuseRange(from: number | undefined, to: number | undefined, pointer: string): void {
  if (from !== undefined && to !== undefined && from > to) {
    throw new RefusalError({ code: 'search-range', params: {}, pointer });
  }
}

/** A cursor goes on only with the order that it was written for. */
function placeOf(cursor: string, sort: SearchSort): Pick<Found, 'place' | 'code'> {
  const value = sort === 'name' ? z.string() : z.int().min(-1e9).max(1e12);
  const [, place, code] = readCursor(cursor, z.tuple([z.literal(sort), value, z.string()]));
  return { place, code };
}

const asksForPrices = ({ priceFrom, priceTo, sort }: Query): boolean =>
  priceFrom !== undefined || priceTo !== undefined || sort === 'price';

async function pricesFor(
  tx: Tx,
  port: PricePort,
  { caller, words, day }: { caller: Caller; words: readonly SearchWord[]; day: PlantDate },
): Promise<PriceLists> {
  if (caller.kind !== 'user') throw new RefusalError({ code: 'search-price-customer', params: {} });
  const prices = await port.pricesPerKg(tx, caller.customerId, day, await usualOffers(tx, words));
  return { ids: [...prices.keys()], minor: [...prices.values()] };
}

async function filtersOf(tx: Tx, stock: StockPort, query: Query, prices: PriceLists | null): Promise<SearchFilters> {
  const { species, primal, node, boneState, fat, portionFrom, portionTo, ageing, agedDays, pack } = query;
  const { inStockOn, priceFrom, priceTo } = query;
  const inRange = (minor: number): boolean => minor >= (priceFrom ?? 0) && minor <= (priceTo ?? Infinity);
  return {
    ...{ species, primal, node, boneState, fat, portionFrom, portionTo, ageing, agedDays, pack },
    stocked: inStockOn === undefined ? undefined : await stock.nodesInStock(tx, inStockOn as PlantDate),
    priced: prices?.ids.filter((_, at) => inRange(prices.minor[at] ?? NaN)),
  };
}

/** What lies under a node counts for it as well. */
function countsOfNodes(own: ReadonlyMap<string, number>, nodes: ReadonlyMap<string, CutNode>): Map<string, number> {
  const counts = new Map<string, number>();
  for (const [cutId, count] of own) {
    for (const { id } of pathTo(nodes, cutId)) counts.set(id, (counts.get(id) ?? 0) + count);
  }
  return counts;
}

function presentCounts(
  counted: FilterCounts,
  nodes: ReadonlyMap<string, CutNode>,
  { stocked }: SearchFilters,
): Omit<Counts, 'prices'> {
  const of = (filter: CountedFilter, value: string): number => counted.get(filter)?.get(value) ?? 0;
  const ofEach = <T extends string>(filter: CountedFilter, values: readonly T[]): { value: T; count: number }[] =>
    values.map((value) => ({ value, count: of(filter, value) })).filter(({ count }) => count > 0);
  const tree = [...nodes.values()];
  const byNode = countsOfNodes(counted.get('node') ?? new Map(), nodes);
  return {
    species: tree
      .filter(({ level }) => level === 'species')
      .map(({ species }) => ({ species, count: of('species', species) })),
    primals: tree
      .filter(({ id }) => of('primal', id) > 0)
      .map(({ id, name, species }) => ({ id, name, species, count: of('primal', id) })),
    nodes: tree
      .filter(({ id, level }) => (level === 'sub-primal' || level === 'cut') && byNode.has(id))
      .map(({ id, name, level }) => ({ id, name, level, count: byNode.get(id) ?? 0 })),
    boneStates: ofEach('boneState', BONE_STATES).map(({ value, count }) => ({ boneState: value, count })),
    fatBands: ofEach('fat', FAT_BANDS).map(({ value, count }) => ({ band: value, count })),
    portionBands: ofEach('portion', PORTION_BANDS).map(({ value, count }) => {
      const { from, to } = portionBandGrams(value);
      return { band: value, fromGrams: from, toGrams: to, count };
    }),
    ageingKinds: ofEach('ageing', AGEING_KINDS).map(({ value, count }) => ({ kind: value, count })),
    packTypes: ofEach('pack', PACK_TYPES).map(({ value, count }) => ({ packType: value, count })),
    inStock: stocked ? of('stock', 'true') : null,
  };
}
