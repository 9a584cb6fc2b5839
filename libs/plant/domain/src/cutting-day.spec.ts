import type { PlantDate } from '@seamwright/shared/util';
import { CUTTING_DAY_STATES, cuttingDayAfterChange, cuttingDayOf, cuttingDayStates, isClosedToOrders } from './index';

const day = (text: string) => text as PlantDate;
const closed = (...days: string[]) => new Set(days.map(day));

describe('the states of a cutting day', () => {
  it('goes one way, a step at a time', () => {
    const moves = CUTTING_DAY_STATES.map((state) => cuttingDayStates.allowedMoves(state));
    expect(moves).toEqual([['close'], ['plan'], ['release'], ['finish'], ['lock'], []]);
  });

  it('refuses to skip the plan', () => {
    expect(cuttingDayStates.next('closed', 'release')).toMatchObject({
      refusal: { code: 'move-not-allowed', params: { from: 'closed', move: 'release' } },
    });
  });

  it('takes orders only while it is open', () => {
    expect(CUTTING_DAY_STATES.filter((state) => !isClosedToOrders(state))).toEqual(['open']);
  });
});

describe('the day of cutting', () => {
  it('is the working day before the delivery', () => {
    expect(cuttingDayOf(day('2026-12-04'), closed())).toBe('2026-12-03');
    expect(cuttingDayOf(day('2026-12-05'), closed())).toBe('2026-12-04');
  });

  it('passes over weekends and closures', () => {
    expect(cuttingDayOf(day('2026-12-07'), closed())).toBe('2026-12-04');
    expect(cuttingDayOf(day('2026-12-28'), closed('2026-12-25', '2026-12-24'))).toBe('2026-12-23');
  });

  it('does not search for ever', () => {
    const long = Array.from({ length: 70 }, (_, back) =>
      new Date(Date.UTC(2026, 11, 4 - back)).toISOString().slice(0, 10),
    );
    expect(() => cuttingDayOf(day('2026-12-04'), closed(...long))).toThrow(RangeError);
  });
});

describe('a cutting day when the calendar changes', () => {
  const friday = { deliveryDay: day('2026-12-04'), cuttingDay: day('2026-12-03') };
  const today = day('2026-12-01');

  it('moves to the working day before while it is open, and back again', () => {
    const open = { ...friday, state: 'open' as const };
    expect(cuttingDayAfterChange(open, closed('2026-12-03'), today)).toEqual({ ok: true, value: '2026-12-02' });
    const moved = { ...open, cuttingDay: day('2026-12-02') };
    expect(cuttingDayAfterChange(moved, closed(), today)).toEqual({ ok: true, value: '2026-12-03' });
  });

  it('refuses to close a day on which a fixed list is cut', () => {
    for (const state of ['closed', 'planned', 'released'] as const) {
      expect(cuttingDayAfterChange({ ...friday, state }, closed('2026-12-03'), today)).toMatchObject({
        refusal: { code: 'day-being-cut', params: { delivery: '2026-12-04' } },
      });
      expect(cuttingDayAfterChange({ ...friday, state }, closed('2026-12-02'), today)).toMatchObject({ ok: true });
    }
  });

  it('leaves a day alone that is over', () => {
    expect(cuttingDayAfterChange({ ...friday, state: 'finished' }, closed('2026-12-03'), today)).toEqual({
      ok: true,
      value: '2026-12-03',
    });
  });

  it('refuses when no day to cut is left before the delivery', () => {
    const open = { ...friday, state: 'open' as const };
    expect(cuttingDayAfterChange(open, closed('2026-12-03'), day('2026-12-03'))).toMatchObject({
      refusal: { code: 'no-day-to-cut' },
    });
  });
});
