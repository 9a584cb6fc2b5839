import type { OutputKind } from '../cut-words';

/** Cutting only divides; a recipe adds ingredients to what goes in; a blend mixes trims to a band of visual lean. */
export const SCHEME_KINDS = ['cutting', 'recipe', 'blend'] as const;
export type SchemeKind = (typeof SCHEME_KINDS)[number];

/** One thing that comes out. `key` stays the same from version to version, so that tests know it again. */
export interface SchemeOutput {
  readonly key: string;
  readonly name: string;
  readonly kind: OutputKind;
  /** Where a joint product stands in the cut tree; nothing else has a place there. */
  readonly nodeId: string | null;
  /** Of the input's weight, over 1,000,000. */
  readonly yieldPpm: number;
  /** Below zero only for by-products, whose collection may be paid for. */
  readonly valueMinorPerKg: number;
  /** Visual lean of edible trim, per cent: 85 is 85VL. */
  readonly visualLean?: number;
}

/** What a recipe adds, over 1,000,000 of the input's weight. */
export interface AddedIngredient {
  readonly name: string;
  readonly ppmOfInput: number;
  readonly allergens: readonly string[];
  /** Whether its share is to be declared to whoever buys it. */
  readonly declared: boolean;
}

/** A trim of a blend: its visual lean with the tolerance either way, per cent, and its share of the weight. */
export interface BlendPart {
  readonly name: string;
  readonly visualLean: number;
  readonly tolerance: number;
  readonly sharePpm: number;
}

/** The trims of a blend and the band, in per cent, that their visual lean stays within. */
export interface Blend {
  readonly parts: readonly BlendPart[];
  readonly leastLean: number;
  readonly mostLean: number;
}

/** What an author writes of a scheme: one way to break one node of the cut tree. The species stands for the carcase. */
export interface SchemeContent {
  readonly name: string;
  readonly kind: SchemeKind;
  readonly inputNodeId: string;
  readonly outputs: readonly SchemeOutput[];
  readonly ingredients: readonly AddedIngredient[];
  readonly blend: Blend | null;
  readonly note: string;
}

/** A way to break one piece, as far as sums need it: a scheme's or a specification's. */
export interface CuttingStep {
  readonly code: string;
  readonly name: string;
  readonly kind: SchemeKind;
  readonly inputNodeId: string;
  readonly outputs: readonly SchemeOutput[];
  /** What is added, over 1,000,000 of the input. */
  readonly addedPpm: number;
}

/** What a scheme adds to its input in all, over 1,000,000 of it; zero unless it is a recipe. */
export const addedPpm = ({ ingredients }: Pick<SchemeContent, 'ingredients'>): number =>
  ingredients.reduce((sum, { ppmOfInput }) => sum + ppmOfInput, 0);

/** What is lost, over 1,000,000 of the input: all that goes in less all that comes out. Below zero is a fault. */
export function schemeLossPpm(scheme: Pick<SchemeContent, 'outputs' | 'ingredients'>): number {
  return 1_000_000 + addedPpm(scheme) - scheme.outputs.reduce((sum, { yieldPpm }) => sum + yieldPpm, 0);
}

/** The scheme under its code as a step of a chain. */
export const stepOfScheme = (code: string, content: SchemeContent): CuttingStep => ({
  code,
  name: content.name,
  kind: content.kind,
  inputNodeId: content.inputNodeId,
  outputs: content.outputs,
  addedPpm: addedPpm(content),
});
