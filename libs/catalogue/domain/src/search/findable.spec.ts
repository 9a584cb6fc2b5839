import { aChoice, aValue, aVersion } from '@seamwright/catalogue/domain/testing';
import { FAT_BANDS, fatBandOf, PORTION_BANDS, portionBandGrams, portionBandOf } from './bands';
import { findable } from './findable';
import { plainWords } from './plain-words';

describe('bands', () => {
  it('hold every fat cover, up to their own number', () => {
    expect([0, 1, 3, 4, 6, 12, 13, 60].map(fatBandOf)).toEqual([
      'none',
      'to-3',
      'to-3',
      'to-6',
      'to-6',
      'to-12',
      'over-12',
      'over-12',
    ]);
    expect(new Set(FAT_BANDS).size).toBe(5);
  });

  it('hold the portions from their first to their last gram', () => {
    for (const band of PORTION_BANDS) {
      const { from, to } = portionBandGrams(band);
      expect(portionBandOf(from ?? 1)).toBe(band);
      expect(portionBandOf(to ?? 50_000)).toBe(band);
      if (to !== null) expect(portionBandOf(to + 1)).not.toBe(band);
    }
  });
});

describe('what a version is found by', () => {
  const trim = aChoice('trim', [aValue('6'), aValue('0', { changes: { fatCoverMm: 0 }, priceChangeMinorPerKg: 280 })]);
  const pack = aChoice('pack', [
    aValue('vacuum', { priceChangeMinorPerKg: 5 }),
    aValue('tray', { changes: { packType: 'tray', piecesPerPack: 1 } }),
  ]);

  it('is what it is usually, and all that one choice makes of it', () => {
    expect(findable(aVersion({ choices: [trim, pack] }))).toEqual({
      usualChoiceKey: 'pack=vacuum;trim=6',
      usualPriceChangeMinorPerKg: 5,
      pieceGrams: 280,
      piecesPerCase: 12,
      boneStates: ['boneless'],
      fatBands: ['none', 'to-6'],
      portions: [280],
      portionBands: ['150-299'],
      packTypes: ['tray', 'vacuum'],
    });
  });

  it('is nothing that can’t be chosen', () => {
    const never = { when: { pack: 'vacuum' }, forbids: { choice: 'trim', value: '0' }, reason: 'it would dry out' };
    expect(findable(aVersion({ choices: [trim, pack], choiceRules: [never] })).fatBands).toEqual(['to-6']);
  });
});

it('makes one of what differs by case, accents and blanks only', () => {
  expect(plainWords('  Côte  DE\tbœuf ')).toBe('cote de bœuf');
});
