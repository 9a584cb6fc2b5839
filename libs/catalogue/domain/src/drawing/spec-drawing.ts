import type { DrawnNumbers } from './drawn-numbers';
import { boxOf, moved, scaled, type Point } from './geometry';
import type { Shape, View, ViewName } from './view';
import { viewsOf } from './views';

/** Where the drawing must fit, in millimetres of paper or screen, and how high its writing is. */
export interface Frame {
  readonly widthMm: number;
  /** The most height for the views; writing and weights come on top. */
  readonly heightMm: number;
  readonly textMm: number;
}

/** A measured line with its number: real millimetres, not millimetres of paper. */
export interface Measure {
  readonly mm: number;
  readonly from: Point;
  readonly to: Point;
  readonly text: Point;
  readonly anchor: 'middle' | 'end';
}

export interface Caption {
  readonly view: ViewName;
  readonly at: Point;
}

/** The words about the fat, and the point in it that they mean. */
export interface FatNote {
  readonly mm: number;
  readonly text: Point;
  readonly at: Point;
}

export interface WeightMark {
  readonly grams: number;
  readonly x: number;
}

/** Geometry of a to-scale drawing, in millimetres of paper. */
export interface Drawing {
  readonly widthMm: number;
  readonly heightMm: number;
  readonly textMm: number;
  /** Millimetres of paper for one real millimetre: 0.5 is 1 : 2. */
  readonly scale: number;
  readonly shapes: readonly Shape[];
  readonly measures: readonly Measure[];
  readonly captions: readonly Caption[];
  readonly fatNote: FatNote | null;
  /** A length of `mm` real millimetres to hold against the drawing. */
  readonly ruler: Measure;
  /** Least, nominal and most weight of a piece on one line. */
  readonly weights: {
    readonly y: number;
    readonly min: WeightMark;
    readonly nominal: WeightMark;
    readonly max: WeightMark;
  };
}

/** Views stand beside each other unless below each other they would be so many times larger. */
const WORTH_STACKING = 1.5;

/** Real millimetres for one of paper, the largest drawing first. */
const REDUCTIONS = [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];

/** The drawing of a piece from its numbers, as large as one of the usual scales allows in the frame. Pure. */
export function specDrawing(numbers: DrawnNumbers, frame: Frame): Drawing {
  const views = viewsOf(numbers).map(measured);
  const beside = { stacked: false, scale: scaleFor(views, frame, false) };
  const stacked = { stacked: true, scale: scaleFor(views, { ...frame, heightMm: frame.heightMm * 1.8 }, true) };
  const { stacked: below, scale } = stacked.scale > beside.scale * WORTH_STACKING ? stacked : beside;
  return laidOut(numbers, views, frame, scale, below);
}

interface MeasuredView {
  readonly view: View;
  /** Of everything drawn, life-size. */
  readonly box: ReturnType<typeof boxOf>;
}

const measured = (view: View): MeasuredView => ({ view, box: boxOf(view.shapes.flatMap(({ points }) => points)) });

const wide = ({ box }: MeasuredView): number => box.right - box.left;
const high = ({ box }: MeasuredView): number => box.bottom - box.top;
const total = (lengths: readonly number[]): number => lengths.reduce((sum, length) => sum + length, 0);

/** Room for writing, in heights of a line. */
const LEFT = 4.6;
const ABOVE = 2.6;
const BELOW = 4.2;
const BETWEEN = 3.2;

function scaleFor(views: readonly MeasuredView[], { widthMm, heightMm, textMm }: Frame, stacked: boolean): number {
  const width = stacked ? Math.max(...views.map(wide)) : total(views.map(wide));
  const height = stacked ? total(views.map(high)) : Math.max(...views.map(high));
  const gaps = stacked ? 0 : (views.length - 1) * BETWEEN * textMm;
  const room = widthMm - (LEFT + 1) * textMm - gaps;
  const reduction = REDUCTIONS.find((by) => width / by <= room && height / by <= heightMm);
  return reduction === undefined ? Math.min(room / width, heightMm / height) : 1 / reduction;
}

function laidOut(
  numbers: DrawnNumbers,
  views: readonly MeasuredView[],
  { widthMm, textMm }: Frame,
  scale: number,
  stacked: boolean,
): Drawing {
  const used = stacked
    ? Math.max(...views.map(wide)) * scale
    : total(views.map(wide)) * scale + (views.length - 1) * BETWEEN * textMm;
  const tallest = Math.max(...views.map(high)) * scale;
  const centred = (width: number): number => LEFT * textMm + Math.max(0, (widthMm - (LEFT + 1) * textMm - width) / 2);
  let x = centred(used);
  let y = ABOVE * textMm;
  const placed = views.map((each) => {
    // Beside each other, the views stand on one line.
    const top = stacked ? y : y + tallest - high(each) * scale;
    const at = placedView(each, { x: stacked ? centred(wide(each) * scale) : x, y: top }, scale, textMm);
    if (stacked) y += high(each) * scale + (BELOW + 0.6) * textMm;
    else x += wide(each) * scale + BETWEEN * textMm;
    return at;
  });
  const bottom = stacked ? y + 0.4 * textMm : y + tallest + (BELOW + 1) * textMm;
  return {
    widthMm,
    heightMm: bottom + 5.4 * textMm,
    textMm,
    scale,
    shapes: placed.flatMap(({ shapes }) => shapes),
    measures: placed.flatMap(({ measures }) => measures),
    captions: placed.map(({ caption }) => caption),
    fatNote: fatNoteOf(placed.find(({ fatAt }) => fatAt)?.fatAt ?? null, numbers.fatCoverMm, widthMm, textMm),
    ruler: rulerOf(widthMm, bottom, scale, textMm),
    weights: weightsOf(numbers, widthMm, bottom + 3.2 * textMm, textMm),
  };
}

function placedView({ view, box }: MeasuredView, corner: Point, scale: number, textMm: number) {
  const [dx, dy] = [corner.x - box.left * scale, corner.y - box.top * scale];
  const place = (points: readonly Point[]): Point[] => moved(scaled(points, scale), dx, dy);
  const [width, height] = [view.widthMm * scale, view.heightMm * scale];
  const base = dy + Math.max(height, box.bottom * scale) + 1.3 * textMm;
  const middle = { x: dx + width / 2, y: base + 1.2 * textMm };
  const measures: Measure[] = [
    { mm: view.widthMm, from: { x: dx, y: base }, to: { x: dx + width, y: base }, text: middle, anchor: 'middle' },
  ];
  if (view.measuresHeight) {
    const left = dx + Math.min(0, box.left * scale) - 0.8 * textMm;
    measures.push({
      mm: view.heightMm,
      from: { x: left, y: dy },
      to: { x: left, y: dy + height },
      text: { x: left - 0.5 * textMm, y: dy + height / 2 + 0.35 * textMm },
      anchor: 'end',
    });
  }
  return {
    shapes: view.shapes.map((shape) => ({ ...shape, points: place(shape.points) })),
    measures,
    caption: { view: view.name, at: { x: middle.x, y: middle.y + 1.3 * textMm } },
    fatAt: view.fatAt ? (place([view.fatAt])[0] ?? null) : null,
  };
}

/** Half the room that "fat cover 12 mm at most" takes, in heights of a line. */
const HALF_NOTE = 6;

function fatNoteOf(at: Point | null, mm: number, widthMm: number, textMm: number): FatNote | null {
  const room = HALF_NOTE * textMm;
  return at && { mm, at, text: { x: Math.min(widthMm - room, Math.max(room, at.x + textMm)), y: 1.1 * textMm } };
}

const RULER_LENGTHS = [200, 100, 50, 20, 10];

/** A ruler of a round length, a quarter of the width at most, at the lower left. */
function rulerOf(widthMm: number, y: number, scale: number, textMm: number): Measure {
  const mm = RULER_LENGTHS.find((length) => length * scale <= widthMm / 4) ?? 10;
  const from = { x: textMm, y: y + 0.4 * textMm };
  const to = { x: from.x + mm * scale, y: from.y };
  return { mm, from, to, text: { x: to.x + 0.6 * textMm, y: from.y + 0.35 * textMm }, anchor: 'middle' };
}

/** Where the three weights stand: the span takes the middle of the width, so that their numbers have room. */
function weightsOf(
  { minGrams, nominalGrams, maxGrams }: DrawnNumbers,
  widthMm: number,
  y: number,
  textMm: number,
): Drawing['weights'] {
  const [left, right] = [5 * textMm, widthMm - 5 * textMm];
  const span = maxGrams - minGrams;
  const x = (grams: number): number =>
    span === 0 ? (left + right) / 2 : left + ((grams - minGrams) / span) * (right - left);
  const mark = (grams: number): WeightMark => ({ grams, x: x(grams) });
  return { y, min: mark(minGrams), nominal: mark(nominalGrams), max: mark(maxGrams) };
}
