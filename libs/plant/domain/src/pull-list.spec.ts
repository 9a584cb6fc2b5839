import fc from 'fast-check';
import { grams, ppm, type PlantDate } from '@seamwright/shared/util';
import type { Lot } from '@seamwright/stock/domain';
import { aLine } from './a-cutting-line';
import { cuttingList, pullList, pullTotals } from './index';

const day = { cuttingDay: '2026-12-03' as PlantDate, deliveryDay: '2026-12-04' as PlantDate };
const aLot = (over: Partial<Lot> = {}): Lot => ({
  id: 'l-1',
  rowVersion: 1,
  code: 'B-1',
  nodeId: 'n-striploin',
  nodeName: 'Striploin',
  supplier: 'Fell Farms',
  killDate: '2026-11-20' as PlantDate,
  receivedOn: '2026-11-27' as PlantDate,
  useBy: '2026-12-10' as PlantDate,
  receivedGrams: grams(60_000),
  receivedPieces: 12,
  remainingGrams: grams(60_000),
  state: 'released',
  holdReason: null,
  origin: { bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse: 'UK 1234' },
  ...over,
});
/** 14 steaks of 280 g at a yield of 0.784: 3,920 g out, 5,000 g in. */
const rows = (pieces: number) => cuttingList([aLine({ pieces })]);

describe('the pull list', () => {
  it('takes whole pieces at the mean weight of the lot, and says what is left over', () => {
    const [row] = pullList(rows(28), [aLot({ receivedGrams: grams(60_001) })], day);
    // 10,000 g in; a piece weighs 60,001 / 12 g, so two of them are 10,000 g.
    expect(row).toMatchObject({ neededGrams: 10_000, pieces: 2, pulledGrams: 10_000, leftOverGrams: 0, shortGrams: 0 });
    expect(pullList(rows(29), [aLot()], day)[0]).toMatchObject({ pieces: 3, neededGrams: 10_358, leftOverGrams: 4642 });
  });

  it('takes what expires first, then goes on with the next lot', () => {
    const lots = [
      aLot({ id: 'late', code: 'B-9', useBy: '2026-12-20' as PlantDate }),
      aLot({ id: 'soon', code: 'B-2', useBy: '2026-12-04' as PlantDate, remainingGrams: grams(14_999) }),
    ];
    const [row] = pullList(rows(56), lots, day);
    expect(row?.pulls.map(({ lotId, pieces, pulledGrams }) => [lotId, pieces, pulledGrams])).toEqual([
      ['soon', 2, 10_000],
      ['late', 2, 10_000],
    ]);
  });

  it('passes over lots that do not fit the day or are of another primal', () => {
    const lots = [
      aLot({ state: 'on-hold' }),
      aLot({ useBy: '2026-12-03' as PlantDate }),
      aLot({ nodeId: 'n-rump' }),
      aLot({ remainingGrams: grams(0) }),
    ];
    expect(pullList(rows(14), lots, day)[0]).toMatchObject({ pulls: [], shortGrams: 5000, leftOverGrams: 0 });
  });

  it('names the shortage of each primal, and adds up to its totals', () => {
    const list = pullList(
      cuttingList([
        aLine({ pieces: 14 }),
        aLine({
          pieces: 4,
          cut: { versionId: 'v', yieldPpm: ppm(500_000), primal: { id: 'n-leg', name: 'Leg', species: 'lamb' } },
        }),
      ]),
      [aLot()],
      day,
    );
    expect(list.map(({ primal, shortGrams }) => [primal.name, shortGrams])).toEqual([
      ['Leg', 2240],
      ['Striploin', 0],
    ]);
    expect(pullTotals(list)).toEqual({
      outGrams: 5040,
      neededGrams: 7240,
      pieces: 1,
      pulledGrams: 5000,
      leftOverGrams: 0,
      shortGrams: 2240,
    });
  });

  it('never pulls more than a lot has, nor a piece more than it must', () => {
    const lots = fc.array(
      fc.record({
        pieces: fc.integer({ min: 1, max: 60 }),
        each: fc.integer({ min: 900, max: 9000 }),
        used: fc.integer({ min: 0, max: 100 }),
      }),
      { maxLength: 5 },
    );
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 900 }), lots, (pieces, drawn) => {
        const all = drawn.map(({ pieces: received, each, used }, index) =>
          aLot({
            id: `${index}`,
            code: `B-${index}`,
            receivedPieces: received,
            receivedGrams: grams(received * each + 7),
            remainingGrams: grams(Math.floor(((received * each + 7) * (100 - used)) / 100)),
          }),
        );
        const [row] = pullList(rows(pieces), all, day);
        if (!row) throw new Error('one primal is asked for');
        expect(row.pulledGrams + row.shortGrams).toBe(row.neededGrams + row.leftOverGrams);
        for (const pull of row.pulls) {
          expect(pull.pulledGrams).toBeLessThanOrEqual(all.find(({ id }) => id === pull.lotId)?.remainingGrams ?? 0);
        }
        const last = row.pulls.at(-1);
        // One piece less of the last lot would not cover it.
        if (last && row.shortGrams === 0)
          expect(row.leftOverGrams).toBeLessThan(Math.ceil(last.pulledGrams / last.pieces) + 1);
      }),
    );
  });
});
