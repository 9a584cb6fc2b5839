import fc from 'fast-check';
import { DRAWING_KINDS } from '../cut-words';
import type { DrawnNumbers } from './drawn-numbers';
import { coverAllRound, coverOnTop } from './fat-cover';
import { boxOf, distance, type Point } from './geometry';
import { impliedGrams } from './implied-weight';
import { eyeOutline, rollOutline } from './outline';
import { specDrawing, type Drawing, type Frame } from './spec-drawing';

const STEAK: DrawnNumbers = {
  kind: 'steak',
  lengthMm: 148,
  widthMm: 78,
  heightMm: 28,
  fatCoverMm: 12,
  ribs: null,
  boneState: 'boneless',
  finish: 'plain',
  nominalGrams: 280,
  minGrams: 266,
  maxGrams: 294,
};
const FRAME: Frame = { widthMm: 200, heightMm: 110, textMm: 3.5 };

const drawn = (stated: Partial<DrawnNumbers> = {}, frame: Partial<Frame> = {}): Drawing =>
  specDrawing({ ...STEAK, ...stated }, { ...FRAME, ...frame });
const pointsOf = (drawing: Drawing, part: string): Point[][] =>
  drawing.shapes.filter((shape) => shape.part === part).map(({ points }) => [...points]);

/** How far a point is from an outline, measured to its edges. */
function toOutline(point: Point, outline: readonly Point[]): number {
  const gaps = outline.map((a, at) => {
    const b = outline[(at + 1) % outline.length] ?? a;
    const length = distance(a, b) || 1;
    const along = ((point.x - a.x) * (b.x - a.x) + (point.y - a.y) * (b.y - a.y)) / length ** 2;
    const share = Math.min(1, Math.max(0, along));
    return distance(point, { x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y) });
  });
  return Math.min(...gaps);
}

describe('a drawing to scale', () => {
  it('shows a 12 mm fat cover as 12 mm at its scale', () => {
    const drawing = drawn();
    const lean = pointsOf(drawing, 'lean')[0] ?? [];
    const [fat = [], edgeFat = []] = pointsOf(drawing, 'fat');
    const thickest = Math.max(...fat.map((point) => toOutline(point, lean)));
    expect(thickest / drawing.scale).toBeCloseTo(12, 1);
    const edge = boxOf(edgeFat);
    expect((edge.bottom - edge.top) / drawing.scale).toBeCloseTo(12, 6);
  });

  it('shows length, width and thickness in proportion', () => {
    const drawing = drawn();
    const face = boxOf(pointsOf(drawing, 'lean')[0] ?? []);
    expect((face.right - face.left) / drawing.scale).toBeCloseTo(148, 6);
    expect((face.bottom - face.top) / drawing.scale).toBeCloseTo(78, 6);
    const edge = boxOf(pointsOf(drawing, 'lean-side')[0] ?? []);
    expect((edge.right - edge.left) / drawing.scale).toBeCloseTo(28, 6);
    for (const { mm, from, to } of [...drawing.measures, drawing.ruler]) {
      expect(distance(from, to) / drawing.scale).toBeCloseTo(mm, 6);
    }
  });

  it('is as large as a usual scale allows, smaller on a phone', () => {
    expect(drawn({}, { widthMm: 260 }).scale).toBe(1);
    const phone = drawn({}, { widthMm: 92, heightMm: 60 });
    expect(phone.scale).toBeLessThan(0.7);
    expect(phone.textMm).toBe(3.5);
  });

  it('keeps everything inside its frame, for any piece and width', () => {
    const piece = fc.record({
      kind: fc.constantFrom(...DRAWING_KINDS),
      lengthMm: fc.integer({ min: 8, max: 500 }),
      widthMm: fc.integer({ min: 8, max: 300 }),
      heightMm: fc.integer({ min: 8, max: 150 }),
      fatCoverMm: fc.integer({ min: 0, max: 25 }),
      finish: fc.constantFrom('plain', 'scored', 'tied', 'rolled', 'french-trimmed', 'diced', 'minced'),
      boneState: fc.constantFrom('bone-in', 'boneless'),
    });
    fc.assert(
      fc.property(piece, fc.integer({ min: 85, max: 260 }), (stated, widthMm) => {
        const drawing = drawn({ ...stated, ribs: 8 } as Partial<DrawnNumbers>, { widthMm });
        const box = boxOf(drawing.shapes.flatMap(({ points }) => points));
        expect(box.left).toBeGreaterThanOrEqual(-1e-6);
        expect(box.top).toBeGreaterThanOrEqual(-1e-6);
        expect(box.right).toBeLessThanOrEqual(widthMm + 1e-6);
        expect(box.bottom).toBeLessThanOrEqual(drawing.heightMm);
        expect([box.left, box.right, drawing.heightMm, drawing.scale].every(Number.isFinite)).toBe(true);
      }),
    );
  });

  it('leaves out fat, bone and string where there are none, and shows them where there are', () => {
    const bare = drawn({ fatCoverMm: 0 });
    expect([pointsOf(bare, 'fat'), pointsOf(bare, 'bone'), pointsOf(bare, 'tie'), bare.fatNote]).toEqual([
      [],
      [],
      [],
      null,
    ]);
    expect(pointsOf(drawn({ kind: 'rack', boneState: 'bone-in', ribs: 8 }), 'bone')).toHaveLength(8 + 1);
    expect(pointsOf(drawn({ boneState: 'bone-in' }), 'bone')).toHaveLength(1);
    // A 215 mm joint tied every 40 mm has five strings.
    expect(pointsOf(drawn({ kind: 'joint', finish: 'rolled', lengthMm: 215 }), 'tie')).toHaveLength(5);
    expect(
      pointsOf(drawn({ kind: 'flat', finish: 'scored', lengthMm: 400, widthMm: 230 }), 'score').length,
    ).toBeGreaterThan(10);
    expect(drawn().fatNote?.mm).toBe(12);
  });

  it('puts the three weights in order on their line', () => {
    const { min, nominal, max } = drawn({ nominalGrams: 270 }).weights;
    expect([min.grams, nominal.grams, max.grams]).toEqual([266, 270, 294]);
    expect((nominal.x - min.x) / (max.x - min.x)).toBeCloseTo(4 / 28, 9);
    const exact = drawn({ minGrams: 280, maxGrams: 280 }).weights;
    expect(exact.min.x).toBe(exact.max.x);
  });

  it('is the same every time', () => {
    expect(drawn()).toEqual(drawn());
  });
});

describe('a fat cover', () => {
  it('lies exactly as thick as stated over the middle and runs out at both ends', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 25 }), (mm) => {
        const lean = eyeOutline(148, 78);
        const outer = coverOnTop(lean, mm)?.outer ?? [];
        const off = outer.map((point) => toOutline(point, lean));
        const middle = off.slice(Math.ceil(off.length * 0.2), Math.floor(off.length * 0.8));
        for (const each of middle) expect(Math.abs(each - mm)).toBeLessThan(0.1);
        expect(Math.max(off[0] ?? 1, off.at(-1) ?? 1)).toBeLessThan(0.1);
      }),
    );
  });

  it('lies all round a rolled joint', () => {
    const lean = rollOutline(106, 86);
    const off = (coverAllRound(lean, 8)?.outer ?? []).map((point) => toOutline(point, lean));
    expect(Math.min(...off)).toBeCloseTo(8, 1);
    expect(Math.max(...off)).toBeCloseTo(8, 1);
  });
});

describe('the weight that dimensions imply', () => {
  it('is area × length × density for a joint, its soft corners taken off', () => {
    const joint = { ...STEAK, kind: 'joint', fatCoverMm: 0, lengthMm: 200, widthMm: 100, heightMm: 100 } as const;
    // A cylinder of 100 mm across and 200 mm long in lean of 1.06 g/cm³ weighs 1,665 g.
    const implied = impliedGrams(joint) ?? 0;
    expect(implied).toBeGreaterThan(1_665 * 0.9);
    expect(implied).toBeLessThan(1_665);
  });

  it('grows with thickness in proportion and with fat', () => {
    const of = (stated: Partial<DrawnNumbers>) => impliedGrams({ ...STEAK, ...stated }) ?? 0;
    expect(of({ heightMm: 56 }) / of({})).toBeCloseTo(2, 1);
    expect(of({ fatCoverMm: 12 })).toBeGreaterThan(of({ fatCoverMm: 6 }));
  });

  it('has no answer for loose cubes', () => {
    expect(impliedGrams({ ...STEAK, kind: 'dice' })).toBeNull();
  });
});
