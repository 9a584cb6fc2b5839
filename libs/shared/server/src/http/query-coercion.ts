import * as z from 'zod';

/** The innermost schema under optional, default and nullable. */
function core(schema: z.core.$ZodType): z.core.$ZodType {
  let at = schema;
  while (at instanceof z.ZodOptional || at instanceof z.ZodDefault || at instanceof z.ZodNullable) at = at.unwrap();
  return at;
}

function coerce(schema: z.core.$ZodType, value: unknown): unknown {
  const at = core(schema);
  if (at instanceof z.ZodArray) {
    const items = Array.isArray(value) ? value : [value];
    return items.map((item) => coerce(at.element, item));
  }
  if (typeof value !== 'string') return value;
  if (at instanceof z.ZodNumber) return /^-?\d{1,15}$/.test(value) ? Number(value) : value;
  if (at instanceof z.ZodBoolean) return value === 'true' ? true : value === 'false' ? false : value;
  return value;
}

/**
 * Turns the texts of a query string into what the schema's fields are (numbers, booleans, lists), so that wire schemas
 * stay plain JSON. What does not look right is left as text, and the schema refuses it by name.
 */
export function coerceQuery(schema: z.ZodObject, query: Readonly<Record<string, unknown>>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(query).map(([name, value]) => {
      const field = schema.shape[name];
      return [name, field ? coerce(field, value) : value];
    }),
  );
}
