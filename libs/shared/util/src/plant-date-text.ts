import { isPlantDate, type PlantDate } from './plant-date';
import { ok, refuse, type Result } from './result';

const STYLES = {
  short: { weekday: 'short', day: 'numeric', month: 'short' },
  long: { weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' },
} as const satisfies Record<string, Intl.DateTimeFormatOptions>;

const formats = new Map<string, Intl.DateTimeFormat>();

/**
 * The day in words: `short` "Tue 1 Dec" (no year: for days near now), `long` "Tuesday 1 December 2026". Browsers and
 * Node differ on an English comma after the weekday; it is left out, so that screen, mail and document say the same.
 */
export function formatPlantDate(date: PlantDate, style: keyof typeof STYLES, locale = 'en-GB'): string {
  const key = `${locale} ${style}`;
  let format = formats.get(key);
  if (format === undefined) {
    format = new Intl.DateTimeFormat(locale, { ...STYLES[style], timeZone: 'UTC' });
    formats.set(key, format);
  }
  const parts = format.formatToParts(new Date(`${date}T00:00:00Z`));
  return parts.map(({ value }, index) => (index === 1 && locale.startsWith('en') ? ' ' : value)).join('');
}

/** A day typed as 2026-12-03 or 3/12/2026 (day before month). Refuses `date-unreadable` (text). */
export function parsePlantDate(text: string): Result<PlantDate> {
  const [, day = '', month = '', year = ''] = /^(\d{1,2})[/.](\d{1,2})[/.](\d{4})$/.exec(text) ?? [];
  const written = year ? `${year}-${month.padStart(2, '0')}-${day.padStart(2, '0')}` : text;
  return isPlantDate(written) ? ok(written) : refuse('date-unreadable', { text: text.slice(0, 40) });
}
