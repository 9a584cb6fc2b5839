import type { Migration } from '../migration';
import { callers } from './0001_callers';
import { kernel } from './0002_kernel';
import { identity } from './0003_identity';
import { catalogue } from './0004_catalogue';
import { pricing } from './0005_pricing';
import { stock } from './0006_stock';
import { ordering } from './0007_ordering';
import { plant } from './0008_plant';
import { accounts } from './0009_accounts';
import { yields } from './0010_yields';
import { search } from './0011_search';
import { unece } from './0012_unece';
import { specificationDrafts } from './0013_specification_drafts';

/** Every step of the schema in order: a static list, since a bundle has no folder to read. */
export const MIGRATIONS: readonly Migration[] = [
  callers,
  kernel,
  identity,
  catalogue,
  pricing,
  stock,
  ordering,
  plant,
  accounts,
  yields,
  search,
  unece,
  specificationDrafts,
];
