import fc from 'fast-check';
import { grams, ppm, unwrap } from '@seamwright/shared/util';
import { aChoice, aValue, aVersion } from '@seamwright/catalogue/domain/testing';
import { choiceKey } from './choice-key';
import { whyForbidden } from './choice-rules';
import { resolveChoices } from './resolve-choices';

const trim = aChoice(
  'trim',
  [
    aValue('6', { changes: { fatCoverMm: 6 } }),
    aValue('0', {
      priceChangeMinorPerKg: 280,
      yieldFactorPpm: 890_000,
      extraSecondsPerKg: 25,
      station: 'trimming',
      changes: { fatCoverMm: 0 },
    }),
  ],
  'mm fat',
);
const portion = aChoice(
  'portion',
  [
    aValue('280', { changes: { pieceNominalGrams: 280, pieceMinGrams: 266, pieceMaxGrams: 294, heightMm: 28 } }),
    aValue('170', {
      priceChangeMinorPerKg: 40,
      leadDays: 1,
      changes: { pieceNominalGrams: 170, pieceMinGrams: 161, pieceMaxGrams: 179, heightMm: 17 },
    }),
  ],
  'g',
);
const finish = aChoice('finish', [
  aValue('plain', { changes: { finish: 'plain' } }),
  aValue('tied', { leadDays: 2, extraSecondsPerPiece: 20, station: 'tying', changes: { finish: 'tied' } }),
]);
const version = aVersion({
  yieldPpm: ppm(784_000),
  stations: [
    { station: 'trimming', setUpSeconds: 60, secondsPerKg: 30, secondsPerPiece: 0 },
    { station: 'packing', setUpSeconds: 60, secondsPerKg: 3, secondsPerPiece: 4 },
  ],
  choices: [portion, trim, finish],
  choiceRules: [
    { when: { trim: '0' }, forbids: { choice: 'finish', value: 'tied' }, reason: 'nothing is left to tie' },
  ],
});
const resolved = (chosen = {}) => unwrap(resolveChoices(version, chosen));

describe('a specification with its choices', () => {
  it('takes the usual value of whatever is not chosen', () => {
    expect(resolved({ trim: '0' })).toMatchObject({
      chosen: { portion: '280', trim: '0', finish: 'plain' },
      choiceKey: 'finish=plain;portion=280;trim=0',
      summary: '280 g · 0 mm fat · plain',
    });
  });

  it('changes weights, dimensions, cover and finish as the values say', () => {
    expect(resolved({ portion: '170', finish: 'tied' })).toMatchObject({
      piece: { nominalGrams: 170, minGrams: 161, maxGrams: 179 },
      dims: { lengthMm: 148, widthMm: 78, heightMm: 17 },
      fatCoverMm: 6,
      finish: 'tied',
      piecesPerCase: 12,
    });
  });

  it('adds up price changes, and takes the longest of the lead days', () => {
    expect(resolved({ portion: '170', trim: '0' }).priceChangeMinorPerKg).toBe(320);
    expect(resolved({ portion: '170', finish: 'tied' }).leadDays).toBe(2);
  });

  it('multiplies the yield, half up', () => {
    // 784,000 × 890,000 ÷ 1,000,000 = 697,760.
    expect(resolved({ trim: '0' }).yieldPpm).toBe(697_760);
  });

  it('never yields more than the primal weighs', () => {
    const heavy = aChoice('bone', [aValue('in', { yieldFactorPpm: 1_500_000 })]);
    expect(unwrap(resolveChoices({ ...version, choices: [heavy], choiceRules: [] }, {})).yieldPpm).toBe(1_000_000);
  });

  it('adds work to the station that does it, opening one where there was none', () => {
    expect(resolved({ trim: '0' }).stations[0]).toMatchObject({ station: 'trimming', secondsPerKg: 55 });
    expect(resolved({ finish: 'tied' }).stations).toContainEqual({
      station: 'tying',
      setUpSeconds: 0,
      secondsPerKg: 0,
      secondsPerPiece: 20,
    });
  });

  it('gives work without a station to the last one before packing', () => {
    const extra = aChoice('extra', [aValue('yes', { extraSecondsPerKg: 5 })]);
    const { stations } = unwrap(resolveChoices({ ...version, choices: [extra], choiceRules: [] }, {}));
    expect(stations.map(({ station, secondsPerKg }) => [station, secondsPerKg])).toEqual([
      ['trimming', 35],
      ['packing', 3],
    ]);
  });

  it('refuses what it does not offer, naming it', () => {
    expect(resolveChoices(version, { colour: 'red' })).toMatchObject({
      refusal: { code: 'choice-unknown', params: { choice: 'colour' }, pointer: '/choices/colour' },
    });
    expect(resolveChoices(version, { trim: '7' })).toMatchObject({
      refusal: { code: 'choice-value-unknown', params: { choice: 'trim', value: '7' } },
    });
    expect(resolveChoices(version, { constructor: 'x' })).toMatchObject({ refusal: { code: 'choice-unknown' } });
  });

  it('refuses a forbidden pair with its reason, and says so on either value before it is chosen', () => {
    expect(resolveChoices(version, { trim: '0', finish: 'tied' })).toMatchObject({
      refusal: { code: 'choice-pair-forbidden', params: { reason: 'nothing is left to tie' } },
    });
    expect(whyForbidden(version, { trim: '0' }, 'finish', 'tied')).toBe('nothing is left to tie');
    expect(whyForbidden(version, { finish: 'tied' }, 'trim', '0')).toBe('nothing is left to tie');
    expect(whyForbidden(version, {}, 'finish', 'tied')).toBeNull();
    expect(whyForbidden(version, { trim: '0', finish: 'tied' }, 'portion', '170')).toBeNull();
  });

  it('says beforehand exactly what it would refuse', () => {
    const value = (choice: typeof trim) => fc.constantFrom(...choice.values.map(({ value: name }) => name));
    fc.assert(
      fc.property(fc.record({ portion: value(portion), trim: value(trim), finish: value(finish) }), (chosen) => {
        const allowed = whyForbidden(version, chosen, 'finish', chosen.finish) === null;
        expect(resolveChoices(version, chosen).ok).toBe(allowed);
      }),
    );
  });

  it('has nothing to say without choices', () => {
    const plain = unwrap(resolveChoices(aVersion({ pieceNominalGrams: grams(250) }), {}));
    expect(plain).toMatchObject({ choiceKey: '', summary: '', leadDays: 0, priceChangeMinorPerKg: 0 });
  });
});

describe('the key of a chosen set', () => {
  it('is the same however the set was put together', () => {
    const chosen = fc.dictionary(fc.stringMatching(/^[a-z]{1,6}$/), fc.stringMatching(/^[a-z0-9]{1,6}$/));
    fc.assert(
      fc.property(chosen, (set) => {
        expect(choiceKey(Object.fromEntries(Object.entries(set).reverse()))).toBe(choiceKey(set));
      }),
    );
  });

  it('tells different sets apart', () => {
    expect(choiceKey({ trim: '6', finish: 'tied' })).toBe('finish=tied;trim=6');
    expect(choiceKey({ trim: '6' })).not.toBe(choiceKey({ trim: '3' }));
  });
});
