/** Failures older than this no longer count. */
export const LOCK_OUT_WINDOW_MINUTES = 15;

/** From so many failures on, so many seconds to wait after the last one; the most severe first. */
const WAITS = [
  { failures: 20, seconds: 900 },
  { failures: 10, seconds: 300 },
  { failures: 5, seconds: 30 },
] as const;

/**
 * How long a sign-in must wait after failures, in whole seconds; 0 when it may be tried. `failures` are those of one
 * e-mail address from one source: whoever guesses from elsewhere makes only themselves wait, so nobody can lock out
 * somebody else.
 */
export function waitBeforeSignIn(failures: readonly Date[], now: Date): number {
  const since = now.getTime() - LOCK_OUT_WINDOW_MINUTES * 60_000;
  const counted = failures.map((at) => at.getTime()).filter((at) => at > since);
  const step = WAITS.find(({ failures: from }) => counted.length >= from);
  if (!step) return 0;
  const until = Math.max(...counted) + step.seconds * 1000;
  return Math.max(0, Math.ceil((until - now.getTime()) / 1000));
}
