import fc from 'fast-check';
import { DateTime } from 'luxon';
import { instantAt, isClockTime, plantToday } from './plant-clock';
import { addDays, plantDate, type PlantDate } from './plant-date';
import { unwrap } from './result';

const day = (text: string): PlantDate => unwrap(plantDate(text));
const at = (date: string, time: string, zone: string): string => instantAt(day(date), time, zone).toISOString();

const zones = fc.constantFrom('Europe/London', 'America/New_York', 'Australia/Lord_Howe');
const pad = (value: number): string => String(value).padStart(2, '0');
const times = fc
  .tuple(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }))
  .map(([hour, minute]) => `${pad(hour)}:${pad(minute)}`);
/** Any day from 1975 on, and as often one of those near a change of the clock in 2026. */
const dates = fc.oneof(
  fc.integer({ min: 0, max: 30_000 }).map((days) => addDays(day('1975-01-01'), days)),
  fc
    .tuple(
      fc.constantFrom('2026-03-29', '2026-10-25', '2026-03-08', '2026-11-01', '2026-04-05', '2026-10-04'),
      fc.integer({ min: -1, max: 1 }),
    )
    .map(([change, days]) => addDays(day(change), days)),
);

describe('today at the plant', () => {
  it("turns over at midnight by the plant's clock", () => {
    expect(plantToday(new Date('2026-07-01T22:59:59.999Z'), 'Europe/London')).toBe('2026-07-01');
    expect(plantToday(new Date('2026-07-01T23:00:00Z'), 'Europe/London')).toBe('2026-07-02');
    expect(plantToday(new Date('2026-12-01T00:00:00Z'), 'Europe/London')).toBe('2026-12-01');
    expect(plantToday(new Date('2026-12-01T04:59:59Z'), 'America/New_York')).toBe('2026-11-30');
  });

  it('agrees with a date library at any instant', () => {
    const instants = fc.date({ min: new Date('1970-01-01'), max: new Date('2100-01-01'), noInvalidDate: true });
    fc.assert(
      fc.property(instants, zones, (now, zone) => {
        expect(plantToday(now, zone)).toBe(DateTime.fromJSDate(now, { zone }).toISODate());
      }),
    );
  });
});

describe('the instant of a time at the plant', () => {
  it('follows summer time', () => {
    expect(at('2026-07-01', '14:00', 'Europe/London')).toBe('2026-07-01T13:00:00.000Z');
    expect(at('2026-12-01', '14:00', 'Europe/London')).toBe('2026-12-01T14:00:00.000Z');
  });

  it('moves a time that is skipped to the first instant after the change', () => {
    for (const time of ['01:00', '01:30', '01:59', '02:00']) {
      expect(at('2026-03-29', time, 'Europe/London')).toBe('2026-03-29T01:00:00.000Z');
    }
    expect(at('2026-03-08', '02:30', 'America/New_York')).toBe('2026-03-08T07:00:00.000Z');
    // Lord Howe goes forward by half an hour.
    expect(at('2026-10-04', '02:15', 'Australia/Lord_Howe')).toBe('2026-10-03T15:30:00.000Z');
    // Samoa left out a whole day when it crossed the date line.
    expect(at('2011-12-30', '12:00', 'Pacific/Apia')).toBe('2011-12-30T10:00:00.000Z');
  });

  it('takes the first of a time that comes twice', () => {
    expect(at('2026-10-25', '01:30', 'Europe/London')).toBe('2026-10-25T00:30:00.000Z');
    expect(at('2026-10-25', '02:00', 'Europe/London')).toBe('2026-10-25T02:00:00.000Z');
    expect(at('2026-11-01', '01:30', 'America/New_York')).toBe('2026-11-01T05:30:00.000Z');
    expect(at('2026-04-05', '01:45', 'Australia/Lord_Howe')).toBe('2026-04-04T14:45:00.000Z');
  });

  it('agrees with a date library wherever the clock shows the time', () => {
    fc.assert(
      fc.property(dates, times, zones, (date, time, zone) => {
        const [hour, minute] = time.split(':').map(Number);
        const theirs = DateTime.fromISO(`${date}T${time}`, { zone });
        const earliest = Math.min(...theirs.getPossibleOffsets().map((same) => same.toMillis()));
        const ours = instantAt(date, time, zone);
        if (theirs.hour === hour && theirs.minute === minute) {
          expect(ours.getTime()).toBe(earliest);
        } else {
          const shown = DateTime.fromJSDate(ours, { zone });
          expect(shown.offset).not.toBe(shown.minus({ milliseconds: 1 }).offset);
          expect(shown.toISODate()).toBe(date);
          expect(shown.toFormat('HH:mm') > time).toBe(true);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('falls on the day it was asked for', () => {
    fc.assert(
      fc.property(dates, times, zones, (date, time, zone) => {
        expect(plantToday(instantAt(date, time, zone), zone)).toBe(date);
      }),
    );
  });

  it('needs a time of day and a zone that there is', () => {
    for (const time of ['24:00', '9:00', '09:60', '09:00:00', '']) {
      expect(isClockTime(time)).toBe(false);
      expect(() => instantAt(day('2026-12-01'), time, 'Europe/London')).toThrow(RangeError);
    }
    expect(isClockTime('23:59')).toBe(true);
    expect(() => instantAt(day('2026-12-01'), '09:00', 'Europe/Nowhere')).toThrow(RangeError);
  });
});
