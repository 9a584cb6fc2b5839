/** A pattern for `ilike` that finds the typed text anywhere; what has a meaning in patterns is taken as typed. */
export const likePattern = (text: string): string => `%${text.replace(/[\\%_]/g, '\\$&')}%`;
