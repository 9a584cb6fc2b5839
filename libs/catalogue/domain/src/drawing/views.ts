import type { DrawingKind } from '../cut-words';
import type { DrawnNumbers } from './drawn-numbers';
import { coverAllRound, coverOnTop, type FatCover } from './fat-cover';
import { moved, rectangle, type Point } from './geometry';
import { blockOutline, eyeOutline, legOutline, loinOutline, rollOutline } from './outline';
import { grainIn, rollSeam, scoresOver, tiesAlong } from './seams';
import { fatShapes, filled, stroked, type Shape, type View } from './view';

/** The views of a piece, the one that says most first. */
export function viewsOf(numbers: DrawnNumbers): readonly View[] {
  return VIEWS[numbers.kind](numbers);
}

const isTied = ({ finish }: DrawnNumbers): boolean => finish === 'tied' || finish === 'rolled';

/** The middle of the fat over the middle of a piece. */
function fatMiddle(cover: FatCover | null, fatCoverMm: number, share = 0.72): Point | null {
  const at = cover?.outer[Math.round(share * (cover.outer.length - 1))];
  return at ? { x: at.x, y: at.y + fatCoverMm / 2 } : null;
}

/** A steak seen on its cut face, and its thickness with the fat on top. */
function steak(numbers: DrawnNumbers): View[] {
  const { lengthMm: length, widthMm: width, heightMm: height, fatCoverMm } = numbers;
  const lean = eyeOutline(length, width);
  const cover = coverOnTop(lean, fatCoverMm);
  const bone = numbers.boneState === 'bone-in' ? [filled('bone', loinBone(length, width))] : [];
  const face: View = {
    name: 'section',
    shapes: [...fatShapes(cover), filled('lean', lean), ...grainIn(length, width, 26), ...bone],
    widthMm: length,
    heightMm: width,
    measuresHeight: true,
    fatAt: fatMiddle(cover, fatCoverMm),
  };
  const edge: View = {
    name: 'thickness',
    shapes: [
      ...(fatCoverMm > 0 ? [filled('fat', rectangle(0, -fatCoverMm, height, fatCoverMm))] : []),
      filled('lean-side', rectangle(0, 0, height, width)),
      ...(isTied(numbers)
        ? [
            stroked('tie', [
              { x: height / 2, y: -fatCoverMm },
              { x: height / 2, y: width },
            ]),
          ]
        : []),
    ],
    widthMm: height,
    heightMm: width,
    measuresHeight: false,
    fatAt: null,
  };
  return [face, edge];
}

/** The backbone left under a chop: a flat body with a spur up into the meat. */
function loinBone(length: number, width: number): Point[] {
  return [
    { x: length * 0.02, y: width * 0.5 },
    { x: length * 0.1, y: width * 0.42 },
    { x: length * 0.17, y: width * 0.6 },
    { x: length * 0.42, y: width * 0.84 },
    { x: length * 0.4, y: width * 0.93 },
    { x: length * 0.2, y: width * 0.88 },
    { x: length * 0.06, y: width * 0.76 },
  ];
}

/** A joint seen across and along: rolled it has fat all round and its seam, else fat on top. */
function joint(numbers: DrawnNumbers): View[] {
  const { lengthMm: length, widthMm: width, heightMm: height, fatCoverMm } = numbers;
  const rolled = numbers.finish === 'rolled';
  const lean = rollOutline(width, height);
  const cover = rolled ? coverAllRound(lean, fatCoverMm) : coverOnTop(lean, fatCoverMm);
  const across: View = {
    name: 'section',
    shapes: [
      ...fatShapes(cover),
      filled('lean', lean),
      ...(rolled ? [rollSeam(width, height)] : grainIn(width, height, 18)),
      ...(numbers.boneState === 'bone-in' ? [filled('bone', bladeAcross(width, height))] : []),
    ],
    widthMm: width,
    heightMm: height,
    measuresHeight: true,
    // Round a roll the cover begins at the right; three quarters round is its top.
    fatAt: fatMiddle(cover, fatCoverMm, rolled ? 0.78 : 0.72),
  };
  const body = blockOutline(length, height);
  const along = coverOnTop(body, fatCoverMm);
  const side: View = {
    name: 'side',
    shapes: [
      ...fatShapes(along),
      filled('lean-side', body),
      ...(isTied(numbers) ? tiesAlong(length, height, fatCoverMm) : []),
      ...(numbers.finish === 'scored' ? scoresOver(length, height) : []),
    ],
    widthMm: length,
    heightMm: height,
    measuresHeight: false,
    fatAt: null,
  };
  return [across, side];
}

/** A blade bone cut through: thin, slanting, with its spine. */
function bladeAcross(width: number, height: number): Point[] {
  return [
    { x: width * 0.22, y: height * 0.6 },
    { x: width * 0.48, y: height * 0.52 },
    { x: width * 0.52, y: height * 0.34 },
    { x: width * 0.57, y: height * 0.5 },
    { x: width * 0.78, y: height * 0.44 },
    { x: width * 0.78, y: height * 0.51 },
    { x: width * 0.23, y: height * 0.68 },
  ];
}

/** What part of a French-trimmed rack's width still carries meat. */
const MEAT_OF_FRENCHED = 0.62;

/** How much of the length between two ribs the bone itself takes. */
export const RIB_SHARE = 0.3;

/** How much of a rack's width carries meat, in millimetres. */
export const meatWidthOfRack = ({ widthMm, finish }: DrawnNumbers): number =>
  finish === 'french-trimmed' ? widthMm * MEAT_OF_FRENCHED : widthMm;

export const ribsOfRack = ({ ribs, boneState }: DrawnNumbers): number => (boneState === 'bone-in' ? (ribs ?? 0) : 0);

/** A rack seen on its rib side, and its loin end with the fat over it. */
function rack(numbers: DrawnNumbers): View[] {
  const { lengthMm: length, widthMm: width, heightMm: height, fatCoverMm } = numbers;
  const meat = meatWidthOfRack(numbers);
  const count = ribsOfRack(numbers);
  const thick = RIB_SHARE * (length / count);
  const ribs = Array.from({ length: count }, (_, at) => {
    const x = ((at + 0.5) / count) * length;
    return filled('bone', moved(blockOutline(thick, width * 0.82), x - thick / 2, width * 0.18));
  });
  const side: View = {
    name: 'side',
    shapes: [filled('lean', blockOutline(length, meat)), ...ribs],
    widthMm: length,
    heightMm: width,
    measuresHeight: true,
    fatAt: null,
  };
  const lean = loinOutline(meat, height);
  const cover = coverOnTop(lean, fatCoverMm);
  const rib = filled('bone', [
    { x: meat * 0.3, y: height * 0.94 },
    { x: meat * 0.75, y: height * 0.8 },
    { x: width, y: height * 0.62 },
    { x: width, y: height * 0.72 },
    { x: meat * 0.75, y: height * 0.92 },
    { x: meat * 0.3, y: height * 1.02 },
  ]);
  const end: View = {
    name: 'end',
    shapes: [...fatShapes(cover), filled('lean-side', lean), ...(count > 0 ? [rib] : [])],
    widthMm: width,
    heightMm: height,
    measuresHeight: false,
    fatAt: fatMiddle(cover, fatCoverMm, 0.4),
  };
  return [side, end];
}

/** A flat piece seen from above, and its thickness with the fat on one side. */
function flat(numbers: DrawnNumbers): View[] {
  const { lengthMm: length, widthMm: width, heightMm: height, fatCoverMm } = numbers;
  const scored = numbers.finish === 'scored';
  const above: View = {
    name: 'plan',
    shapes: [
      filled(fatCoverMm > 0 ? 'fat' : 'lean', blockOutline(length, width)),
      ...(scored ? scoresOver(length, width) : fatCoverMm > 0 ? [] : grainIn(length, width, 30)),
    ],
    widthMm: length,
    heightMm: width,
    measuresHeight: true,
    fatAt: null,
  };
  const layers: Shape[] = [0.38, 0.7].map((share) =>
    stroked('grain', [
      { x: height * share, y: width * 0.06 },
      { x: height * (share + 0.06), y: width * 0.5 },
      { x: height * share, y: width * 0.94 },
    ]),
  );
  const edge: View = {
    name: 'thickness',
    shapes: [
      ...(fatCoverMm > 0 ? [filled('fat', rectangle(-fatCoverMm, 0, fatCoverMm, width))] : []),
      filled('lean-side', rectangle(0, 0, height, width)),
      ...layers,
    ],
    widthMm: height,
    heightMm: width,
    measuresHeight: false,
    fatAt: fatCoverMm > 0 ? { x: -fatCoverMm / 2, y: width * 0.12 } : null,
  };
  return [above, edge];
}

/** A leg laid flat, its shank to the right, and across its thickest part. */
function leg(numbers: DrawnNumbers): View[] {
  const { lengthMm: length, widthMm: width, heightMm: height, fatCoverMm } = numbers;
  const boneIn = numbers.boneState === 'bone-in';
  const lean = legOutline(length, width);
  const cover = coverOnTop(lean, fatCoverMm);
  const above: View = {
    name: 'plan',
    shapes: [
      ...fatShapes(cover),
      filled('lean', lean),
      ...(boneIn ? [filled('bone', legBone(length, width))] : grainIn(length * 0.7, width, 18)),
      ...(isTied(numbers) ? tiesAlong(length * 0.8, width, fatCoverMm) : []),
    ],
    widthMm: length,
    heightMm: width,
    measuresHeight: true,
    fatAt: fatMiddle(cover, fatCoverMm, 0.5),
  };
  const section = rollOutline(height, width);
  const across: View = {
    name: 'end',
    shapes: [
      ...fatShapes(coverOnTop(section, fatCoverMm)),
      filled('lean-side', section),
      ...(boneIn ? [filled('bone', moved(rollOutline(20, 20), height / 2 - 10, width * 0.52))] : []),
    ],
    widthMm: height,
    heightMm: width,
    measuresHeight: false,
    fatAt: null,
  };
  return [above, across];
}

/** Thigh and shank bone with the joints at their ends. */
function legBone(length: number, width: number): Point[] {
  const thick = Math.min(22, width * 0.13);
  const middle = width * 0.55;
  const profile: [number, number][] = [
    [0.2, 0.9],
    [0.26, 1.25],
    [0.33, 0.6],
    [0.56, 0.6],
    [0.63, 1.2],
    [0.7, 0.7],
    [0.98, 0.55],
  ];
  const upper = profile.map(([along, half]) => ({ x: length * along, y: middle - (thick * half) / 2 }));
  const lower = profile.map(([along, half]) => ({ x: length * along, y: middle + (thick * half) / 2 }));
  return [...upper, ...lower.reverse()];
}

/** A few of the cubes, or balls for mince, life-size: their edge is the height. */
function dice({ heightMm: edge, finish }: DrawnNumbers): View[] {
  const gap = edge * 0.55;
  const deep = edge * 0.35;
  const count = 4;
  const cube = (x: number): Shape[] => [
    filled('lean-side', [
      { x, y: 0 },
      { x: x + deep, y: -deep },
      { x: x + edge + deep, y: -deep },
      { x: x + edge, y: 0 },
    ]),
    filled('lean-side', [
      { x: x + edge, y: 0 },
      { x: x + edge + deep, y: -deep },
      { x: x + edge + deep, y: edge - deep },
      { x: x + edge, y: edge },
    ]),
    filled('lean', rectangle(x, 0, edge, edge)),
  ];
  const ball = (x: number): Shape[] => [filled('lean', moved(rollOutline(edge, edge), x, 0))];
  const one = finish === 'minced' ? ball : cube;
  return [
    {
      name: 'cubes',
      shapes: Array.from({ length: count }, (_, at) => one(at * (edge + gap))).flat(),
      widthMm: edge,
      heightMm: edge,
      measuresHeight: false,
      fatAt: null,
    },
  ];
}

const VIEWS: Readonly<Record<DrawingKind, (numbers: DrawnNumbers) => View[]>> = { steak, joint, rack, flat, leg, dice };
