import { outwardNormals, type Point } from './geometry';

/** A layer of fat on an outline. */
export interface FatCover {
  /** The layer's own closed outline. */
  readonly band: readonly Point[];
  /** Its outer edge, from end to end. */
  readonly outer: readonly Point[];
}

/** Over what part of its length, at each end, a cover runs out. */
const RUN_OUT = 0.14;

const smooth = (share: number): number => {
  const within = Math.min(1, Math.max(0, share));
  return within * within * (3 - 2 * within);
};

/**
 * The fat cover of a convex outline: its upper side moved outwards by exactly the stated millimetres, running out to
 * nothing at both ends. Null without fat.
 */
export function coverOnTop(outline: readonly Point[], fatCoverMm: number): FatCover | null {
  if (fatCoverMm <= 0) return null;
  const normals = outwardNormals(outline);
  const upper = outline
    .map((point, at) => ({ point, normal: normals[at] ?? { x: 0, y: -1 } }))
    .filter(({ normal }) => normal.y < 0)
    .sort((a, b) => a.point.x - b.point.x);
  const outer = upper.map(({ point, normal }, at) => {
    const along = at / (upper.length - 1);
    const mm = fatCoverMm * smooth(Math.min(along, 1 - along) / RUN_OUT);
    return { x: point.x + normal.x * mm, y: point.y + normal.y * mm };
  });
  return { band: [...outer, ...upper.map(({ point }) => point).reverse()], outer };
}

/** A cover of exactly the stated millimetres all round, as on a rolled joint. Null without fat. */
export function coverAllRound(outline: readonly Point[], fatCoverMm: number): FatCover | null {
  if (fatCoverMm <= 0) return null;
  const normals = outwardNormals(outline);
  const outer = outline.map(({ x, y }, at) => ({
    x: x + (normals[at]?.x ?? 0) * fatCoverMm,
    y: y + (normals[at]?.y ?? 0) * fatCoverMm,
  }));
  return { band: outer, outer };
}
