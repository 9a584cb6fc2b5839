import * as z from 'zod';
import { invalidParameter } from './errors';
import type { FormFields } from './form-body';

/** Pieces from which each resource declares its form parameters: every value arrives as text. */
export const text = z.string().min(1).max(5000);
/** Text that an empty value clears. */
export const clearableText = z
  .string()
  .max(5000)
  .transform((value) => (value === '' ? null : value));
export const wholeNumber = z
  .string()
  .regex(/^-?\d{1,15}$/, 'Invalid integer')
  .transform(Number);
/** An amount to charge, hold or return: whole minor units, at least 1. */
export const amount = wholeNumber.refine((value) => value >= 1, 'Invalid positive integer');
export const flag = z.enum(['true', 'false']).transform((value) => value === 'true');
export const currency = z
  .string()
  .regex(/^[a-zA-Z]{3}$/, 'Invalid currency')
  .transform((value) => value.toLowerCase());
export const metadata = z.union([z.literal(''), z.record(z.string().max(40), z.string().max(500))]);

/** Keys and values the integrator hangs on an object. */
export type Metadata = Record<string, string>;

const postalFields = ['city', 'country', 'line1', 'line2', 'postal_code', 'state'] as const;
export const address = z
  .strictObject({
    city: clearableText.optional(),
    country: clearableText.optional(),
    line1: clearableText.optional(),
    line2: clearableText.optional(),
    postal_code: clearableText.optional(),
    state: clearableText.optional(),
  })
  .transform((given) => Object.fromEntries(postalFields.map((field) => [field, given[field] ?? null])));
export const shipping = z.strictObject({ address, name: text, phone: clearableText.optional() });

/** New metadata over old: an empty value removes its key, an empty whole removes all. */
export function mergeMetadata(current: Metadata, given: z.infer<typeof metadata> | undefined): Metadata {
  if (given === undefined) return current;
  if (given === '') return {};
  return Object.fromEntries(Object.entries({ ...current, ...given }).filter(([, value]) => value !== ''));
}

/** `['a', 'b', 0]` → `a[b][0]`, the way the API names a parameter. */
function bracketed(path: PropertyKey[]): string {
  return path.map((segment, index) => (index === 0 ? String(segment) : `[${String(segment)}]`)).join('');
}

function valueAt(input: unknown, path: PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, segment) =>
      typeof value === 'object' && value !== null ? (value as Record<PropertyKey, unknown>)[segment] : undefined,
    input,
  );
}

/**
 * Checks a form against its schema and gives the typed parameters.
 * @throws ApiError 400 that names the first parameter that is unknown, missing or wrong
 */
export function readParameters<Schema extends z.ZodType>(schema: Schema, input: FormFields): z.output<Schema> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  const issue = result.error.issues[0];
  if (!issue) throw result.error;
  if (issue.code === 'unrecognized_keys') {
    const param = bracketed([...issue.path, issue.keys[0] ?? '']);
    throw invalidParameter(`Received unknown parameter: ${param}`, param, 'parameter_unknown');
  }
  const param = bracketed(issue.path);
  if (valueAt(input, issue.path) === undefined) {
    throw invalidParameter(`Missing required param: ${param}.`, param, 'parameter_missing');
  }
  throw invalidParameter(`Invalid ${param}: ${issue.message}`, param, 'parameter_invalid');
}
