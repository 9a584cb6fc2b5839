import { z } from 'zod';

/** Plain JSON pieces that every contract uses: no transforms, dates or bigints on the wire. */
export const id = z.uuid();
export const plantDay = z.iso.date().meta({ description: "A day in the plant's time zone, YYYY-MM-DD" });
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
/** One line of text that a person typed. */
export const line = (max = 200) => z.string().trim().min(1).max(max);
/** Several lines of text, may be empty. */
export const note = (max = 2000) => z.string().trim().max(max);

export const pageQuery = {
  cursor: z.string().max(400).optional(),
  limit: z.int().min(1).max(200).default(50),
} as const;

/** A page of a list; `nextCursor` is null on the last one. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.strictObject({ items: z.array(item), nextCursor: z.string().nullable() });
