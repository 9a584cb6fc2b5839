import { SPECIES } from '../cut-words';
import { areaOf, boxOf, type Point } from '../drawing/geometry';
import { BEEF_SIDE } from './beef-side';
import { carcaseMap, regionsOf } from './carcase-map';
import { LAMB_SIDE } from './lamb-side';
import { areaInside, flattened, planarMap, type MapPlan } from './planar-map';
import { PORK_SIDE } from './pork-side';

const PLANS: Readonly<Record<(typeof SPECIES)[number], MapPlan>> = {
  lamb: LAMB_SIDE,
  beef: BEEF_SIDE,
  pork: PORK_SIDE,
};

/** Whether a point lies inside a closed outline (even and odd crossings to the right of it). */
function isInside(point: Point, outline: readonly Point[]): boolean {
  return outline.reduce((inside, a, at) => {
    const b = outline[(at + 1) % outline.length] ?? a;
    const crosses = a.y > point.y !== b.y > point.y;
    return crosses && point.x < a.x + ((point.y - a.y) / (b.y - a.y)) * (b.x - a.x) ? !inside : inside;
  }, false);
}

describe.each(SPECIES)('the side of %s', (species) => {
  const map = carcaseMap(species);
  const plan = PLANS[species];
  const outer = map.regions.filter(({ inner }) => !inner);

  it('walks each line of the outline once, and each seam once from either side', () => {
    const walked = plan.regions.flatMap(({ round }) => round).sort();
    const expected = [
      ...Object.keys(plan.outline),
      ...Object.keys(plan.seams).flatMap((name) => [name, `-${name}`]),
    ].sort();
    expect(walked).toEqual(expected);
  });

  it('closes every region: each curve begins where the one before ends', () => {
    for (const { key, curves } of map.regions) {
      curves.forEach((curve, at) => {
        const before = curves.at(at - 1);
        expect({ key, at, from: curve[0] }).toEqual({ key, at, from: before?.[3] });
      });
    }
  });

  it('is covered by its regions without gap or overlap: their areas add up to its own', () => {
    const sum = outer.reduce((total, { curves }) => total + areaInside(curves), 0);
    expect(sum).toBeCloseTo(areaInside(map.outline), 3);
  });

  it('stays inside its own plane', () => {
    const { left, top, right, bottom } = boxOf(flattened(map.outline));
    expect(Math.min(left, top)).toBeGreaterThanOrEqual(0);
    expect(right).toBeLessThanOrEqual(map.width);
    expect(bottom).toBeLessThanOrEqual(map.height);
  });

  it('writes a name inside its region, or outside the side when the region is too small to hold it', () => {
    const side = flattened(map.outline);
    for (const { key, curves, label, beside } of map.regions) {
      const where = beside ? isInside(label, side) : isInside(label, flattened(curves));
      expect({ key, where }).toEqual({ key, where: !beside });
    }
  });

  it('lays what is under the surface inside the side', () => {
    const side = flattened(map.outline);
    for (const { curves } of map.regions.filter(({ inner }) => inner)) {
      expect(flattened(curves).every((point) => isInside(point, side))).toBe(true);
    }
  });

  it('names each region once', () => {
    const keys = regionsOf(species);
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys.every((key) => /^[a-z]+(-[a-z]+)*$/.test(key))).toBe(true);
  });
});

describe('a planar map', () => {
  const square: MapPlan = {
    width: 10,
    height: 10,
    points: { a: [0, 0], b: [10, 0], c: [10, 10], d: [0, 10] },
    outline: { top: ['a', 'b'], right: ['b', 'c'], bottom: ['c', 'd'], left: ['d', 'a'] },
    seams: { across: ['b', 'd'] },
    regions: [
      { key: 'upper', round: ['top', 'across', 'left'], label: [3, 3] },
      { key: 'lower', round: ['right', 'bottom', '-across'], label: [7, 7] },
    ],
  };

  it('draws a seam between two points straight', () => {
    const [seam] = planarMap(square).seams;
    expect(areaOf(flattened(seam ?? []))).toBeCloseTo(0, 9);
  });

  it('refuses a line or a point that is not there', () => {
    const lost: MapPlan = { ...square, regions: [{ key: 'upper', round: ['nowhere'], label: [3, 3] }] };
    expect(() => planarMap(lost)).toThrow('no line "nowhere"');
    expect(() => planarMap({ ...square, seams: { across: ['b', 'x'] } })).toThrow('no point "x"');
  });
});
