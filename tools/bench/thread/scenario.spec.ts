import { plantDate, unwrap, weekdayOf } from '@seamwright/shared/util';
import { importRows, threadDays } from './scenario';

const anchor = unwrap(plantDate('2026-12-01'));

it('gives out days of their own, none a Sunday', () => {
  const { floor, placing, importing, closing } = threadDays(anchor, 12);
  expect([floor, placing, importing]).toEqual(['2026-12-02', '2026-12-03', '2026-12-04']);
  expect(closing).toHaveLength(12);
  expect(closing[0]).toBe('2026-12-05');
  const all = [floor, placing, importing, ...closing];
  expect(new Set(all).size).toBe(15);
  expect(all.some((day) => weekdayOf(day) === 7)).toBe(false);
});

it('lets six customers order their usual lines', () => {
  const rows = importRows(anchor);
  expect(new Set(rows.map(([customer]) => customer)).size).toBe(6);
  expect(rows).toHaveLength(18);
  expect(rows[0]).toEqual(['Hotel Brackenholme', 'Main kitchen', anchor, 'BF-202', '', 10, 'pieces', '', '']);
});
