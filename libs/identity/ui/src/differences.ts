import type { NewerValue } from './newer-state';

/** The fields in which a newer state differs from what was read, as labelled values. */
export function differences<T extends object>(
  read: T,
  newer: T,
  fields: readonly { readonly key: keyof T; readonly label: string; readonly say?: (value: T) => string }[],
): NewerValue[] {
  return fields
    .filter(({ key }) => JSON.stringify(read[key]) !== JSON.stringify(newer[key]))
    .map(({ key, label, say }) => ({ label, value: say ? say(newer) : String(newer[key] ?? '–') }));
}
