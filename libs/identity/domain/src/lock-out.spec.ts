import fc from 'fast-check';
import { waitBeforeSignIn } from './lock-out';

const NOW = new Date('2026-12-01T12:00:00Z');
const ago = (seconds: number) => new Date(NOW.getTime() - seconds * 1000);
const failures = (count: number, lastSecondsAgo: number) =>
  Array.from({ length: count }, (_, index) => ago(lastSecondsAgo + index));

describe('waitBeforeSignIn', () => {
  it('lets four failures pass', () => {
    expect(waitBeforeSignIn(failures(4, 0), NOW)).toBe(0);
  });

  it('asks for half a minute after the fifth, five minutes after the tenth, a quarter of an hour after the twentieth', () => {
    expect(waitBeforeSignIn(failures(5, 0), NOW)).toBe(30);
    expect(waitBeforeSignIn(failures(10, 0), NOW)).toBe(300);
    expect(waitBeforeSignIn(failures(20, 0), NOW)).toBe(900);
  });

  it('counts the wait from the last failure', () => {
    expect(waitBeforeSignIn(failures(5, 20), NOW)).toBe(10);
    expect(waitBeforeSignIn(failures(5, 31), NOW)).toBe(0);
  });

  it('forgets failures after a quarter of an hour', () => {
    expect(waitBeforeSignIn(failures(50, 15 * 60), NOW)).toBe(0);
  });

  it('never waits longer than the longest step, and never less for one failure more', () => {
    const secondsAgo = fc.array(fc.integer({ min: 0, max: 2000 }), { maxLength: 40 });
    fc.assert(
      fc.property(secondsAgo, (times) => {
        const before = waitBeforeSignIn(times.map(ago), NOW);
        const after = waitBeforeSignIn([...times.map(ago), NOW], NOW);
        expect(before).toBeLessThanOrEqual(900);
        expect(after).toBeGreaterThanOrEqual(before);
      }),
    );
  });
});
