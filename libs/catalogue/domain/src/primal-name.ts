import type { Species } from './cut-words';

const SPECIES_NAMES: Readonly<Record<Species, string>> = {
  lamb: $localize`:@@catalogue.species.lamb:Lamb`,
  beef: $localize`:@@catalogue.species.beef:Beef`,
  pork: $localize`:@@catalogue.species.pork:Pork`,
};

export const speciesName = (species: Species): string => SPECIES_NAMES[species];

/** "Lamb leg": more than one species has a leg, a loin, and a shoulder, so papers and screens name both. */
export const primalName = (species: Species, name: string): string =>
  $localize`:@@catalogue.primalName:${speciesName(species)}:species: ${name.charAt(0).toLowerCase() + name.slice(1)}:primal:`;
