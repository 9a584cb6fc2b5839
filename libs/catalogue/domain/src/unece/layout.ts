/** The fields of the UNECE meat code by the names that the house calls them, in the order of the code. */
export const UNECE_FIELDS = [
  'species',
  'item',
  'unused',
  'refrigeration',
  'category',
  'production',
  'feeding',
  'slaughter',
  'postSlaughter',
  'fatThickness',
  'quality',
  'weightRange',
  'packing',
  'conformity',
] as const;
export type UneceField = (typeof UNECE_FIELDS)[number];

/** The fields that an author chooses; the others follow from the version, or are not used. */
export const CHOSEN_UNECE_FIELDS = [
  'category',
  'production',
  'feeding',
  'slaughter',
  'postSlaughter',
  'fatThickness',
  'quality',
  'weightRange',
  'packing',
  'conformity',
] as const satisfies readonly UneceField[];
export type ChosenUneceField = (typeof CHOSEN_UNECE_FIELDS)[number];

/** A field's place in the code. `seen` is false where the field was not read in a standard but is known from memory. */
export interface UneceFieldLayout {
  /** Counted from 1. */
  readonly number: number;
  readonly field: UneceField;
  readonly digits: number;
  /** Where it begins in the code, counted from 0. */
  readonly start: number;
  readonly seen: boolean;
}

const WIDTHS: Readonly<Record<UneceField, { digits: number; seen: boolean }>> = {
  species: { digits: 2, seen: true },
  item: { digits: 4, seen: true },
  unused: { digits: 2, seen: true },
  refrigeration: { digits: 1, seen: true },
  category: { digits: 1, seen: false },
  production: { digits: 1, seen: false },
  feeding: { digits: 2, seen: false },
  slaughter: { digits: 1, seen: false },
  postSlaughter: { digits: 1, seen: false },
  fatThickness: { digits: 1, seen: false },
  quality: { digits: 1, seen: false },
  weightRange: { digits: 1, seen: false },
  packing: { digits: 1, seen: false },
  conformity: { digits: 1, seen: false },
};

const widthBefore = (at: number): number =>
  UNECE_FIELDS.slice(0, at).reduce((sum, field) => sum + WIDTHS[field].digits, 0);

/**
 * The 14 fields of the code. That there are 14 in 20 characters, and fields 1 to 4, were read in the UNECE standard for
 * llama and alpaca meat (2006, section 4.1); fields 5 to 14 are from memory and agree with the total.
 */
export const UNECE_LAYOUT: readonly UneceFieldLayout[] = UNECE_FIELDS.map((field, at) => ({
  number: at + 1,
  field,
  ...WIDTHS[field],
  start: widthBefore(at),
}));

/** How many characters the code has. */
export const UNECE_LENGTH = widthBefore(UNECE_FIELDS.length);

/** How many digits a field has. */
export const uneceDigits = (field: UneceField): number => WIDTHS[field].digits;

/** Whether the text is as many digits as the field has. */
export const fillsUneceField = (field: UneceField, text: string): boolean =>
  text.length === uneceDigits(field) && /^[0-9]+$/.test(text);
