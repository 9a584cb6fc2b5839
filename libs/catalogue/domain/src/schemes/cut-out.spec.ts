import fc from 'fast-check';
import { addFractions, fraction, grams, unwrap } from '@seamwright/shared/util';
import { aVersion } from '../../testing/src';
import { cutOut, cutOutGrams, cutOutTotals, shareInPpm } from './cut-out';
import type { CuttingStep } from './cutting-scheme';
import { cycleThrough } from './scheme-cycle';
import { schemeOfVersion } from './scheme-of-version';

type Out = readonly [key: string, yieldPpm: number, nodeId?: string];

const step = (inputNodeId: string, outputs: readonly Out[], kind: CuttingStep['kind'] = 'cutting'): CuttingStep => ({
  code: `from-${inputNodeId}`,
  name: inputNodeId,
  kind,
  inputNodeId,
  outputs: outputs.map(([key, yieldPpm, nodeId]) => ({
    key,
    name: key,
    kind: nodeId === undefined ? 'by-product' : 'joint-product',
    nodeId: nodeId ?? null,
    yieldPpm,
    valueMinorPerKg: 0,
  })),
  addedPpm: 0,
});
const chain = (...steps: CuttingStep[]) => new Map(steps.map((each) => [each.inputNodeId, each]));

describe('a chain from the carcase', () => {
  const steps = chain(
    step('carcase', [
      ['leg', 320_000, 'leg'],
      ['rest', 670_000, 'rest'],
    ]),
    step('leg', [
      ['boneless', 680_000, 'boneless'],
      ['bone', 190_000],
    ]),
  );

  it('multiplies the yields along each way, exactly, and gathers what is lost on it', () => {
    const { lines, loss } = unwrap(cutOut('carcase', steps));
    expect(lines.map(({ key, share, through }) => [key, share, through])).toEqual([
      ['rest', fraction(67n, 100n), ['from-carcase']],
      ['boneless', fraction(2176n, 10_000n), ['from-carcase', 'from-leg']],
      ['bone', fraction(608n, 10_000n), ['from-carcase', 'from-leg']],
    ]);
    // 1 % at the first saw, and 13 % of the leg's 32 %.
    expect(loss).toEqual(fraction(516n, 10_000n));
  });

  it('comes to whole grams that add to the carcase', () => {
    const shares = cutOutGrams(unwrap(cutOut('carcase', steps)), grams(20_001));
    expect(shares).toEqual([13_401, 4_352, 1_216, 1_032]);
    expect(shares.reduce((sum, each) => sum + each, 0)).toBe(20_001);
  });

  it('adds to exactly 1 by kind, whatever the yields', () => {
    const yields = fc.tuple(fc.nat(333_333), fc.nat(333_333), fc.nat(333_333));
    fc.assert(
      fc.property(yields, yields, fc.integer({ min: 1, max: 400_000 }), ([a, b, c], [d, e, f], weight) => {
        const out = unwrap(
          cutOut(
            'a',
            chain(
              step('a', [
                ['b', a, 'b'],
                ['c', b, 'c'],
                ['x', c],
              ]),
              step('b', [
                ['c', d, 'c'],
                ['y', e],
                ['z', f, 'z'],
              ]),
            ),
          ),
        );
        const { jointProducts, coProducts, byProducts, loss } = cutOutTotals(out);
        expect([jointProducts, coProducts, byProducts, loss].reduce(addFractions)).toEqual(fraction(1n));
        const inGrams = cutOutGrams(out, grams(weight));
        expect(inGrams.reduce((sum, each) => sum + each, 0)).toBe(weight);
      }),
      { numRuns: 60 },
    );
  });

  it('ends in a specification read as a scheme of one joint', () => {
    const version = aVersion({
      sourceNodeId: 'leg',
      cutNodeId: 'steak',
      otherOutputs: [
        { name: 'Trim 85VL', kind: 'co-product', yieldPpm: 110_000, valueMinorPerKg: 420, visualLean: 85 },
        { name: 'Trim, 85VL', kind: 'co-product', yieldPpm: 10_000, valueMinorPerKg: 400, visualLean: 85 },
      ],
    });
    const ended = chain(...steps.values(), schemeOfVersion(version));
    const { lines, loss } = unwrap(cutOut('carcase', ended));
    expect(lines.map(({ key, share }) => [key, shareInPpm(share)])).toEqual([
      ['rest', 670_000],
      ['cut', 250_880],
      ['trim-85vl', 35_200],
      ['trim-85vl-2', 3_200],
    ]);
    expect(shareInPpm(loss)).toBe(40_720);
  });

  it('refuses a piece that comes out of itself, and a recipe on the way', () => {
    const round = chain(step('a', [['b', 1, 'b']]), step('b', [['a', 1, 'a']]));
    expect(cutOut('a', round)).toMatchObject({ ok: false, refusal: { code: 'scheme-cycle' } });
    expect(cutOut('a', chain(step('a', [['b', 1, 'b']], 'recipe')))).toMatchObject({
      refusal: { code: 'scheme-not-cutting', params: { code: 'from-a' } },
    });
  });
});

describe('a new scheme among those that stand', () => {
  const standing = [step('carcase', [['leg', 1, 'leg']]), step('leg', [['rump', 1, 'rump']])];

  it('may lead anywhere but back', () => {
    expect(cycleThrough(step('rump', [['steak', 1, 'steak']]), standing)).toBeNull();
    expect(cycleThrough(step('leg', [['shank', 1, 'shank']]), standing)).toBeNull();
  });

  it('is told the way round', () => {
    expect(cycleThrough(step('rump', [['carcase', 1, 'carcase']]), standing)).toEqual([
      'rump',
      'carcase',
      'leg',
      'rump',
    ]);
    expect(cycleThrough(step('steak', [['steak', 1, 'steak']]), standing)).toEqual(['steak', 'steak']);
  });
});
