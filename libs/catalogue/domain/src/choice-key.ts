import type { ChosenValues } from './choices';

/**
 * The canonical key of a chosen set: keys sorted, `finish=tied;trim=6`; empty without choices. Two orders for the same
 * thing have the same key and are added up on the cutting list.
 */
export function choiceKey(chosen: ChosenValues): string {
  return Object.entries(chosen)
    .sort(([left], [right]) => (left < right ? -1 : left > right ? 1 : 0))
    .map(([key, value]) => `${key}=${value}`)
    .join(';');
}
