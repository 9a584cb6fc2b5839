import type { Point } from './geometry';
import { stroked, type Shape } from './view';

/** How far apart ties and scores are set, in millimetres. Common practice, no published source. */
export const TIE_INTERVAL_MM = 40;
export const SCORE_INTERVAL_MM = 20;

/** A line from one end to the other, pulled towards a point beside it (a quadratic Bézier curve). */
function bent(from: Point, towards: Point, to: Point): Point[] {
  const steps = 8;
  return Array.from({ length: steps + 1 }, (_, step) => {
    const share = step / steps;
    const [a, b, c] = [(1 - share) ** 2, 2 * share * (1 - share), share ** 2];
    return { x: a * from.x + b * towards.x + c * to.x, y: a * from.y + b * towards.y + c * to.y };
  });
}

/** Short marks in the lean that show which way the fibres run; spread evenly by the golden ratio, the same every time. */
export function grainIn(width: number, height: number, count: number): Shape[] {
  return Array.from({ length: count }, (_, at) => {
    const across = 0.2 + 0.55 * ((at * 0.618034) % 1);
    const down = 0.22 + 0.56 * ((at + 0.5) / count);
    const reach = width * (0.018 + 0.014 * ((at * 0.381966) % 1));
    const middle: Point = { x: across * width, y: down * height };
    return stroked(
      'grain',
      bent(
        { x: middle.x - reach, y: middle.y + reach * 0.2 },
        { x: middle.x, y: middle.y - reach * 0.3 },
        { x: middle.x + reach, y: middle.y },
      ),
    );
  });
}

/** The line along which a boned piece was rolled up, seen across the roll. */
export function rollSeam(width: number, height: number): Shape {
  const turns = 1.6;
  const steps = 60;
  const points = Array.from({ length: steps + 1 }, (_, step) => {
    const share = step / steps;
    const angle = share * turns * 2 * Math.PI;
    const reach = 0.08 + 0.36 * share;
    return { x: width * (0.5 + reach * Math.cos(angle)), y: height * (0.5 + reach * Math.sin(angle)) };
  });
  return stroked('seam', points);
}

/** Strings round a piece seen from the side, at their interval from its middle outwards. */
export function tiesAlong(length: number, height: number, over: number): Shape[] {
  const count = Math.max(2, Math.round(length / TIE_INTERVAL_MM));
  return Array.from({ length: count }, (_, at) => {
    const x = ((at + 0.5) / count) * length;
    const bend = Math.min(4, height * 0.05);
    return stroked('tie', bent({ x, y: -over }, { x: x + 2 * bend, y: height / 2 }, { x, y: height }));
  });
}

/** Parallel cuts both ways over a flat piece, at their interval, kept inside by a margin. */
export function scoresOver(length: number, width: number): Shape[] {
  const margin = Math.min(length, width) * 0.07;
  const [right, bottom] = [length - margin, width - margin];
  const lines: Shape[] = [];
  for (let start = margin - bottom + SCORE_INTERVAL_MM; start < right; start += SCORE_INTERVAL_MM) {
    const from = Math.max(margin, start);
    const to = Math.min(right, start + bottom - margin);
    if (to - from < SCORE_INTERVAL_MM / 2) continue;
    const down = margin + (from - start);
    lines.push(
      stroked('score', [
        { x: from, y: down },
        { x: to, y: down + to - from },
      ]),
    );
    lines.push(
      stroked('score', [
        { x: from, y: width - down },
        { x: to, y: width - down - (to - from) },
      ]),
    );
  }
  return lines;
}
