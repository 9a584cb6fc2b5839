import { areaOf, type Point } from '../drawing/geometry';

/** A point as written in a map: [x, y] in the map's own plane, y downwards. */
export type At = readonly [x: number, y: number];

/** A line between two named points, through the points between them. */
export type Line = readonly [from: string, ...through: At[], to: string];

export interface RegionPlan {
  readonly key: string;
  /** The lines round it, clockwise on the screen; a leading "-" walks a line backwards. */
  readonly round: readonly string[];
  /** Where its name stands. */
  readonly label: At;
  /** The name stands beside the region, which is too small to hold it. */
  readonly beside?: boolean;
}

/** A drawing whose regions share their borders: each line is drawn once, so that neighbours meet exactly. */
export interface MapPlan {
  readonly width: number;
  readonly height: number;
  readonly points: Readonly<Record<string, At>>;
  /** Lines of the outline, clockwise from any of them. */
  readonly outline: Readonly<Record<string, Line>>;
  /** Lines inside it. */
  readonly seams: Readonly<Record<string, Line>>;
  readonly regions: readonly RegionPlan[];
  /** Parts that lie under the surface, each with an outline of its own; drawn over the regions. */
  readonly inner?: readonly { readonly key: string; readonly outline: readonly At[]; readonly label: At }[];
}

/** A cubic curve: from, two handles, to. */
export type Curve = readonly [Point, Point, Point, Point];

export interface MapRegion {
  readonly key: string;
  readonly curves: readonly Curve[];
  readonly label: Point;
  readonly beside: boolean;
  /** Lies under the surface of other regions. */
  readonly inner: boolean;
}

export interface PlanarMap {
  readonly width: number;
  readonly height: number;
  readonly outline: readonly Curve[];
  readonly seams: readonly (readonly Curve[])[];
  readonly regions: readonly MapRegion[];
}

/** Lays the curves of a plan: the outline smooth through its corners, each seam smooth between its ends. */
export function planarMap(plan: MapPlan): PlanarMap {
  const lines = new Map([...outlineLines(plan), ...seamLines(plan)]);
  const lineNamed = (name: string): readonly Curve[] => {
    const line = lines.get(name.replace(/^-/, ''));
    if (!line) throw new Error(`There is no line "${name}" on the map`);
    return name.startsWith('-') ? reversed(line) : line;
  };
  const regions = plan.regions.map(({ key, round, label, beside }) => ({
    key,
    curves: round.flatMap(lineNamed),
    label: pointAt(label),
    beside: beside ?? false,
    inner: false,
  }));
  const inner = (plan.inner ?? []).map(({ key, outline, label }) => ({
    key,
    curves: closedCurve(outline.map(pointAt)),
    label: pointAt(label),
    beside: false,
    inner: true,
  }));
  return {
    width: plan.width,
    height: plan.height,
    outline: Object.keys(plan.outline).flatMap(lineNamed),
    seams: Object.keys(plan.seams).map(lineNamed),
    regions: [...regions, ...inner],
  };
}

const pointAt = ([x, y]: At): Point => ({ x, y });

function pointsOf({ points }: MapPlan, [from, ...rest]: Line): Point[] {
  const named = (name: string): Point => {
    const at = points[name];
    if (!at) throw new Error(`There is no point "${name}" on the map`);
    return pointAt(at);
  };
  return [named(from), ...rest.map((step) => (typeof step === 'string' ? named(step) : pointAt(step)))];
}

/** The whole outline is one closed curve, cut again into its lines. */
function outlineLines(plan: MapPlan): [string, readonly Curve[]][] {
  const lines = Object.entries(plan.outline).map(([name, line]) => ({ name, points: pointsOf(plan, line) }));
  const all = closedCurve(lines.flatMap(({ points }) => points.slice(0, -1)));
  let from = 0;
  return lines.map(({ name, points }) => {
    const curves = all.slice(from, (from += points.length - 1));
    return [name, curves];
  });
}

const seamLines = (plan: MapPlan): [string, readonly Curve[]][] =>
  Object.entries(plan.seams).map(([name, line]) => [name, openCurve(pointsOf(plan, line))]);

const reversed = (curves: readonly Curve[]): Curve[] =>
  curves.map(([from, leaving, arriving, to]): Curve => [to, arriving, leaving, from]).reverse();

/** A smooth curve through the points and back to the first (Catmull and Rom's spline as cubic curves). */
function closedCurve(points: readonly Point[]): Curve[] {
  const at = (index: number): Point => points[(index + points.length) % points.length] as Point;
  return points.map((_, index) => curveBetween(at(index - 1), at(index), at(index + 1), at(index + 2)));
}

function openCurve(points: readonly Point[]): Curve[] {
  const at = (index: number): Point => points[Math.min(Math.max(index, 0), points.length - 1)] as Point;
  return points.slice(1).map((_, index) => curveBetween(at(index - 1), at(index), at(index + 1), at(index + 2)));
}

const TENSION = 1 / 6;

/** From `from` to `to`; the points before and after give the directions. */
function curveBetween(before: Point, from: Point, to: Point, after: Point): Curve {
  const reach = Math.hypot(to.x - from.x, to.y - from.y);
  return [from, handle(from, before, to, reach), handle(to, after, from, reach), to];
}

/** The handle at `point`, towards `next`, along the line from `last` to `next`; never longer than half the way. */
function handle(point: Point, last: Point, next: Point, reach: number): Point {
  const [dx, dy] = [(next.x - last.x) * TENSION, (next.y - last.y) * TENSION];
  const length = Math.hypot(dx, dy);
  const short = length > reach / 2 ? reach / 2 / length : 1;
  return { x: point.x + dx * short, y: point.y + dy * short };
}

const STEPS = 24;

/** Points along the curves, the last of each left out: a closed outline when the curves close. */
export const flattened = (curves: readonly Curve[]): Point[] =>
  curves.flatMap((curve) => Array.from({ length: STEPS }, (_, step) => pointOn(curve, step / STEPS)));

function pointOn([a, b, c, d]: Curve, t: number): Point {
  const s = 1 - t;
  const [wa, wb, wc, wd] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t];
  return { x: wa * a.x + wb * b.x + wc * c.x + wd * d.x, y: wa * a.y + wb * b.y + wc * c.y + wd * d.y };
}

/** Area inside closed curves, in square units of the map. */
export const areaInside = (curves: readonly Curve[]): number => areaOf(flattened(curves));
