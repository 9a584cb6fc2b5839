import { fitted, type Point } from './geometry';

const STEPS = 180;

/** How a closed outline bulges: `square` from 1 (an ellipse) down to a box at 0; `taper` thins its right end. */
interface Form {
  readonly square: number;
  readonly taper: number;
}

const power = (value: number, exponent: number): number => Math.sign(value) * Math.abs(value) ** exponent;

/** A convex outline that fills exactly width × height, clockwise on the screen. */
function rounded(width: number, height: number, { square, taper }: Form): Point[] {
  const outline = Array.from({ length: STEPS }, (_, step) => {
    const angle = (step / STEPS) * 2 * Math.PI;
    const x = power(Math.cos(angle), square);
    const thin = 1 - taper * ((x + 1) / 2) ** 2;
    return { x, y: power(Math.sin(angle), square) * thin };
  });
  return fitted(outline, width, height);
}

/** The eye of a loin or rib cut across the grain: full at one end, thinner at the other. */
export const eyeOutline = (length: number, width: number): Point[] =>
  rounded(length, width, { square: 0.82, taper: 0.32 });

/** Across a rolled or tied joint. */
export const rollOutline = (width: number, height: number): Point[] =>
  rounded(width, height, { square: 0.94, taper: 0 });

/** Along a joint: a block with soft corners. */
export const blockOutline = (length: number, width: number): Point[] =>
  rounded(length, width, { square: 0.3, taper: 0 });

/** The loin end of a rack seen from the end, thinning towards the ribs. */
export const loinOutline = (width: number, height: number): Point[] =>
  rounded(width, height, { square: 0.85, taper: 0.5 });

/** A leg laid flat, its shank to the right. */
export const legOutline = (length: number, width: number): Point[] =>
  rounded(length, width, { square: 0.8, taper: 0.68 });
