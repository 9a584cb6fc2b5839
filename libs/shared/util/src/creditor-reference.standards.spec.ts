import { creditorReference, formatCreditorReference, isCreditorReference } from './creditor-reference';

describe('ISO 11649 creditor references', () => {
  // Source: ISO 11649 Annex B, as quoted on a public wiki: 2348231271500 mod 97 = 27, 98 − 27 = 71.
  it('makes RF71 2348 231 of 2348231', () => {
    expect(creditorReference('2348231')).toBe('RF712348231');
    expect(formatCreditorReference('RF712348231')).toBe('RF71 2348 231');
  });

  it.each([
    ['RF18 5390 0754 7034', 'python-stdnum documentation'],
    ['RF18 0000 0000 0539 0075 47034', 'public test: leading zeros change nothing'],
    ['RF48 5000056789012345', 'public page on the reference'],
    ['RF45G72UUR', 'the same page, with letters'],
    ['RF185390075470Y', 'python-stdnum'],
  ])('%s is valid (%s)', (text) => {
    expect(isCreditorReference(text)).toBe(true);
  });

  it.each([
    ['RF17 5390 0754 7034', 'python-stdnum'],
    ['RF35C4', 'public page, printed without a verdict; mod 97 = 82'],
    ['RF214377', 'public page, printed without a verdict; mod 97 = 51'],
    ['RF68 5390 0754 7034', "wiki's paper-format sample, evidently a slip for RF18; mod 97 = 51"],
  ])('%s is invalid (%s)', (text) => {
    expect(isCreditorReference(text)).toBe(false);
  });

  it('makes the check digits of the published valid ones', () => {
    expect(creditorReference('539007547034')).toBe('RF18539007547034');
    expect(creditorReference('5000056789012345')).toBe('RF485000056789012345');
    expect(creditorReference('g72uur')).toBe('RF45G72UUR');
  });
});
