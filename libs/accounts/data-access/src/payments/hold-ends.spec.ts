import { holdEndsSoon } from './hold-ends';

const now = new Date('2026-12-01T10:00:00Z');

describe('a hold', () => {
  it('ends soon within two days, and when it is over', () => {
    const held = (holdEndsAt: string | null) => holdEndsSoon({ state: 'pre-authorised', holdEndsAt }, now);
    expect(held('2026-12-03T10:00:00Z')).toBe(true);
    expect(held('2026-12-03T10:00:01Z')).toBe(false);
    expect(held('2026-11-30T10:00:00Z')).toBe(true);
    expect(held(null)).toBe(false);
  });

  it('is of no concern once it was taken, let go or never made', () => {
    for (const state of ['captured', 'released', 'declined', 'failed'] as const)
      expect(holdEndsSoon({ state, holdEndsAt: '2026-12-01T11:00:00Z' }, now)).toBe(false);
    expect(holdEndsSoon({ state: 'capturing', holdEndsAt: '2026-12-01T11:00:00Z' }, now)).toBe(true);
  });
});
