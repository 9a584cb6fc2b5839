/** Fat covers that are looked for together, from the leanest: up to so many millimetres. */
export const FAT_BANDS = ['none', 'to-3', 'to-6', 'to-12', 'over-12'] as const;
export type FatBand = (typeof FAT_BANDS)[number];

const FAT_UP_TO: readonly [FatBand, number][] = [
  ['none', 0],
  ['to-3', 3],
  ['to-6', 6],
  ['to-12', 12],
];

/** The band of a fat cover in millimetres. */
export const fatBandOf = (mm: number): FatBand => FAT_UP_TO.find(([, most]) => mm <= most)?.[0] ?? 'over-12';

/** Portion weights that are counted together. */
export const PORTION_BANDS = ['under-150', '150-299', '300-599', '600-1499', '1500-4999', '5000-up'] as const;
export type PortionBand = (typeof PORTION_BANDS)[number];

const PORTION_UNDER: readonly [PortionBand, number][] = [
  ['under-150', 150],
  ['150-299', 300],
  ['300-599', 600],
  ['600-1499', 1_500],
  ['1500-4999', 5_000],
];

/** The band of a nominal weight in grams. */
export const portionBandOf = (nominal: number): PortionBand =>
  PORTION_UNDER.find(([, under]) => nominal < under)?.[0] ?? '5000-up';

/** The grams that a band holds, both ends included; null where it has no end. */
export function portionBandGrams(band: PortionBand): { from: number | null; to: number | null } {
  const at = PORTION_BANDS.indexOf(band);
  const [before, own] = [PORTION_UNDER[at - 1], PORTION_UNDER[at]];
  return { from: before ? before[1] : null, to: own ? own[1] - 1 : null };
}
