import { plantDate } from './plant-date';
import { formatPlantDate } from './plant-date-text';
import { unwrap } from './result';

describe('a day in words', () => {
  const date = unwrap(plantDate('2026-12-01'));

  it('is short for days near now', () => {
    expect(formatPlantDate(date, 'short')).toBe('Tue 1 Dec');
  });

  it("has its year when long, in the reader's language", () => {
    expect(formatPlantDate(date, 'long')).toBe('Tuesday 1 December 2026');
    expect(formatPlantDate(date, 'long', 'de-DE')).toBe('Dienstag, 1. Dezember 2026');
  });
});
