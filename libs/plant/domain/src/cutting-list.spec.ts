import fc from 'fast-check';
import { grams, ppm } from '@seamwright/shared/util';
import { aCut, aLine } from './a-cutting-line';
import { byCustomer, byPrimal, cuttingList, cuttingTotals, minutesOf, stationLoads, type CuttingLine } from './index';

const heron = { id: 'c-heron', name: 'The Heron' };
const bridge = { id: 'c-bridge', name: 'Bridge House' };

describe('the cutting list', () => {
  it('adds up lines with the same version and choices, and keeps others apart', () => {
    const rows = cuttingList([
      aLine({ pieces: 10, customer: heron }),
      aLine({ pieces: 5, customer: bridge, orderNumber: 1002 }),
      aLine({ pieces: 2, cut: { choiceKey: 'trim=3' } }),
      aLine({ pieces: 1, cut: { versionId: 'v-steak-2' } }),
    ]);
    expect(rows.map(({ cut, pieces }) => [cut.versionId, cut.choiceKey, pieces])).toEqual([
      ['v-steak', 'trim=3', 2],
      ['v-steak', 'trim=6', 15],
      ['v-steak-2', 'trim=6', 1],
    ]);
    expect(rows[1]?.customers).toEqual([
      { customer: bridge, orderNumbers: [1002], pieces: 5, cases: 0, loosePieces: 5, outGrams: 1400 },
      { customer: heron, orderNumbers: [1001], pieces: 10, cases: 0, loosePieces: 10, outGrams: 2800 },
    ]);
  });

  it('spends set-up once for a row, and rounds the work by weight up once', () => {
    // 15 × 280 g = 4,200 g out, over 0.784 = 5,357.14 g in × 30 s/kg = 160.71 s; with 120 s set-up 281 s.
    const [row] = cuttingList([aLine({ pieces: 10 }), aLine({ pieces: 5, customer: bridge })]);
    expect(row?.stations).toEqual([
      { station: 'trimming', seconds: 281 },
      { station: 'portioning', seconds: 60 + 15 * 8 },
    ]);
    expect(row).toMatchObject({ outGrams: 4200, inGrams: 5358, seconds: 461 });
    expect([0, 60, 61, 461].map(minutesOf)).toEqual([0, 1, 2, 8]);
  });

  it('counts as cases what was ordered in cases', () => {
    const [row] = cuttingList([aLine({ pieces: 24, inCases: true }), aLine({ pieces: 13 })]);
    expect(row).toMatchObject({ pieces: 37, cases: 2, loosePieces: 13 });
  });

  it('keeps the whole cases of a case line that fell short', () => {
    expect(cuttingList([aLine({ pieces: 22, inCases: true })])[0]).toMatchObject({ cases: 1, loosePieces: 10 });
  });

  it('leaves out what is wholly short', () => {
    expect(cuttingList([aLine({ pieces: 0 })])).toEqual([]);
  });

  it('stands by species, primal and name, with sums that are those of its rows', () => {
    const rows = cuttingList([
      aLine(),
      aLine({ cut: { versionId: 'v-leg', name: 'Leg', primal: { id: 'n-leg', name: 'Leg', species: 'lamb' } } }),
      aLine({ cut: { versionId: 'v-dice', name: 'Dice' } }),
    ]);
    const primals = byPrimal(rows);
    expect(primals.map(({ primal, rows: each }) => [primal.name, each.map(({ cut }) => cut.name)])).toEqual([
      ['Leg', ['Leg']],
      ['Striploin', ['Dice', 'Striploin steak']],
    ]);
    expect(cuttingTotals(rows).inGrams).toBe(rows.reduce((sum, row) => sum + row.inGrams, 0));
    expect(primals.map(({ totals }) => totals.pieces)).toEqual([10, 20]);
  });
});

const lines = fc.array(
  fc.record({
    version: fc.constantFrom('a', 'b'),
    choice: fc.constantFrom('', 'trim=6'),
    customer: fc.constantFrom(heron, bridge),
    orderNumber: fc.integer({ min: 1001, max: 1004 }),
    inCases: fc.boolean(),
    pieces: fc.integer({ min: 0, max: 400 }),
  }),
  { maxLength: 12 },
);
type Drawn = (typeof lines extends fc.Arbitrary<infer T> ? T : never)[number];
const lineOf = ({ version, choice, ...rest }: Drawn): CuttingLine => ({
  ...rest,
  cut: aCut({
    versionId: version,
    choiceKey: choice,
    name: version,
    primal: { id: `n-${version}`, name: version },
    yieldPpm: ppm(version === 'a' ? 613_000 : 1_000_000),
    pieceNominalGrams: grams(version === 'a' ? 281 : 1790),
  }),
});

describe('the cutting list, for any lines', () => {
  it('does not depend on their order', () => {
    fc.assert(
      fc.property(lines, fc.infiniteStream(fc.nat()), (drawn, keys) => {
        const all = drawn.map(lineOf);
        const shuffled = all
          .map((line) => ({ line, key: keys.next().value as number }))
          .sort((a, b) => a.key - b.key)
          .map(({ line }) => line);
        expect(cuttingList(shuffled)).toEqual(cuttingList(all));
      }),
    );
  });

  it('adds up: two lists together are the list of both, but for set-up that is spent once', () => {
    fc.assert(
      fc.property(lines, lines, (first, second) => {
        const [a, b] = [cuttingTotals(cuttingList(first.map(lineOf))), cuttingTotals(cuttingList(second.map(lineOf)))];
        const both = cuttingTotals(cuttingList([...first, ...second].map(lineOf)));
        expect([both.pieces, both.cases, both.loosePieces, both.outGrams]).toEqual([
          a.pieces + b.pieces,
          a.cases + b.cases,
          a.loosePieces + b.loosePieces,
          a.outGrams + b.outGrams,
        ]);
        expect(both.seconds).toBeLessThanOrEqual(a.seconds + b.seconds);
        expect(both.inGrams).toBeLessThanOrEqual(a.inGrams + b.inGrams);
      }),
    );
  });

  it('says the same by primal, by customer and by station', () => {
    fc.assert(
      fc.property(lines, (drawn) => {
        const rows = cuttingList(drawn.map(lineOf));
        const totals = cuttingTotals(rows);
        const sum = (numbers: readonly number[]) => numbers.reduce((total, each) => total + each, 0);
        expect(sum(byPrimal(rows).map((each) => each.totals.outGrams))).toBe(totals.outGrams);
        expect(sum(byCustomer(rows).map((each) => each.totals.outGrams))).toBe(totals.outGrams);
        expect(sum(byCustomer(rows).map((each) => each.totals.pieces))).toBe(totals.pieces);
        expect(sum(stationLoads(rows).map(({ seconds }) => seconds))).toBe(totals.seconds);
        expect(totals.pieces).toBe(sum(drawn.map(({ pieces }) => pieces)));
      }),
    );
  });
});
