// Published carcase cut-outs: each table against its own total, worked out as a scheme's outputs and loss.
import { grams } from '@seamwright/shared/util';
import { cuttingLoss } from '../yields/cutting-test';

type Table = Readonly<Record<string, number>>;

/** What is left of `whole` when every part is taken off, in the table's own unit (whole ones). */
function lossOf(whole: number, parts: Table) {
  return cuttingLoss({
    input: { grams: grams(whole), addedGrams: grams(0) },
    outputs: Object.entries(parts).map(([key, weight]) => ({ key, grams: grams(weight) })),
  });
}
const addsUp = { ok: true, value: 0 };

describe('lamb, per cent of the carcase', () => {
  it('adds to 100: US Army handbook on cutting lamb, chart', () => {
    const split = { legsWithSirloin: 32, loinUntrimmed: 13, rack8Ribs: 11, shoulders5Ribs: 23, breastsShanksNeck: 21 };
    expect(lossOf(100, split)).toEqual(addsUp);
  });

  it('adds to both halves and to 100: agricultural e-course, IASRI', () => {
    expect(lossOf(53, { rack: 10, shoulder: 25, neck: 4, shank: 6, breast: 8 })).toEqual(addsUp);
    expect(lossOf(47, { leg: 32, loin: 10, flank: 3, suetAndKidney: 2 })).toEqual(addsUp);
    expect(lossOf(100, { foresaddle: 53, hindsaddle: 47 })).toEqual(addsUp);
  });

  it('leaves 24 as trim, closely trimmed and bone-in: University of Missouri extension, October 2006', () => {
    const closely = { shoulder: 20, rack: 7, loin: 8, leg: 24, breastAndFlank: 17 };
    expect(lossOf(100, closely)).toEqual({ ok: true, value: 24 });
  });
});

describe('beef', () => {
  it('adds to 100 per cent: Kansas State University, MF3395', () => {
    const primals = { chuck: 27, rib: 10, shortLoin: 10, sirloin: 7, round: 22, flank: 5, shortPlate: 9 };
    expect(lossOf(100, { ...primals, brisket: 4, shank: 3, kidneyPelvicHeartFat: 3 })).toEqual(addsUp);
  });

  it('adds to 590 lb: Indiana Board of Animal Health, 1,000 lb live', () => {
    const retail = { tBone: 35, sirloin: 40, roundSteak: 65, ribRoast: 45, rump: 20, chuckRoast: 105, mince: 110 };
    expect(lossOf(465, { ...retail, stew: 45 })).toEqual(addsUp);
    expect(lossOf(590, { retail: 465, boneFatShrink: 125 })).toEqual(addsUp);
  });

  it('adds to 80 as that page prints its per cents; the misprint is chuck 6, which is 26', () => {
    const others = { round: 22, loin: 17, rib: 9, flank: 4, plate: 12, shank: 4, suet: 6 };
    expect(lossOf(100, { ...others, chuck: 6 })).toEqual({ ok: true, value: 20 });
    expect(lossOf(100, { ...others, chuck: 26 })).toEqual(addsUp);
  });
});

// University of Kentucky chart (one industry source); tenths of a pound.
describe('pork, 250 lb live', () => {
  const primals: Readonly<Record<string, readonly [whole: number, parts: Table]>> = {
    ham: [450, { cured: 255, fresh: 23, trim: 58, skinFatBone: 114 }],
    belly: [349, { bacon: 190, spareribs: 58, trim: 91, fat: 10 }],
    loin: [
      338,
      { backRibs: 32, boneless: 107, countryRibs: 76, sirloinRoast: 57, tenderloin: 16, trim: 16, fatBone: 34 },
    ],
    picnic: [166, { boneless: 126, skinFatBone: 40 }],
    bostonButt: [147, { steaks: 44, roast: 78, trim: 17, fat: 8 }],
    miscellaneous: [392, { jowlFeetTail: 154, skinFatBone: 220, shrink: 18 }],
  };

  it.each(Object.entries(primals))('has a %s that adds to its contents', (_, [whole, parts]) => {
    expect(lossOf(whole, parts)).toEqual(addsUp);
  });

  it('has primals of 184.2 lb in a carcase of 184.0: 0.2 lb more than there is', () => {
    const all = Object.fromEntries(Object.entries(primals).map(([name, [whole]]) => [name, whole]));
    expect(lossOf(1840, all)).toMatchObject({ ok: false, refusal: { params: { over: 2 } } });
    expect(lossOf(1842, all)).toEqual(addsUp);
  });

  it('prints 22 for the miscellaneous 21.3 per cent, which makes its column add to 100', () => {
    expect(lossOf(100, { ham: 24, belly: 19, loin: 18, picnic: 9, bostonButt: 8, miscellaneous: 22 })).toEqual(addsUp);
    expect((392 * 1000) / 1840).toBeCloseTo(213, 0);
  });
});
