import { shareByLargestRemainder } from '@seamwright/shared/util';
import type { AddedIngredient } from './cutting-scheme';

export interface RecipeShares {
  /** What the recipe starts from, over 1,000,000 of the mixing bowl. */
  readonly inputPpm: number;
  readonly ingredients: readonly { readonly name: string; readonly sharePpm: number; readonly declared: boolean }[];
}

/**
 * What each thing is of the mixing bowl, over 1,000,000; together exactly 1,000,000. A quantity to declare is that of
 * the ingredient when it is used (Regulation (EU) No 1169/2011, article 22 and annex VIII, point 3).
 */
export function recipeShares(ingredients: readonly AddedIngredient[]): RecipeShares {
  const [inputPpm = 1_000_000, ...shares] = shareByLargestRemainder(1_000_000, [
    1_000_000,
    ...ingredients.map(({ ppmOfInput }) => ppmOfInput),
  ]);
  return {
    inputPpm,
    ingredients: ingredients.map(({ name, declared }, at) => ({ name, sharePpm: shares[at] ?? 0, declared })),
  };
}
