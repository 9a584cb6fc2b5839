// Item numbers of the UNECE standards for meat, where they were read in a document that is named beside each. Numbers from
// memory are no oracle: nothing is checked against them.
import { UNECE_START_VALUES } from '@seamwright/database';
import { CUT_TREE } from './cut-tree';
import { SPECIFICATIONS } from './specifications';

const WORKING_PAPER = 'ECE/TRADE/C/WP.7/GE.2/2012/INF.4 (7 September 2012), current codes';
const REVISION = 'ECE/TRADE/C/WP.7/2012/7 (bovine revision), excerpt of the UN document search';
const GOST = 'GOST 32605-2013, identical to ECE/TRADE/308:2006, clause 5.4.2';

const SEEN = [
  ['1550', 'beef', WORKING_PAPER],
  ['1604', 'beef', WORKING_PAPER],
  ['1617', 'beef', WORKING_PAPER],
  ['1622', 'beef', WORKING_PAPER],
  ['1694', 'beef', WORKING_PAPER],
  ['1695', 'beef', WORKING_PAPER],
  ['2000', 'beef', REVISION],
  ['2006', 'beef', REVISION],
  ['2010', 'beef', WORKING_PAPER],
  ['2011', 'beef', WORKING_PAPER],
  ['2012', 'beef', WORKING_PAPER],
  ['2040', 'beef', WORKING_PAPER],
  ['2050', 'beef', WORKING_PAPER],
  ['2060', 'beef', WORKING_PAPER],
  ['2070', 'beef', WORKING_PAPER],
  ['2081', 'beef', WORKING_PAPER],
  ['2090', 'beef', WORKING_PAPER],
  ['2091', 'beef', WORKING_PAPER],
  ['2093', 'beef', WORKING_PAPER],
  ['2120', 'beef', WORKING_PAPER],
  ['2131', 'beef', WORKING_PAPER],
  ['2133', 'beef', WORKING_PAPER],
  ['2140', 'beef', WORKING_PAPER],
  ['2146', 'beef', WORKING_PAPER],
  ['2150', 'beef', WORKING_PAPER],
  ['2160', 'beef', WORKING_PAPER],
  ['2180', 'beef', WORKING_PAPER],
  ['2310', 'beef', WORKING_PAPER],
  ['4510', 'lamb', GOST],
  ['4610', 'lamb', GOST],
  ['4630', 'lamb', GOST],
  ['4631', 'lamb', GOST],
] as const;

const seenKeys = new Set(SEEN.map(([item, species]) => `${species} ${item}`));

describe('the item numbers that are marked as seen', () => {
  it.each(SEEN)('%s of %s was read in %s', (item, species) => {
    const kept = UNECE_START_VALUES.filter(({ field, value }) => field === 'item' && value === item);
    expect(kept).toMatchObject([{ species, seen: true, source: expect.any(String) as string }]);
  });

  it('are no others: what was not read is marked as from memory, without a source', () => {
    const others = UNECE_START_VALUES.filter(
      ({ field, species, value }) => field === 'item' && !seenKeys.has(`${species} ${value}`),
    );
    expect(others.length).toBeGreaterThan(20);
    expect(others.filter(({ seen, source }) => seen || source !== null)).toEqual([]);
  });

  it('are marked the same in the demo’s cut tree and specifications', () => {
    const nodes = CUT_TREE.flatMap(({ key, species, unece }) =>
      unece ? [{ key, species, item: unece[0], seen: unece[1] }] : [],
    );
    const species = { LM: 'lamb', BF: 'beef', PK: 'pork' } as const;
    const versions = SPECIFICATIONS.flatMap(({ code, uneceItem, uneceItemSeen }) =>
      uneceItem === null
        ? []
        : [{ key: code, species: species[code.slice(0, 2) as 'LM'], item: uneceItem, seen: uneceItemSeen }],
    );
    const wrong = [...nodes, ...versions].filter(
      ({ species: of, item, seen }) => seen !== seenKeys.has(`${of} ${item}`),
    );
    expect(wrong).toEqual([]);
    expect([...nodes, ...versions].some(({ seen }) => seen)).toBe(true);
  });
});
