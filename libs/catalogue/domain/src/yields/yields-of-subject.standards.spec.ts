// Two pork butts, a cutting test from a public hobby forum, net 15.91 lb; hundredths of a pound stand for grams.
import { grams, shareByLargestRemainder } from '@seamwright/shared/util';
import { cuttingLoss, type TestSubject } from './cutting-test';
import { yieldsToAdopt } from './yields-of-subject';

const WEIGHED = { bone: 110, scrap: 79, end: 161, steak: 436, ribs: 805 };
const outputs = Object.entries(WEIGHED).map(([key, weight]) => ({ key, grams: grams(weight) }));
const subject: TestSubject = {
  kind: 'cutting',
  outputs: outputs.map(({ key }) => ({ key, name: key, kind: 'joint-product' })),
};
const test = { id: 'a', supplier: '', grade: '', inputGrams: 1591, outputs, verdict: null };

describe('two pork butts', () => {
  it('reconciles to the hundredth: nothing was lost', () => {
    expect(cuttingLoss({ input: { grams: grams(1591), addedGrams: grams(0) }, outputs })).toEqual({
      ok: true,
      value: 0,
    });
  });

  it('is printed as 6.91, 4.96, 10.11, 27.40 and 50.59 per cent, cut and not rounded, which add to 99.97', () => {
    const cut = Object.values(WEIGHED).map((weight) => Math.trunc((weight * 10_000) / 1591));
    expect(cut).toEqual([691, 496, 1011, 2740, 5059]);
    expect(cut.reduce((sum, each) => sum + each, 0)).toBe(9997);
  });

  it('adds to 100 when the hundredths left over go to the largest remainders', () => {
    const shared = shareByLargestRemainder(10_000, Object.values(WEIGHED));
    expect(shared).toEqual([691, 497, 1012, 2740, 5060]);
    expect(shared.reduce((sum, each) => sum + each, 0)).toBe(10_000);
  });

  it('adopts yields that add to exactly 1, since nothing was lost', () => {
    const adopted = yieldsToAdopt(subject, [test]);
    expect([...adopted.values()]).toEqual([69_139, 49_654, 101_194, 274_042, 505_971]);
    expect([...adopted.values()].reduce((sum, each) => sum + each, 0)).toBe(1_000_000);
    // Net of bone and scrap: 14.02 of 15.91 lb, printed 88.12 per cent.
    const usable = 1_000_000 - (adopted.get('bone') ?? 0) - (adopted.get('scrap') ?? 0);
    expect(Math.round(usable / 100)).toBe(8812);
  });
});
