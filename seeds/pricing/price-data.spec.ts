import { checkBreaks } from '@seamwright/pricing/domain';
import { SPECIFICATIONS } from '../catalogue';
import { CUSTOMERS, GROUPS } from '../scenario/customers';
import { BASE_PRICES, OWN_LISTS } from './price-data';

describe("the demo's prices", () => {
  const codes = SPECIFICATIONS.map(({ code }) => code).sort();
  const all = [BASE_PRICES, ...OWN_LISTS.map(({ prices }) => prices)];

  it('cover every specification on the base list, and name no other', () => {
    expect(Object.keys(BASE_PRICES).sort()).toEqual(codes);
    expect(OWN_LISTS.flatMap(({ prices }) => Object.keys(prices)).filter((code) => !codes.includes(code))).toEqual([]);
  });

  it('fall from break to rising break', () => {
    for (const { priceMinor, breaks = [] } of all.flatMap((prices) => Object.values(prices))) {
      expect(checkBreaks(breaks).ok).toBe(true);
      const falling = [priceMinor, ...breaks.map((each) => each.priceMinor)];
      expect(falling).toEqual([...falling].sort((one, other) => other - one));
    }
  });

  it('belong to customers and groups of the scenario', () => {
    const customers = CUSTOMERS.map(({ key }) => key);
    for (const { group, customer } of OWN_LISTS) {
      expect((group === undefined) !== (customer === undefined)).toBe(true);
      expect(group === undefined || GROUPS.some((name) => name === group)).toBe(true);
      expect(customer === undefined || customers.includes(customer)).toBe(true);
    }
  });

  it('charge by the case only where every choice leaves the weight of a case as it is', () => {
    const byCase = OWN_LISTS.flatMap(({ prices }) => Object.entries(prices)).filter(
      ([, { basis }]) => basis === 'case',
    );
    const changing = SPECIFICATIONS.filter(({ choices }) =>
      choices.some(({ values }) => values.some(({ changes }) => changes?.pieceNominalGrams !== undefined)),
    ).map(({ code }) => code);
    expect(byCase.length).toBeGreaterThan(0);
    expect(byCase.filter(([code]) => changing.includes(code))).toEqual([]);
  });
});
