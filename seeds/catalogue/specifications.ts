import { BEEF } from './beef';
import { LAMB } from './lamb';
import { PORK } from './pork';
import type { SpecificationData } from './specification-data';

/** The demo's 24 specifications: lamb 9, beef 9, pork 6. */
export const SPECIFICATIONS: readonly SpecificationData[] = [...LAMB, ...BEEF, ...PORK];
