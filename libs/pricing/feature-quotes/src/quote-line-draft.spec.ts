import { aPublicSpecification } from './a-public-specification';
import { draftOf, expectedCase, priceOf } from './quote-line-draft';

describe('a line of a quote while it is written', () => {
  it('begins with the usual choices, by the case', () => {
    expect(draftOf(aPublicSpecification()).form.getRawValue()).toEqual({
      chosen: { trim: '6', finish: 'plain' },
      basis: 'case',
      priceMinor: '',
    });
  });

  it('knows what a case will weigh before there is a price, and what it costs after', () => {
    const draft = draftOf(aPublicSpecification());
    expect(expectedCase(draft)).toMatchObject({ weights: { pieces: 4, estimateGrams: 8_000 }, amounts: null });
    draft.form.patchValue({ basis: 'kg', priceMinor: '9.80' });
    expect(expectedCase(draft)).toMatchObject({
      amounts: { minMinor: 7_448, estimateMinor: 7_840, maxMinor: 8_232 },
    });
    draft.form.patchValue({ basis: 'case', priceMinor: '74' });
    expect(expectedCase(draft)).toMatchObject({ amounts: { minMinor: 7_400, maxMinor: 7_400 } });
  });

  it('says why choices that do not go together are refused', () => {
    const draft = draftOf(aPublicSpecification());
    draft.form.controls.chosen.patchValue({ trim: '0', finish: 'tied' });
    expect(expectedCase(draft)).toContain('nothing to tie');
  });

  it.each([
    ['9.80', 980],
    ['£12', 1_200],
    ['0', null],
    ['-3', null],
    ['9.805', null],
    ['soon', null],
    ['', null],
  ])('reads the price %s as %s', (typed, expected) => {
    const draft = draftOf(aPublicSpecification());
    draft.form.controls.priceMinor.setValue(typed);
    expect(priceOf(draft)).toBe(expected);
    expect(draft.form.controls.priceMinor.valid).toBe(expected !== null);
  });
});
