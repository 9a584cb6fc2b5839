import * as z from 'zod';

/** Plain JSON pieces that every contract uses: no transforms, dates or bigints on the wire. */
export const id = z.uuid();
export const plantDay = z.iso
  .date()
  // Sums of days and weeks on either side stay within what a date can be.
  .refine((day) => day >= '1900-01-01' && day < '3000-01-01', { message: 'A year from 1900 to 2999.' })
  .meta({ description: "A day in the plant's time zone, YYYY-MM-DD" });
export const instant = z.iso.datetime().meta({ description: 'An instant, ISO 8601 in UTC' });
export const minor = z.int().meta({ description: 'Whole minor units of the document currency' });
export const gramsWire = z.int().nonnegative().meta({ description: 'Whole grams' });
export const ppmWire = z.int().meta({ description: 'Parts per million' });
export const currency = z
  .string()
  .regex(/^[A-Z]{3}$/)
  .meta({ description: 'ISO 4217 code' });
export const rowVersion = z.int().positive().meta({ description: 'Sent back in If-Match when editing' });
export const email = z.email().max(254);
// Control characters have no place in what a person typed, and the database can't keep a NUL.
const NO_CONTROLS = /^\P{Cc}*$/u;
const ONLY_BREAKS_AND_TABS = /^(?:\P{Cc}|[\n\t])*$/u;

/** One line of text that a person typed, without control characters. */
export const line = (max = 200) =>
  z.string().trim().min(1).max(max).regex(NO_CONTROLS, 'Take out the control characters.');
/** Several lines of text, may be empty; of control characters only line breaks and tabs. */
export const note = (max = 2000) =>
  z.string().trim().max(max).regex(ONLY_BREAKS_AND_TABS, 'Take out the control characters.');

export const pageQuery = {
  cursor: z.string().max(400).optional(),
  limit: z.int().min(1).max(200).default(50),
} as const;

/** A page of a list; `nextCursor` is null on the last one. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.strictObject({ items: z.array(item), nextCursor: z.string().nullable() });
