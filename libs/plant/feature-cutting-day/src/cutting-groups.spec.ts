import { somePapers } from '@seamwright/plant/data-access/testing';
import { cuttingGroups } from './cutting-groups';

const [striploin] = somePapers().cutting.primals;
if (!striploin) throw new Error('The papers hold one primal');
const of = (species: 'lamb' | 'beef', name: string, pieces: number): typeof striploin => ({
  ...striploin,
  primal: { id: `${species} ${name}`, name, species },
  totals: { ...striploin.totals, pieces, outGrams: 1_000 * pieces, inGrams: 1_250 * pieces, seconds: 61 * pieces },
});

describe('the cutting list by species', () => {
  it('keeps the order of the list and adds up what belongs together', () => {
    const groups = cuttingGroups([of('lamb', 'Leg', 2), of('beef', 'Rump', 5), of('lamb', 'Loin', 3)]);
    expect(groups.map(({ species, primals }) => [species, ...primals.map(({ primal }) => primal.name)])).toEqual([
      ['lamb', 'Leg', 'Loin'],
      ['beef', 'Rump'],
    ]);
    expect(groups[0]?.totals).toEqual({ pieces: 5, outGrams: 5_000, inGrams: 6_250, seconds: 305 });
  });

  it('is nothing for an empty list', () => {
    expect(cuttingGroups([])).toEqual([]);
  });
});
