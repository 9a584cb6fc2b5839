import { plantDate } from './plant-date';
import { formatPlantDate, parsePlantDate } from './plant-date-text';
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

describe('a day as typed', () => {
  it('is read as the standard writes it, or day before month', () => {
    expect(parsePlantDate('2026-12-03')).toEqual({ ok: true, value: '2026-12-03' });
    expect(parsePlantDate('3/12/2026')).toEqual({ ok: true, value: '2026-12-03' });
    expect(parsePlantDate('03.12.2026')).toEqual({ ok: true, value: '2026-12-03' });
  });

  it('is refused where it never was, or is no day', () => {
    for (const text of ['30/2/2026', '2026-02-30', 'tomorrow', ''])
      expect(parsePlantDate(text)).toEqual({ ok: false, refusal: { code: 'date-unreadable', params: { text } } });
  });
});
