import type { Implementation } from '@seamwright/shared/server';
import { readingImplementations } from './catalogue.router';
import { draftsImplementations } from './drafts.router';

/** Everything that the storey answers. */
export const catalogueImplementations: readonly Implementation[] = [
  ...draftsImplementations,
  ...readingImplementations,
];
