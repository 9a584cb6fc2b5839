/** Names that the trade has for a cut of the demo's tree: by its key, the region and what is said there. */
export interface SynonymData {
  readonly cut: string;
  readonly region: string | null;
  readonly terms: readonly string[];
}

const ENGLAND = 'England';
const SCOTLAND = 'Scotland';
const FRANCE = 'France';
const NORTH_AMERICA = 'North America';
const AUSTRALIA = 'Australia';

/** Common names in the trade; none is a brand. */
export const SYNONYMS: readonly SynonymData[] = [
  { cut: 'lamb-leg', region: SCOTLAND, terms: ['Gigot'] },
  { cut: 'lamb-leg', region: FRANCE, terms: ['Gigot d’agneau'] },
  { cut: 'lamb-leg-rump', region: ENGLAND, terms: ['Chump'] },
  { cut: 'lamb-leg-hindshank', region: null, terms: ['Lamb shank'] },
  { cut: 'lamb-loin', region: FRANCE, terms: ['Côtelette'] },
  { cut: 'lamb-rack', region: ENGLAND, terms: ['Best end of neck', 'Cannon'] },
  { cut: 'lamb-rack', region: FRANCE, terms: ['Carré d’agneau'] },
  { cut: 'lamb-shoulder', region: FRANCE, terms: ['Épaule'] },
  { cut: 'beef-striploin', region: ENGLAND, terms: ['Sirloin'] },
  { cut: 'beef-striploin', region: FRANCE, terms: ['Contre-filet', 'Faux-filet'] },
  { cut: 'beef-striploin', region: NORTH_AMERICA, terms: ['New York strip', 'Top loin'] },
  { cut: 'beef-striploin', region: AUSTRALIA, terms: ['Porterhouse'] },
  { cut: 'beef-rib', region: FRANCE, terms: ['Entrecôte', 'Côte de bœuf'] },
  { cut: 'beef-rib', region: NORTH_AMERICA, terms: ['Prime rib'] },
  { cut: 'beef-rib', region: AUSTRALIA, terms: ['Cube roll', 'Scotch fillet'] },
  { cut: 'beef-tenderloin', region: ENGLAND, terms: ['Fillet'] },
  { cut: 'beef-tenderloin', region: FRANCE, terms: ['Filet de bœuf', 'Châteaubriand'] },
  { cut: 'beef-rump', region: NORTH_AMERICA, terms: ['Top sirloin'] },
  { cut: 'beef-rump', region: SCOTLAND, terms: ['Pope’s eye'] },
  { cut: 'beef-topside', region: NORTH_AMERICA, terms: ['Inside round', 'Top round'] },
  { cut: 'beef-topside', region: FRANCE, terms: ['Tende de tranche'] },
  { cut: 'beef-chuck', region: ENGLAND, terms: ['Braising steak'] },
  { cut: 'beef-chuck-short-rib', region: ENGLAND, terms: ['Jacob’s ladder'] },
  { cut: 'beef-brisket', region: FRANCE, terms: ['Poitrine de bœuf'] },
  { cut: 'beef-flank', region: FRANCE, terms: ['Bavette'] },
  { cut: 'beef-flank-mince', region: NORTH_AMERICA, terms: ['Ground beef'] },
  { cut: 'pork-belly', region: null, terms: ['Streaky', 'Side of pork'] },
  { cut: 'pork-belly', region: FRANCE, terms: ['Poitrine de porc'] },
  { cut: 'pork-tenderloin', region: ENGLAND, terms: ['Pork fillet'] },
  { cut: 'pork-tenderloin', region: FRANCE, terms: ['Filet mignon de porc'] },
  { cut: 'pork-leg', region: NORTH_AMERICA, terms: ['Fresh ham'] },
  { cut: 'pork-loin-rack', region: FRANCE, terms: ['Carré de porc'] },
  { cut: 'pork-shoulder', region: NORTH_AMERICA, terms: ['Boston butt'] },
];
