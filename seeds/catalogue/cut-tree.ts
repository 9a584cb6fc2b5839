import type { CutLevel, Species } from '@seamwright/catalogue/domain';

/** A node of the demo's cut tree. `key` is its name among the seeds; `unece` is [item number, seen in the standard]. */
export interface CutTreeData {
  readonly key: string;
  readonly parent: string | null;
  readonly species: Species;
  readonly level: CutLevel;
  readonly name: string;
  readonly unece: readonly [item: string, seen: boolean] | null;
  readonly region: string | null;
}

type Unece = CutTreeData['unece'];

const fromMemory = (item: string): Unece => [item, false];
const seen = (item: string): Unece => [item, true];

function speciesTree(species: Species, name: string, primals: readonly CutTreeData[][]): CutTreeData[] {
  const top: CutTreeData = { key: species, parent: null, species, level: 'species', name, unece: null, region: null };
  return [top, ...primals.flat()];
}

/** A primal and the cuts made of it. The primal is a region of the carcase diagram of its own. */
const primalOf =
  (species: Species) =>
  (
    key: string,
    name: string,
    unece: Unece,
    cuts: readonly [key: string, name: string, unece?: Unece][],
  ): CutTreeData[] => [
    { key: `${species}-${key}`, parent: species, species, level: 'primal', name, unece, region: key },
    ...cuts.map(([cut, cutName, cutUnece]): CutTreeData => ({
      key: `${species}-${key}-${cut}`,
      parent: `${species}-${key}`,
      species,
      level: 'cut',
      name: cutName,
      unece: cutUnece ?? null,
      region: key,
    })),
  ];

const lamb = primalOf('lamb');
const beef = primalOf('beef');
const pork = primalOf('pork');

/** Parents stand before their children. Item numbers "from memory" were not read in the standard itself. */
export const CUT_TREE: readonly CutTreeData[] = [
  ...speciesTree('lamb', 'Lamb', [
    lamb('leg', 'Leg', fromMemory('4800'), [
      ['bone-in', 'Leg, bone-in', fromMemory('4800')],
      ['boneless', 'Leg, boneless', fromMemory('5060')],
      ['rump', 'Rump'],
      ['hindshank', 'Hindshank', fromMemory('5031')],
    ]),
    lamb('loin', 'Loin', fromMemory('4880'), [['chop', 'Loin chop']]),
    lamb('rack', 'Rack', null, [['french', 'Rack, French-trimmed']]),
    lamb('shoulder', 'Shoulder', fromMemory('4990'), [
      ['square', 'Square-cut shoulder', fromMemory('4990')],
      ['rolled', 'Shoulder, boned and rolled'],
      ['dice', 'Diced shoulder'],
    ]),
    lamb('breast', 'Breast, shank and neck', null, []),
  ]),
  ...speciesTree('beef', 'Beef', [
    beef('striploin', 'Striploin', seen('2140'), [['steak', 'Striploin steak', seen('2140')]]),
    beef('rib', 'Fore rib', seen('1604'), [['eye-steak', 'Rib-eye steak', fromMemory('2240')]]),
    beef('tenderloin', 'Tenderloin', seen('2150'), [['fillet-steak', 'Fillet steak', seen('2160')]]),
    beef('rump', 'Rump', seen('2090'), [['steak', 'Rump steak', seen('2090')]]),
    beef('topside', 'Topside', seen('2000'), [['joint', 'Topside joint', seen('2011')]]),
    beef('chuck', 'Chuck', fromMemory('2275'), [
      ['dice', 'Diced chuck'],
      ['short-rib', 'Short ribs', seen('1694')],
    ]),
    beef('brisket', 'Brisket', fromMemory('2323'), [['rolled', 'Brisket, boned and rolled']]),
    beef('flank', 'Thin flank', fromMemory('2200'), [['mince', 'Mince']]),
    // What a side is broken into before the cuts above come of it.
    beef('short-loin', 'Short loin', null, []),
    beef('round', 'Round', null, []),
    beef('plate', 'Short plate', null, []),
    beef('shin', 'Shin', null, []),
  ]),
  ...speciesTree('pork', 'Pork', [
    pork('belly', 'Belly', fromMemory('4079'), [['boneless', 'Belly, boneless']]),
    pork('loin', 'Loin', fromMemory('4140'), [
      ['steak', 'Loin steak'],
      ['rack', 'Loin rack'],
    ]),
    pork('tenderloin', 'Tenderloin', fromMemory('4280'), [['whole', 'Tenderloin, whole', fromMemory('4280')]]),
    pork('leg', 'Leg', fromMemory('4016'), [['rolled', 'Leg, boned and rolled']]),
    pork('shoulder', 'Shoulder', null, [['rolled', 'Shoulder, boned and rolled']]),
  ]),
];
