import type { Implementation } from '@seamwright/shared/server';
import { readingImplementations } from './catalogue.router';
import { draftsImplementations } from './drafts.router';
import { synonymImplementations } from './synonyms.router';
import { uneceImplementations } from './unece.router';

/** What the storey answers without asking another. */
export const catalogueImplementations: readonly Implementation[] = [
  ...draftsImplementations,
  ...readingImplementations,
  ...synonymImplementations,
  ...uneceImplementations,
];
