import type { Blend, AddedIngredient, SchemeKind } from '@seamwright/catalogue/domain';

/** What comes out, in thousandths of the input; joint products by the key of their place in the cut tree. */
export type OutputData =
  | { readonly joint: string; readonly name: string; readonly perMille: number }
  | { readonly trim: number; readonly name?: string; readonly perMille: number; readonly value: number }
  | { readonly waste: string; readonly perMille: number; readonly value: number };

/** A scheme of the demo; its input by the key of the cut tree, where a species stands for its carcase. */
export interface SchemeData {
  readonly code: string;
  readonly name: string;
  readonly input: string;
  readonly kind?: SchemeKind;
  readonly outputs: readonly OutputData[];
  readonly ingredients?: readonly AddedIngredient[];
  readonly blend?: Blend;
  readonly note?: string;
}

export const joint = (key: string, name: string, perMille: number): OutputData => ({ joint: key, name, perMille });
/** Edible trim of a visual lean, worth so many minor units a kilogram. */
export const trim = (lean: number, perMille: number, value: number, name?: string): OutputData => ({
  trim: lean,
  perMille,
  value,
  ...(name === undefined ? {} : { name }),
});
export const bone = (perMille: number): OutputData => ({ waste: 'Bone', perMille, value: -8 });
export const fat = (perMille: number): OutputData => ({ waste: 'Fat', perMille, value: 12 });
export const waste = (name: string, perMille: number, value: number): OutputData => ({ waste: name, perMille, value });
