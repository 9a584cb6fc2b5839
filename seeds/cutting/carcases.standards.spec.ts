// The demo's carcases, broken down to the end, against published cut-out tables. Each species follows one source's
// cutting lines; the spread stands beside each check.
import { cutOut, cutOutTotals, shareInPpm, type CutOut, type CuttingStep } from '@seamwright/catalogue/domain';
import { addFractions, fraction, unwrap } from '@seamwright/shared/util';
import { schemeSteps } from './schemes';

const steps = schemeSteps();

/** Breaks a carcase down through the named schemes; the first cutting scheme of every other piece. */
function brokenDown(carcase: string, named: readonly string[] = []): CutOut {
  const chosen = new Map<string, CuttingStep>();
  const first = [...steps.values()].filter(({ kind }) => kind === 'cutting');
  for (const step of [...named.flatMap((code) => steps.get(code) ?? []), ...first])
    if (!chosen.has(step.inputNodeId)) chosen.set(step.inputNodeId, step);
  return unwrap(cutOut(carcase, chosen));
}

const percent = (ppmOfWhole: number): number => ppmOfWhole / 10_000;
const primalsOf = (code: string): Readonly<Record<string, number>> =>
  Object.fromEntries((steps.get(code)?.outputs ?? []).map(({ key, yieldPpm }) => [key, percent(yieldPpm)]));

/** Joint products and edible trim, per cent of the carcase. */
function edible(out: CutOut): number {
  const { jointProducts, coProducts } = cutOutTotals(out);
  return percent(shareInPpm(addFractions(jointProducts, coProducts)));
}

function expectNear(
  primals: Readonly<Record<string, number>>,
  published: Readonly<Record<string, number>>,
  within: number,
) {
  for (const [key, share] of Object.entries(published))
    expect(Math.abs((primals[key] ?? 0) - share)).toBeLessThanOrEqual(within);
}

describe.each(['lamb', 'beef', 'pork'])('a whole carcase of %s', (species) => {
  it('balances: all that comes of it and all that is lost are exactly the carcase', () => {
    const out = brokenDown(species);
    const { jointProducts, coProducts, byProducts, loss } = cutOutTotals(out);
    expect([jointProducts, coProducts, byProducts, loss].reduce(addFractions)).toEqual(fraction(1n));
    expect(out.lines.every(({ through }) => through.length >= 1)).toBe(true);
  });

  it('loses at most two per cent to saw and drip on the whole way', () => {
    expect(percent(shareInPpm(brokenDown(species).loss))).toBeGreaterThan(0.5);
    expect(percent(shareInPpm(brokenDown(species).loss))).toBeLessThan(2);
  });
});

describe('lamb', () => {
  it('is split as on the chart of the US Army handbook on cutting lamb, within half a point', () => {
    const published = {
      'lamb-leg': 32,
      'lamb-loin': 13,
      'lamb-rack': 11,
      'lamb-shoulder': 23,
      'lamb-breast': 21,
    };
    expectNear(primalsOf('CS-101'), published, 0.5);
  });

  it('gives 65 to 75 per cent of the carcase to take home, bone-in: Wisconsin and Ohio State extension, 2023', () => {
    const take = edible(brokenDown('lamb', ['CS-102', 'CS-106']));
    expect(take).toBeGreaterThanOrEqual(65);
    expect(take).toBeLessThanOrEqual(75);
  });

  it('gives of the leg 85.3 ± 0.6 bone-in and 68.0 ± 0.7 boneless: Journal of Animal Science 75(1), 1997, 1–6', () => {
    const joints = (code: string) =>
      (steps.get(code)?.outputs ?? [])
        .filter(({ kind }) => kind === 'joint-product')
        .reduce((sum, { yieldPpm }) => sum + percent(yieldPpm), 0);
    expect(Math.abs(joints('CS-102') - 85.3)).toBeLessThanOrEqual(0.6);
    expect(Math.abs(joints('CS-103') - 68)).toBeLessThanOrEqual(0.7);
  });

  it('gives boneless 69 of the shoulder and 38 of breast, shank and neck: US Army handbook, chart', () => {
    expect(primalsOf('CS-107')['lamb-shoulder-rolled']).toBe(69);
    expect(primalsOf('CS-108')['trim-70vl']).toBe(38);
  });
});

describe('beef', () => {
  it('is split as in Kansas State University’s MF3395, within half a point', () => {
    const published = {
      'beef-chuck': 27,
      'beef-rib': 10,
      'beef-short-loin': 10,
      'beef-rump': 7,
      'beef-round': 22,
      'beef-flank': 5,
      'beef-plate': 9,
      'beef-brisket': 4,
      'beef-shin': 3,
      'kidney-and-channel-fat': 3,
    };
    expectNear(primalsOf('CS-201'), published, 0.5);
  });

  it('gives 75 to 79.3 per cent of the side to eat', () => {
    // 25 % bone and trim off: a public producer's page. 465 of 590 lb, 78.8 %: Indiana Board of Animal Health. 639 of
    // 806 lb, 79.3 %: leaflet in the style of the US beef checkoff.
    const eaten = edible(brokenDown('beef'));
    expect(eaten).toBeGreaterThanOrEqual(75);
    expect(eaten).toBeLessThanOrEqual(79.3);
  });
});

describe('pork', () => {
  // University of Kentucky, one industry source: pounds of the 184.2 that its primals really add to.
  const ofKentucky = (pounds: number): number => (pounds * 100) / 184.2;

  it('is split as on the University of Kentucky’s chart, within half a point', () => {
    const published = {
      'pork-leg': ofKentucky(45),
      'pork-belly': ofKentucky(34.9),
      'pork-loin': ofKentucky(33.8),
      'pork-shoulder': ofKentucky(16.6 + 14.7),
      'jowl-feet-and-tail': ofKentucky(15.4),
      'skin-fat-and-bone': ofKentucky(22),
    };
    expectNear(primalsOf('CS-301'), published, 0.5);
  });

  it('gives 76.1 to 80 per cent of the carcase to eat, within a point below, since the first is “about 140 lb”', () => {
    // About 140 of 184 lb: University of Kentucky. 144 of 180 lb: another leaflet.
    const eaten = edible(brokenDown('pork'));
    expect(eaten).toBeGreaterThanOrEqual(75.1);
    expect(eaten).toBeLessThanOrEqual(80);
  });
});
