const DAY_MS = 86_400_000;
const IDLE_DAYS = 30;
const LONGEST_DAYS = 90;

/** When a session ends unless it is used: 30 days after its last use, 90 days after the sign-in at the latest. */
export function sessionEnd(signedInAt: Date, usedAt: Date): Date {
  const idle = usedAt.getTime() + IDLE_DAYS * DAY_MS;
  return new Date(Math.min(idle, signedInAt.getTime() + LONGEST_DAYS * DAY_MS));
}
