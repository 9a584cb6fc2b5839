import { aContent } from '@seamwright/catalogue/domain/testing';
import { faultsOfVersion } from '../check-version';
import type { UneceFieldValue } from './field-values';
import { readUneceCode } from './read-code';
import { uneceCodeOf } from './version-code';

/** Made up: what the values stand for is nowhere tested. */
const listed = (field: UneceFieldValue['field'], value: string, species: UneceFieldValue['species'] = null) => ({
  field,
  value,
  meaning: `${field} ${value}${species ?? ''}`,
  species,
  seen: false,
  source: null,
});
const VALUES: readonly UneceFieldValue[] = [
  listed('species', '40', 'lamb'),
  listed('species', '10', 'beef'),
  listed('species', '60'),
  listed('item', '4990', 'lamb'),
  listed('item', '2140', 'beef'),
  listed('packing', '5'),
  listed('fatThickness', '3', 'beef'),
  listed('fatThickness', '3'),
];

/** Constructed from the layout to exercise the parser: no published example, and its meanings are not checked. */
const CONSTRUCTED = '40499000110000030050';

describe('reading a UNECE code', () => {
  const faultsOf = (code: string) => {
    const reading = readUneceCode(code, VALUES);
    return reading.ok ? [] : reading.refusal.map((refusal) => [refusal.code, refusal.pointer]);
  };

  it('takes the constructed example apart, blanks between the fields or not', () => {
    const reading = readUneceCode('40 4990 00 1 1 0 00 0 0 3 0 0 5 0', VALUES);
    expect(reading).toMatchObject({ ok: true, value: { code: CONSTRUCTED, species: 'lamb' } });
    const values = reading.ok ? reading.value.fields.map(({ value }) => value) : [];
    expect(values).toEqual(['40', '4990', '00', '1', '1', '0', '00', '0', '0', '3', '0', '0', '5', '0']);
  });

  it('says what a value stands for, the species’ own before all, and nothing where no list is kept', () => {
    const reading = readUneceCode('10214000110000030050', VALUES);
    const meanings = new Map(reading.ok ? reading.value.fields.map(({ field, meaning }) => [field, meaning]) : []);
    expect(meanings.get('fatThickness')).toEqual({ meaning: 'fatThickness 3beef', seen: false, source: null });
    expect(meanings.get('packing')?.meaning).toBe('packing 5');
    expect(meanings.get('category')).toBeNull();
  });

  it.each([CONSTRUCTED.slice(1), `${CONSTRUCTED}0`])('refuses a wrong length: %s', (code) => {
    expect(readUneceCode(code, VALUES)).toEqual({
      ok: false,
      refusal: [{ code: 'unece-code-length', params: { length: code.length, wanted: 20 } }],
    });
  });

  it('refuses every field that is at fault, and names it', () => {
    expect(faultsOf('4X499000110000030050')).toEqual([['unece-field-digits', '/fields/species']]);
    expect(faultsOf('40499001110000030050')).toEqual([['unece-field-unused', '/fields/unused']]);
    expect(faultsOf('99499000110000030050')).toEqual([['unece-value-unlisted', '/fields/species']]);
    expect(faultsOf('40214000a10000030070')).toEqual([
      ['unece-value-unlisted', '/fields/item'],
      ['unece-field-digits', '/fields/refrigeration'],
      ['unece-value-unlisted', '/fields/packing'],
    ]);
  });

  it('takes the numbers of a species that has no list', () => {
    expect(readUneceCode('60123400110000030050', VALUES)).toMatchObject({ ok: true, value: { species: null } });
  });
});

describe('the UNECE code of a version', () => {
  const codeOf = (stated: Parameters<typeof aContent>[0], values = VALUES) =>
    uneceCodeOf(aContent({ uneceItem: '2140', ...stated }), 'beef', values);

  it('has species and item from the version, the author’s fields in their places, zeros for the rest', () => {
    const code = codeOf({
      temperatureState: 'defrosted',
      uneceFields: { feeding: '07', packing: '5', conformity: '9' },
    });
    expect(code).toEqual({ ok: true, value: '10 2140 00 0 0 0 07 0 0 0 0 0 5 9'.replace(/ /g, '') });
  });

  it('has a refrigeration that follows from the version', () => {
    const digit = (stated: Parameters<typeof aContent>[0]) => {
      const code = codeOf(stated);
      return code.ok ? code.value[8] : null;
    };
    const states = [
      digit({ temperatureState: 'chilled' }),
      digit({ temperatureState: 'frozen', storageMinC: -18, storageMaxC: -12 }),
      digit({ temperatureState: 'frozen', storageMinC: -25, storageMaxC: -18 }),
      digit({ temperatureState: 'defrosted' }),
    ];
    expect(new Set(states).size).toBe(4);
  });

  it('takes the fat thickness that stands on the version', () => {
    expect(codeOf({ fatCode: '3' })).toMatchObject({ ok: true, value: expect.stringMatching(/^.{15}3/) as string });
  });

  it('is none without an item number or the species’ own number', () => {
    expect(codeOf({ uneceItem: null })).toMatchObject({
      refusal: { code: 'unece-item-missing', pointer: '/uneceItem' },
    });
    expect(codeOf({}, [])).toMatchObject({ refusal: { code: 'unece-species-unlisted' } });
  });

  it('reads back as it was built', () => {
    const code = codeOf({ uneceFields: { packing: '5' } });
    expect(code.ok && readUneceCode(code.value, VALUES).ok).toBe(true);
  });
});

describe('what an author chose of the code', () => {
  const faults = (uneceFields: object, stated: Parameters<typeof aContent>[0] = {}) =>
    faultsOfVersion(aContent({ ...stated, uneceFields }), { species: 'beef', values: VALUES }).map(
      ({ code, pointer }) => `${code} at ${pointer ?? ''}`,
    );

  it('is in the lists, or in a field that has none', () => {
    expect(faults({ packing: '5', category: '7', fatThickness: '3' })).toEqual([]);
    expect(faults({ packing: '0', feeding: '00' })).toEqual([]);
  });

  it('is refused field by field', () => {
    expect(faults({ packing: '6', feeding: '7', weightRange: 'x', colour: '1' })).toEqual([
      'unece-field-unknown at /uneceFields/colour',
      'unece-field-digits at /uneceFields/feeding',
      'unece-field-digits at /uneceFields/weightRange',
      'unece-value-unlisted at /uneceFields/packing',
    ]);
    expect(faults({ fatThickness: '3' }, { fatCode: '4' })).toEqual(['unece-fat-differs at /uneceFields/fatThickness']);
  });
});
