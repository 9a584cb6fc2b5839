import * as z from 'zod';
import {
  AGEING_KINDS,
  BONE_STATES,
  CUT_LEVELS,
  FAT_BANDS,
  PACK_TYPES,
  PORTION_BANDS,
  SPECIES,
} from '@seamwright/catalogue/domain';
import {
  defineEndpoint,
  gramsWire,
  id,
  minor,
  pageOf,
  pageQuery,
  plantDay,
  ROLES,
  type Access,
} from '@seamwright/shared/contracts';
import { specificationCard } from './specification.wire';

/** The catalogue is the same for everybody who is signed in; prices are the caller's own. */
const signedIn: Access = { who: 'roles', roles: ROLES, customer: 'none' };

export const SEARCH_SORTS = ['fit', 'name', 'portion', 'price'] as const;
export type SearchSort = (typeof SEARCH_SORTS)[number];

const count = z.int();
const MOST_GRAMS = 1_000_000;
const MOST_MINOR = 100_000_000;
const weight = z.int().min(0).max(MOST_GRAMS).meta({ description: 'Whole grams' });
const price = z.int().min(0).max(MOST_MINOR).meta({ description: 'Whole minor units per kg' });

/** How many each value of a filter would leave, the other filters kept. */
const counts = z.strictObject({
  species: z.array(z.strictObject({ species: z.enum(SPECIES), count })),
  primals: z.array(z.strictObject({ id, name: z.string(), species: z.enum(SPECIES), count })),
  /** Sub-primals and cuts that have any. */
  nodes: z.array(z.strictObject({ id, name: z.string(), level: z.enum(CUT_LEVELS), count })),
  boneStates: z.array(z.strictObject({ boneState: z.enum(BONE_STATES), count })),
  fatBands: z.array(z.strictObject({ band: z.enum(FAT_BANDS), count })),
  portionBands: z.array(
    z.strictObject({
      band: z.enum(PORTION_BANDS),
      fromGrams: gramsWire.nullable(),
      toGrams: gramsWire.nullable(),
      count,
    }),
  ),
  ageingKinds: z.array(z.strictObject({ kind: z.enum(AGEING_KINDS), count })),
  packTypes: z.array(z.strictObject({ packType: z.enum(PACK_TYPES), count })),
  /** Null unless a day was asked for. */
  inStock: count.nullable(),
  /** What has a price, and from what to what per kg; null unless prices were asked for. */
  prices: z.strictObject({ count, lowestMinor: minor.nullable(), highestMinor: minor.nullable() }).nullable(),
});

export const searchSpecifications = defineEndpoint({
  id: 'catalogue.search',
  summary: 'Finds specifications by words, code and filters, with how many each filter would leave',
  method: 'GET',
  path: '/specifications',
  access: signedIn,
  query: {
    ...pageQuery,
    q: z.string().trim().max(100).optional(),
    species: z.enum(SPECIES).optional(),
    primal: id.optional(),
    node: id.optional().meta({ description: 'Anything of the cut tree: what lies under it is found' }),
    boneState: z.enum(BONE_STATES).optional(),
    fat: z.enum(FAT_BANDS).optional(),
    portionFrom: weight.optional(),
    portionTo: weight.optional(),
    ageing: z.enum(AGEING_KINDS).optional(),
    agedDays: z.int().min(0).max(1_000).optional().meta({ description: 'Aged for at least so many days' }),
    pack: z.enum(PACK_TYPES).optional(),
    inStockOn: plantDay.optional(),
    priceFrom: price.optional(),
    priceTo: price.optional(),
    priceOn: plantDay.optional().meta({ description: 'The delivery day of the prices; today when left out' }),
    sort: z.enum(SEARCH_SORTS).default('fit'),
  },
  response: z.strictObject({ ...pageOf(specificationCard).shape, counts }),
});
