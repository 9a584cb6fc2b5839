import { isoWeekOf, plantDate, weekdayOf } from './plant-date';
import { unwrap } from './result';

// From memory: the examples commonly given for ISO 8601 week dates around the turn of the year.
describe('ISO 8601 weeks', () => {
  it.each([
    ['1977-01-01', 1976, 53, 6],
    ['1978-01-01', 1977, 52, 7],
    ['1978-01-02', 1978, 1, 1],
    ['1980-12-29', 1981, 1, 1],
    ['2008-12-30', 2009, 1, 2],
    ['2010-01-03', 2009, 53, 7],
  ])('%s is in %d, week %d, day %d', (text, year, week, weekday) => {
    const date = unwrap(plantDate(text));
    expect(isoWeekOf(date)).toEqual({ year, week });
    expect(weekdayOf(date)).toBe(weekday);
  });
});
