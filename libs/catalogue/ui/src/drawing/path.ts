import type { Point } from '@seamwright/catalogue/domain';

const at = (value: number): string => value.toFixed(2);

/** An SVG path through the points. */
export function pathOf(points: readonly Point[], closed: boolean): string {
  const [first, ...rest] = points;
  if (!first) return '';
  const lines = rest.map(({ x, y }) => `L${at(x)} ${at(y)}`).join('');
  return `M${at(first.x)} ${at(first.y)}${lines}${closed ? 'Z' : ''}`;
}
