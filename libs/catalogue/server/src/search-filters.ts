import { sql, type RawBuilder } from 'kysely';
import type { AgeingKind, BoneState, FatBand, PackType, Species } from '@seamwright/catalogue/domain';

/** Prices per kg by specification, as two lists of the same length. */
export interface PriceLists {
  readonly ids: readonly string[];
  readonly minor: readonly number[];
}

/** What the catalogue is narrowed to, beside the words. */
export interface SearchFilters {
  readonly species?: Species | undefined;
  readonly primal?: string | undefined;
  readonly node?: string | undefined;
  readonly boneState?: BoneState | undefined;
  readonly fat?: FatBand | undefined;
  readonly portionFrom?: number | undefined;
  readonly portionTo?: number | undefined;
  readonly ageing?: AgeingKind | undefined;
  readonly agedDays?: number | undefined;
  readonly pack?: PackType | undefined;
  /** The source nodes that are in stock. */
  readonly stocked?: readonly string[] | undefined;
  /** What the caller's price has the wanted height for. */
  readonly priced?: readonly string[] | undefined;
}

/** A filter that is on, and can be left out to count what its other values would leave. */
export type FilterName =
  'species' | 'primal' | 'node' | 'boneState' | 'fat' | 'portion' | 'ageing' | 'agedDays' | 'pack' | 'stock' | 'price';

export interface ActiveFilter {
  readonly name: FilterName;
  readonly condition: RawBuilder<unknown>;
}

/** The filters that are on. */
export function activeFilters(filters: SearchFilters): ActiveFilter[] {
  const { species, primal, node, boneState, fat, portionFrom, portionTo, ageing, agedDays, pack } = filters;
  const { stocked, priced } = filters;
  const active: ActiveFilter[] = [];
  const on = (name: FilterName, condition: RawBuilder<unknown>) => active.push({ name, condition });
  if (species) on('species', sql`species = ${species}`);
  if (primal) on('primal', sql`primal_node_id = ${primal}`);
  if (node) on('node', sql`node_ids @> array[${node}]::uuid[]`);
  if (boneState) on('boneState', sql`bone_states @> array[${boneState}]`);
  if (fat) on('fat', sql`fat_bands @> array[${fat}]`);
  if (portionFrom !== undefined || portionTo !== undefined) {
    on('portion', sql`portions && int8range(${portionFrom ?? null}, ${portionTo ?? null}, '[]')`);
  }
  if (ageing) on('ageing', sql`ageing_kind = ${ageing}`);
  if (agedDays !== undefined) on('agedDays', sql`coalesce(ageing_min_days, 0) >= ${agedDays}`);
  if (pack) on('pack', sql`pack_types @> array[${pack}]`);
  if (stocked) on('stock', isStocked(stocked));
  if (priced) on('price', sql`specification_id = any(${priced}::uuid[])`);
  return active;
}

export const isStocked = (stocked: readonly string[]): RawBuilder<unknown> =>
  sql`source_node_id = any(${stocked}::uuid[])`;

/** All of them hold. */
export const allOf = (active: readonly ActiveFilter[]): RawBuilder<unknown> =>
  active.length === 0
    ? sql`true`
    : sql.join(
        active.map(({ condition }) => condition),
        sql` and `,
      );
