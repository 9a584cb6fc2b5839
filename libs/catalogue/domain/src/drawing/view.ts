import type { Point } from './geometry';

/** What a shape stands for; the screen gives each its colour. */
export type Part = 'lean' | 'lean-side' | 'fat' | 'bone' | 'seam' | 'tie' | 'score' | 'grain';

export interface Shape {
  readonly part: Part;
  readonly points: readonly Point[];
  readonly closed: boolean;
}

export type ViewName = 'section' | 'plan' | 'side' | 'thickness' | 'end' | 'cubes';

/** A piece seen from one side, life-size, with the box of its meat at 0, 0. */
export interface View {
  readonly name: ViewName;
  readonly shapes: readonly Shape[];
  /** The box that the measures go by: lean only, without the fat over it. */
  readonly widthMm: number;
  readonly heightMm: number;
  /** Whether the height is written beside it; its width always is written under it. */
  readonly measuresHeight: boolean;
  /** A point in the middle of the fat, where the words about it point to. */
  readonly fatAt: Point | null;
}

export const filled = (part: Part, points: readonly Point[]): Shape => ({ part, points, closed: true });
export const stroked = (part: Part, points: readonly Point[]): Shape => ({ part, points, closed: false });

/** A cover as shapes: none without fat. */
export const fatShapes = (cover: { readonly band: readonly Point[] } | null): Shape[] =>
  cover ? [filled('fat', cover.band)] : [];
