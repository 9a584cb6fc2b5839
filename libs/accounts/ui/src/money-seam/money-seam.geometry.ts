import { comesIn, fromPaidOut, goesOut, type FlowKey, type FlowPart, type MoneyFlow } from './money-flow';

/** A ribbon of money; `width` is its amount in pixels. */
export interface Ribbon {
  readonly key: FlowKey;
  readonly path: string;
  readonly width: number;
}

/** Where ribbons begin or end. */
export interface Post {
  readonly key: FlowKey;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** A word with its amount under it; `y` is the baseline of the word. */
export interface FlowLabel extends FlowPart {
  readonly x: number;
  readonly y: number;
  readonly anchor: 'start' | 'end';
}

/** Where the seam is broken: money that nothing explains. */
export interface SeamBreak {
  readonly key: FlowKey;
  readonly x: number;
  readonly y: number;
}

export interface SeamPicture {
  readonly width: number;
  readonly height: number;
  readonly ribbons: readonly Ribbon[];
  readonly posts: readonly Post[];
  readonly labels: readonly FlowLabel[];
  readonly breaks: readonly SeamBreak[];
}

/** Below this the flow runs down instead of across. Pixels. */
export const ACROSS_FROM = 820;
/** The height of a word with its amount, and what the thinnest ribbon is drawn with. Pixels. */
export const LABEL = 44;
const THINNEST = 1.5;
const POST = 8;

/** Along the flow and across it: the same drawing turned gives the narrow one. */
interface Places {
  readonly source: number;
  readonly ends: Readonly<Partial<Record<FlowKey, number>>>;
  readonly bank: number;
  readonly top: number;
  readonly across: number;
  readonly gap: number;
}

const round = (pixels: number): number => Math.round(pixels * 10) / 10;
const sum = (numbers: readonly number[]): number => numbers.reduce((total, each) => total + each, 0);

/**
 * Draws a week of card money for a width in pixels: where there is room from left to right, else from top to bottom.
 * The widths of ribbons are in proportion to their amounts, but none is thinner than can be seen.
 */
export function moneySeam(flow: MoneyFlow, width: number): SeamPicture {
  const sides = [comesIn(flow), goesOut(flow)];
  const most = Math.max(1, ...sides.map((parts) => sum(parts.map(({ minor }) => minor))));
  return width >= ACROSS_FROM ? drawAcross(flow, width, most) : drawDown(flow, width, most);
}

function drawAcross(flow: MoneyFlow, width: number, most: number): SeamPicture {
  const [source, bank] = [132, width - 140];
  // Without a payout the flow ends at the processor, and has the whole width to get there.
  const middle = flow.paidOutMinor > 0 ? source + Math.round((bank - source) * 0.46) : bank;
  const onTheWay = (share: number) => source + Math.round((middle - source) * share);
  const after = (share: number) => middle + Math.round((bank - middle) * share);
  const ends = {
    'paid-out': middle,
    closing: middle,
    opening: middle,
    other: onTheWay(0.88),
    fees: onTheWay(0.62),
    refunds: onTheWay(0.34),
    'bank-less': after(0.62),
    'bank-more': after(0.8),
  };
  const places: Places = { source, ends, bank, top: 56, across: 150, gap: 24 };
  const drawn = draw(flow, places, most);
  const post = postOf(drawn.posts);
  const left = stacked(
    comesIn(flow).map((part) => ({ part, at: post(part.key, 'in') })),
    source - 12,
  );
  const labels: FlowLabel[] = [...left];
  const besideMiddle = (x: number) => labels.filter((label) => label.x === x && label.anchor === 'start');
  const outward = (key: FlowKey, minor: number) => {
    const at = post(key, 'out');
    if (!at) return;
    const x = at.u + POST + 6;
    if (key === 'paid-out') labels.push({ key, minor, x, y: places.top - 34, anchor: 'start' });
    else if (key === 'closing' || key === 'opening')
      labels.push({ key, minor, x, y: belowLabels(besideMiddle(x), at.v + at.size / 2 - 4), anchor: 'start' });
    else labels.push({ key, minor, x: at.u + POST, y: at.v + at.size + 20, anchor: 'end' });
  };
  goesOut(flow).forEach(({ key, minor }) => outward(key, minor));
  const right = stacked(
    [
      { part: { key: 'bank' as const, minor: flow.inBankMinor }, at: post('bank', 'out') },
      { part: { key: 'on-its-way' as const, minor: flow.onItsWayMinor }, at: post('on-its-way', 'out') },
    ],
    bank + POST + 8,
    'start',
  );
  labels.push(...right);
  // Below the ribbon of what is on its way, which bends across there.
  const clear = 22 + (flow.onItsWayMinor > 0 ? places.gap : 0);
  for (const { key, u, v } of drawn.breaks) {
    const minor = minorOfBreak(flow, key);
    if (key === 'cards-differ')
      labels.push({ key, minor, x: source - 12, y: belowLabels(left, v + 20), anchor: 'end' });
    else if (key === 'bank-less') labels.push({ key, minor, x: u + 16, y: v + clear, anchor: 'start' });
    else labels.push({ key, minor, x: u - 10, y: v + clear + (flow.bankLessMinor > 0 ? LABEL : 0), anchor: 'start' });
  }
  return picture(drawn, width, labels, 'across');
}

function drawDown(flow: MoneyFlow, width: number, most: number): SeamPicture {
  const across = Math.round(Math.min(width * 0.3, 130));
  const source = 12;
  let row = source + 14;
  const rows = new Map<string, number>();
  const next = (name: string): number => {
    rows.set(name, row);
    row += LABEL + 6;
    return rows.get(name) ?? row;
  };
  comesIn(flow).forEach(({ key }) => next(`in ${key}`));
  if (flow.cardsDifferMinor > 0) next('cards-differ');
  const ends: Partial<Record<FlowKey, number>> = {};
  // The shortest way first.
  for (const { key } of goesOut(flow).toReversed()) ends[key] = next(`out ${key}`);
  if (flow.bankLessMinor > 0) ends['bank-less'] = next('bank-less');
  if (flow.bankMoreMinor > 0) ends['bank-more'] = next('bank-more');
  if (flow.onItsWayMinor > 0) next('on-its-way');
  const inBank = flow.paidOutMinor > 0 || flow.inBankMinor > 0;
  const bank = next('bank');
  const drawn = draw(flow, { source, ends, bank, top: 0, across, gap: 14 }, most);
  const column = Math.ceil(Math.max(across, ...drawn.posts.map(({ v, size }) => v + size)) + 22);
  const at = (key: FlowKey, name: string, minor: number): FlowLabel[] => {
    const y = rows.get(name);
    return y === undefined ? [] : [{ key, minor, x: column, y, anchor: 'start' }];
  };
  const labels = [
    ...comesIn(flow).flatMap(({ key, minor }) => at(key, `in ${key}`, minor)),
    ...goesOut(flow).flatMap(({ key, minor }) => at(key, `out ${key}`, minor)),
    ...(['cards-differ', 'bank-less', 'bank-more'] as const).flatMap((key) => at(key, key, minorOfBreak(flow, key))),
    ...at('on-its-way', 'on-its-way', flow.onItsWayMinor),
    ...(inBank ? at('bank', 'bank', flow.inBankMinor) : []),
  ];
  return picture(drawn, width, labels, 'down');
}

interface Drawn {
  readonly ribbons: readonly { key: FlowKey; from: Edge; to: Edge; size: number }[];
  readonly posts: readonly { key: FlowKey; side: 'in' | 'out'; u: number; v: number; size: number }[];
  readonly breaks: readonly { key: FlowKey; u: number; v: number }[];
}

interface Edge {
  readonly u: number;
  readonly v: number;
}

/** The flow in its own directions: `u` along it, `v` across it. */
function draw(flow: MoneyFlow, { source, ends, bank, top, across, gap }: Places, most: number): Drawn {
  const size = (minor: number): number => (minor === 0 ? 0 : Math.max(THINNEST, (minor * across) / most));
  const ribbons: Drawn['ribbons'][number][] = [];
  const posts: Drawn['posts'][number][] = [];
  const breaks: Drawn['breaks'][number][] = [];
  let v = top;
  for (const { key, minor } of comesIn(flow)) {
    posts.push({ key, side: 'in', u: source, v, size: size(minor) });
    v += size(minor);
  }
  if (flow.cardsDifferMinor > 0) breaks.push({ key: 'cards-differ', u: source + POST / 2, v: v + 10 });
  v = top;
  let aside = 0;
  for (const { key, minor } of goesOut(flow)) {
    const end = ends[key] ?? bank;
    const to = { u: end, v: v + aside };
    ribbons.push({ key, from: { u: source + POST, v }, to, size: size(minor) });
    posts.push({ key, side: 'out', ...to, size: size(minor) });
    v += size(minor);
    aside += aside === 0 ? gap : gap / 2;
  }
  const middle = ends['paid-out'];
  v = top;
  let bankBottom = top;
  if (middle !== undefined)
    for (const { key, minor } of fromPaidOut(flow)) {
      const from = { u: middle + POST, v };
      const to = { u: ends[key] ?? bank, v: key === 'on-its-way' && v > top ? v + gap : v };
      ribbons.push({ key, from, to, size: size(minor) });
      if (key === 'bank-less') breaks.push({ key, u: to.u, v: v + size(minor) / 2 });
      else posts.push({ key, side: 'out', ...to, size: size(minor) });
      v += size(minor);
      if (key === 'bank') bankBottom = v;
    }
  const begin = ends['bank-more'];
  if (flow.bankMoreMinor > 0 && begin !== undefined) {
    const thick = size(flow.bankMoreMinor);
    ribbons.push({ key: 'bank-more', from: { u: begin, v: bankBottom }, to: { u: bank, v: bankBottom }, size: thick });
    posts.push({ key: 'bank-more', side: 'out', u: bank, v: bankBottom, size: thick });
    breaks.push({ key: 'bank-more', u: begin, v: bankBottom + thick / 2 });
  }
  return { ribbons, posts, breaks };
}

const minorOfBreak = (flow: MoneyFlow, key: FlowKey): number =>
  key === 'cards-differ' ? flow.cardsDifferMinor : key === 'bank-less' ? flow.bankLessMinor : flow.bankMoreMinor;

const postOf = (posts: Drawn['posts']) => (key: FlowKey, side: 'in' | 'out') =>
  posts.find((post) => post.key === key && post.side === side);

/** Labels beside posts, moved down where they would lie on each other. */
function stacked(
  wanted: readonly { readonly part: FlowPart; readonly at: Drawn['posts'][number] | undefined }[],
  x: number,
  anchor: FlowLabel['anchor'] = 'end',
): FlowLabel[] {
  const labels: FlowLabel[] = [];
  for (const { part, at } of wanted)
    if (at) labels.push({ ...part, x, y: belowLabels(labels, at.v + at.size / 2 - 6), anchor });
  return labels;
}

const belowLabels = (labels: readonly FlowLabel[], wanted: number): number =>
  Math.max(wanted, ...labels.map(({ y }) => y + LABEL));

function picture(drawn: Drawn, width: number, labels: readonly FlowLabel[], direction: 'across' | 'down'): SeamPicture {
  const xy = ({ u, v }: Edge): { x: number; y: number } =>
    direction === 'across' ? { x: round(u), y: round(v) } : { x: round(v), y: round(u) };
  const posts = drawn.posts.map(({ key, size, ...edge }) => ({
    key,
    ...xy(edge),
    width: direction === 'across' ? POST : round(size),
    height: direction === 'across' ? round(size) : POST,
  }));
  const bottom = Math.max(...posts.map(({ y, height }) => y + height), ...labels.map(({ y }) => y + 24), 0);
  return {
    width,
    height: Math.ceil(bottom + 12),
    ribbons: drawn.ribbons.map(({ key, from, to, size }) => ({
      key,
      path: ribbonPath(from, to, size, xy),
      width: round(size),
    })),
    posts,
    labels: labels.map((label) => ({ ...label, x: round(label.x), y: round(label.y) })),
    breaks: drawn.breaks.map(({ key, ...edge }) => ({ key, ...xy(edge) })),
  };
}

/** Leaves and arrives along the flow, and bends half way. */
function ribbonPath(from: Edge, to: Edge, size: number, xy: (edge: Edge) => { x: number; y: number }): string {
  const middle = (from.u + to.u) / 2;
  const at = (u: number, v: number): string => {
    const { x, y } = xy({ u, v });
    return `${x} ${y}`;
  };
  const [near, far] = [from.v + size, to.v + size];
  return [
    `M${at(from.u, from.v)}`,
    `C${at(middle, from.v)} ${at(middle, to.v)} ${at(to.u, to.v)}`,
    `L${at(to.u, far)}`,
    `C${at(middle, far)} ${at(middle, near)} ${at(from.u, near)}Z`,
  ].join('');
}
