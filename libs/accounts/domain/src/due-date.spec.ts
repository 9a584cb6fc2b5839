import type { PlantDate } from '@seamwright/shared/util';
import { dueDate } from './due-date';

describe('due date', () => {
  // Tuesday, 1 December 2026: its week ends on Sunday the 6th, its month on the 31st.
  it.each([
    ['invoice', 14, '2026-12-15'],
    ['end-of-week', 7, '2026-12-13'],
    ['end-of-month', 30, '2027-01-30'],
    ['invoice', 0, '2026-12-01'],
  ] as const)('counts from %s, %i days', (from, days, due) => {
    expect(dueDate('2026-12-01' as PlantDate, { days, from })).toBe(due);
  });

  it('ends February in a leap year on the 29th', () => {
    expect(dueDate('2028-02-03' as PlantDate, { days: 0, from: 'end-of-month' })).toBe('2028-02-29');
  });
});
