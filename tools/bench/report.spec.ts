import { reportLine, table } from './report';

const measured = { ours: { median: 6.004, p95: 9.5 }, floor: { median: 2, p95: 2.25 }, ratio: 3.002 };
const placing = { name: 'orders.place', size: '3 lines', target: 3 };

it('reports the medians, the ratio and whether the target was met', () => {
  expect(reportLine('thread', placing, measured)).toEqual({
    bench: 'thread',
    case: 'orders.place',
    size: '3 lines',
    unit: 'ms',
    ours: 6.004,
    floor: 2,
    ratio: 3,
    better: 'smaller',
    target: 3,
    met: false,
  });
  expect(reportLine('thread', placing, { ...measured, ratio: 3 }).met).toBe(true);
});

it('reports what all but one turn in twenty stayed under, where that is compared', () => {
  const searching = { name: 'search', size: '9 found', target: 1.5, by: 'p95' as const };
  const drawing = { name: 'drawing', size: '1', limitMs: 2 };
  expect(reportLine('catalogue', searching, measured)).toMatchObject({ ours: 9.5, floor: 2.25, target: 1.5 });
  const within = { ours: { median: 1, p95: 1.5 }, floor: { median: 2, p95: 2 }, ratio: 0.75 };
  expect(reportLine('catalogue', drawing, within)).toMatchObject({ ours: 1.5, floor: 2, target: 1, met: true });
});

it('draws a table with words to the left and numbers to the right', () => {
  const line = reportLine('thread', placing, measured);
  expect(table([{ line, measured }]).split('\n')).toEqual([
    'case          size     ours ms   p95  floor ms   p95  ratio  target',
    '────────────  ───────  ───────  ────  ────────  ────  ─────  ──────  ───────',
    'orders.place  3 lines     6.00  9.50      2.00  2.25   3.00     ≤ 3  not met',
  ]);
});
