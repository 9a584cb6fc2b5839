import { formatPercent, ppm } from '@seamwright/shared/util';
import type { CutNode } from '../cut-node';
import { faultsOfScheme } from './check-scheme';
import { schemeLossPpm, type SchemeContent, type SchemeOutput } from './cutting-scheme';
import { recipeShares } from './recipe-shares';

const node = (id: string, species: CutNode['species'] = 'lamb'): [string, CutNode] => [
  id,
  {
    id,
    parentId: null,
    species,
    level: 'primal',
    name: id,
    uneceItem: null,
    uneceItemSeen: false,
    region: null,
    sort: 1,
  },
];
const NODES = new Map([node('shoulder'), node('square'), node('neck'), node('sirloin', 'beef')]);

const joint: SchemeOutput = {
  key: 'square',
  name: 'Square-cut shoulder',
  kind: 'joint-product',
  nodeId: 'square',
  yieldPpm: 700_000,
  valueMinorPerKg: 900,
};
const trim: SchemeOutput = {
  key: 'trim',
  name: 'Trim 75VL',
  kind: 'co-product',
  nodeId: null,
  yieldPpm: 100_000,
  valueMinorPerKg: 320,
  visualLean: 75,
};
const bone: SchemeOutput = {
  key: 'bone',
  name: 'Bone',
  kind: 'by-product',
  nodeId: null,
  yieldPpm: 190_000,
  valueMinorPerKg: -8,
};

const scheme = (stated: Partial<SchemeContent> = {}): SchemeContent => ({
  name: 'Shoulder to square-cut',
  kind: 'cutting',
  inputNodeId: 'shoulder',
  outputs: [joint, trim, bone],
  ingredients: [],
  blend: null,
  note: '',
  ...stated,
});
const faults = (stated: Partial<SchemeContent>) =>
  faultsOfScheme(scheme(stated), NODES).map(({ code, pointer }) => `${code} ${pointer}`);
const withJoint = (stated: Partial<SchemeOutput>) => faults({ outputs: [{ ...joint, ...stated }, trim, bone] });

describe('a cutting scheme', () => {
  it('has no fault while its outputs add to at most 1, and shows what is lost', () => {
    expect(faults({})).toEqual([]);
    expect(schemeLossPpm(scheme())).toBe(10_000);
    expect(withJoint({ yieldPpm: 710_000 })).toEqual([]);
  });

  it('is refused where they add to more, by the least that can be written', () => {
    const [fault] = faultsOfScheme(scheme({ outputs: [{ ...joint, yieldPpm: 710_001 }, trim, bone] }), NODES);
    expect(fault).toEqual({
      code: 'scheme-yields-over',
      pointer: '/outputs',
      params: { percent: formatPercent(ppm(1_000_001)), most: formatPercent(ppm(1_000_000)) },
    });
  });

  it.each<[string, Partial<SchemeOutput>, string]>([
    ['a yield of nothing', { yieldPpm: 0 }, 'scheme-yield-size /outputs/0/yieldPpm'],
    ['a joint product without a place', { nodeId: null }, 'scheme-joint-without-place /outputs/0/nodeId'],
    ['a place that is not there', { nodeId: 'fin' }, 'scheme-node-unknown /outputs/0/nodeId'],
    ['a place of another species', { nodeId: 'sirloin' }, 'scheme-other-species /outputs/0/nodeId'],
    ['the input itself', { nodeId: 'shoulder' }, 'scheme-output-is-input /outputs/0/nodeId'],
    ['a joint worth less than nothing', { valueMinorPerKg: -1 }, 'scheme-value-below-zero /outputs/0/valueMinorPerKg'],
    ['a key with a space', { key: 'square cut' }, 'scheme-key-form /outputs/0/key'],
    ['more lean than there is', { visualLean: 101 }, 'scheme-lean-range /outputs/0/visualLean'],
  ])('refuses %s', (_, stated, expected) => {
    expect(withJoint(stated)).toEqual([expected]);
  });

  it('refuses two outputs of one key or name, trim without its lean, and bone with a place', () => {
    const { visualLean: _, ...unknownTrim } = trim;
    expect(faults({ outputs: [joint, { ...bone, key: 'square' }, { ...bone, key: 'fat', yieldPpm: 1 }] })).toEqual([
      'scheme-output-twice /outputs/1/key',
      'scheme-output-twice /outputs/2/name',
    ]);
    expect(faults({ outputs: [joint, unknownTrim] })).toEqual(['scheme-lean-missing /outputs/1/visualLean']);
    expect(faults({ outputs: [joint, { ...bone, nodeId: 'neck' }] })).toEqual([
      'scheme-place-for-joints-only /outputs/1/nodeId',
    ]);
    expect(faults({ outputs: [], inputNodeId: 'fin' })).toEqual([
      'scheme-node-unknown /inputNodeId',
      'scheme-without-outputs /outputs',
    ]);
  });
});

describe('a recipe', () => {
  const rusk = { name: 'Rusk', ppmOfInput: 80_000, allergens: ['cereals containing gluten'], declared: false };
  const water = { name: 'Water', ppmOfInput: 70_000, allergens: [], declared: false };
  const sausage = (yieldPpm: number, ingredients = [rusk, water]) => ({
    kind: 'recipe' as const,
    outputs: [{ ...joint, yieldPpm }],
    ingredients,
  });

  it('may pass 1 by what its ingredients weigh, and by no more', () => {
    expect(faults(sausage(1_150_000))).toEqual([]);
    expect(faults(sausage(1_150_001))).toEqual(['scheme-yields-over /outputs']);
    expect(faults(sausage(900_000, []))).toEqual(['scheme-recipe-adds-nothing /ingredients']);
    expect(faults({ ingredients: [rusk] })).toEqual(['scheme-only-recipes-add /ingredients']);
    expect(faults(sausage(900_000, [rusk, { ...rusk, ppmOfInput: 0 }]))).toEqual([
      'scheme-ingredient-size /ingredients/1/ppmOfInput',
      'scheme-output-twice /ingredients/1/name',
    ]);
  });

  it('tells what each thing is of the mixing bowl, together exactly all of it', () => {
    const { inputPpm, ingredients } = recipeShares([rusk, water]);
    expect(inputPpm).toBe(869_565);
    expect(ingredients.map(({ sharePpm }) => sharePpm)).toEqual([69_565, 60_870]);
    expect(inputPpm + 69_565 + 60_870).toBe(1_000_000);
  });
});

describe('a blend', () => {
  const part = (name: string, visualLean: number, sharePpm: number) => ({ name, visualLean, tolerance: 2, sharePpm });
  const blend = (parts = [part('90VL', 90, 750_000), part('70VL', 70, 250_000)], leastLean = 84, mostLean = 86) => ({
    kind: 'blend' as const,
    blend: { parts, leastLean, mostLean },
  });

  it('stays within its band, weighted by grams', () => {
    expect(faults(blend())).toEqual([]);
    expect(faultsOfScheme(scheme(blend([part('90VL', 90, 500_000), part('70VL', 70, 500_000)])), NODES)).toEqual([
      {
        code: 'scheme-blend-outside',
        pointer: '/blend/parts',
        params: { lean: formatPercent(ppm(800_000), 'en-GB', 1), least: 84, most: 86 },
      },
    ]);
  });

  it('has shares that are all of it, a band, two trims at least, and is the only kind that mixes', () => {
    expect(faults(blend([part('90VL', 90, 750_000), part('70VL', 70, 249_999)]))).toEqual([
      'scheme-blend-shares /blend/parts',
    ]);
    expect(faults(blend(undefined, 90, 80))).toEqual(['scheme-blend-band /blend/leastLean']);
    expect(faults(blend([part('90VL', 90, 1_000_000)]))).toEqual(['scheme-blend-parts /blend']);
    expect(faults(blend([part('90VL', 190, 750_000), part('70VL', 70, 0)]))).toEqual([
      'scheme-lean-range /blend/parts/0/visualLean',
      'scheme-yield-size /blend/parts/1/sharePpm',
    ]);
    expect(faults({ blend: blend().blend })).toEqual(['scheme-only-blends-mix /blend']);
  });
});
