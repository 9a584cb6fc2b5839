import fc from 'fast-check';
import { DateTime } from 'luxon';
import {
  addDays,
  daysBetween,
  endOfMonth,
  endOfWeek,
  isoWeekOf,
  isPlantDate,
  plantDate,
  weekdayOf,
  type PlantDate,
} from './plant-date';
import { unwrap } from './result';

const day = (text: string): PlantDate => unwrap(plantDate(text));
const dates = fc
  .date({ min: new Date('1900-01-01'), max: new Date('2300-12-31'), noInvalidDate: true })
  .map((date) => day(date.toISOString().slice(0, 10)));
const calendar = (date: PlantDate): DateTime => DateTime.fromISO(date, { zone: 'utc' });

describe('a day at the plant', () => {
  it.each(['2026-12-01', '2028-02-29', '2000-02-29', '1900-01-01', '9999-12-31'])('can be %s', (text) => {
    expect(plantDate(text)).toEqual({ ok: true, value: text });
    expect(isPlantDate(text)).toBe(true);
  });

  it.each([
    '2026-02-29',
    '1900-02-29',
    '2026-13-01',
    '2026-00-10',
    '2026-04-31',
    '26-12-01',
    '2026-12-1',
    '',
    '1899-12-31',
  ])('cannot be %p', (text) => {
    expect(plantDate(text)).toEqual({ ok: false, refusal: { code: 'date-unreadable', params: { text } } });
    expect(isPlantDate(text)).toBe(false);
  });

  it('has no time, no zone and nothing around it', () => {
    for (const text of ['2026-12-01T00:00:00Z', ' 2026-12-01', '2026-12-01\n']) {
      expect(isPlantDate(text)).toBe(false);
    }
  });

  it('moves by days over month, year and leap day', () => {
    expect(addDays(day('2026-12-31'), 1)).toBe('2027-01-01');
    expect(addDays(day('2028-03-01'), -1)).toBe('2028-02-29');
    expect(() => addDays(day('9999-12-31'), 1)).toThrow(RangeError);
    expect(() => addDays(day('1900-01-01'), -1)).toThrow(RangeError);
    expect(() => addDays(day('2026-12-01'), Number.MAX_SAFE_INTEGER)).toThrow(RangeError);
    expect(() => addDays(day('2026-12-01'), 0.5)).toThrow(RangeError);
  });

  it('counts back the days it moved by', () => {
    fc.assert(
      fc.property(dates, fc.integer({ min: -100_000, max: 100_000 }), (date, days) => {
        fc.pre(daysBetween(day('1900-01-01'), date) + days >= 0);
        expect(daysBetween(date, addDays(date, days))).toBe(days);
        expect(addDays(addDays(date, days), -days)).toBe(date);
      }),
    );
  });

  it('agrees with a date library on weekday, week, and ends of month and week', () => {
    fc.assert(
      fc.property(dates, (date) => {
        const same = calendar(date);
        expect(weekdayOf(date)).toBe(same.weekday);
        expect(isoWeekOf(date)).toEqual({ year: same.weekYear, week: same.weekNumber });
        expect(endOfMonth(date)).toBe(same.endOf('month').toISODate());
        expect(endOfWeek(date)).toBe(same.endOf('week').toISODate());
      }),
    );
  });
});
