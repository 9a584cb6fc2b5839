import type { Species } from '../cut-words';
import { BEEF_SIDE } from './beef-side';
import { LAMB_SIDE } from './lamb-side';
import { planarMap, type PlanarMap } from './planar-map';
import { PORK_SIDE } from './pork-side';

const MAPS: Readonly<Record<Species, PlanarMap>> = {
  lamb: planarMap(LAMB_SIDE),
  beef: planarMap(BEEF_SIDE),
  pork: planarMap(PORK_SIDE),
};

/** The side of a carcase with its regions; their keys are the `region` of the cut tree's nodes. */
export const carcaseMap = (species: Species): PlanarMap => MAPS[species];

/** The keys of a side's regions, head end first. */
export const regionsOf = (species: Species): string[] => MAPS[species].regions.map(({ key }) => key);
