import * as z from 'zod';

/** The code of a specification: two letters for its species, three digits. */
export const code = z.string().regex(/^[A-Z]{2}-\d{3}$/);
