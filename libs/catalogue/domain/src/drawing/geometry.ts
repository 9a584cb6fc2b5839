/** Plane geometry in millimetres: x to the right, y downwards. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** Area inside a closed outline, by the shoelace formula. */
export function areaOf(outline: readonly Point[]): number {
  const twice = outline.reduce((sum, point, at) => {
    const next = outline[(at + 1) % outline.length] ?? point;
    return sum + point.x * next.y - next.x * point.y;
  }, 0);
  return Math.abs(twice) / 2;
}

export function boxOf(points: readonly Point[]): Box {
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  return { left: Math.min(...xs), top: Math.min(...ys), right: Math.max(...xs), bottom: Math.max(...ys) };
}

export const distance = (a: Point, b: Point): number => Math.hypot(a.x - b.x, a.y - b.y);

/** Stretches an outline to fill exactly the box from 0, 0 to width, height. */
export function fitted(outline: readonly Point[], width: number, height: number): Point[] {
  const { left, top, right, bottom } = boxOf(outline);
  return outline.map(({ x, y }) => ({
    x: ((x - left) / (right - left)) * width,
    y: ((y - top) / (bottom - top)) * height,
  }));
}

/** The outward normal at each point of a convex outline that runs clockwise on the screen. */
export function outwardNormals(outline: readonly Point[]): Point[] {
  return outline.map((point, at) => {
    const before = outline[(at + outline.length - 1) % outline.length] ?? point;
    const after = outline[(at + 1) % outline.length] ?? point;
    const [dx, dy] = [after.x - before.x, after.y - before.y];
    const length = Math.hypot(dx, dy);
    return { x: dy / length, y: -dx / length };
  });
}

export const moved = (points: readonly Point[], dx: number, dy: number): Point[] =>
  points.map(({ x, y }) => ({ x: x + dx, y: y + dy }));

export const scaled = (points: readonly Point[], by: number): Point[] =>
  points.map(({ x, y }) => ({ x: x * by, y: y * by }));

/** A rectangle, clockwise from its upper left corner. */
export const rectangle = (x: number, y: number, width: number, height: number): Point[] => [
  { x, y },
  { x: x + width, y },
  { x: x + width, y: y + height },
  { x, y: y + height },
];
