import * as z from 'zod';

/** An RFC 9457 problem document. `code` is the refusal's stable name; `errors` point at fields by JSON pointer. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  instance: z.string(),
  code: z.string(),
  errors: z.array(z.object({ pointer: z.string(), message: z.string() })).default([]),
});
export type Problem = z.infer<typeof problem>;

export const PROBLEM_MEDIA_TYPE = 'application/problem+json';
