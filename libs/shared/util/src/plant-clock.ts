import { isPlantDate, type PlantDate } from './plant-date';

const DAY_MS = 86_400_000;
const clocks = new Map<string, Intl.DateTimeFormat>();

/** The day it is at the plant. `zone` is an IANA name; throws RangeError when it is not known. */
export function plantToday(now: Date, zone: string): PlantDate {
  const today = new Date(wallClock(now.getTime(), zone)).toISOString().slice(0, 10);
  if (!isPlantDate(today)) {
    throw new RangeError('A date must lie between 1900 and 9999');
  }
  return today;
}

/** Whether the text is a time of day, HH:MM from 00:00 to 23:59. */
export function isClockTime(text: string): boolean {
  return /^(?:[01]\d|2[0-3]):[0-5]\d$/.test(text);
}

/**
 * The instant at which the plant's clock shows a time (HH:MM) on a day. A time that is skipped when clocks go forward
 * is the first instant after the change; one that comes twice when they go back is the first of the two.
 * Throws RangeError when the time is not HH:MM or the zone is not known.
 */
export function instantAt(date: PlantDate, time: string, zone: string): Date {
  if (!isClockTime(time)) {
    throw new RangeError(`A time of day must be HH:MM, not ${time}`);
  }
  const wanted = Date.parse(`${date}T${time}:00Z`);
  const before = offsetAt(wanted - DAY_MS, zone);
  const after = offsetAt(wanted + DAY_MS, zone);
  // The larger offset gives the earlier instant, which is the one to take when the time comes twice.
  for (const offset of [Math.max(before, after), Math.min(before, after)]) {
    if (wallClock(wanted - offset, zone) === wanted) {
      return new Date(wanted - offset);
    }
  }
  return new Date(firstInstantWithOffset(after, wanted - after, wanted - before, zone));
}

/** Halves the span between an instant before the change and one at or after it until the change itself is left. */
function firstInstantWithOffset(offset: number, before: number, atOrAfter: number, zone: string): number {
  let [low, high] = [before, atOrAfter];
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (offsetAt(middle, zone) === offset) {
      high = middle;
    } else {
      low = middle;
    }
  }
  return high;
}

function offsetAt(instant: number, zone: string): number {
  return wallClock(instant, zone) - instant;
}

/** What the zone's clock shows at an instant, as if it were UTC, in milliseconds. */
function wallClock(instant: number, zone: string): number {
  const shown: Partial<Record<Intl.DateTimeFormatPartTypes, number>> = {};
  for (const { type, value } of clockOf(zone).formatToParts(instant)) {
    shown[type] = Number(value);
  }
  const { year = 0, month = 0, day = 0, hour = 0, minute = 0, second = 0 } = shown;
  const milliseconds = ((instant % 1000) + 1000) % 1000;
  return Date.UTC(year, month - 1, day, hour, minute, second, milliseconds);
}

function clockOf(zone: string): Intl.DateTimeFormat {
  let clock = clocks.get(zone);
  if (clock === undefined) {
    clock = new Intl.DateTimeFormat('en-GB-u-ca-gregory-nu-latn', {
      timeZone: zone,
      hourCycle: 'h23',
      year: 'numeric',
      month: 'numeric',
      day: 'numeric',
      hour: 'numeric',
      minute: 'numeric',
      second: 'numeric',
    });
    clocks.set(zone, clock);
  }
  return clock;
}
