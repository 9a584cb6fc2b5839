/** How long the token before the newest still works: two tabs may renew at once, an answer may be lost. */
export const REFRESH_GRACE_SECONDS = 20;

/** What is known of a refresh token that somebody shows. */
export interface PresentedToken {
  /** Its place in the chain of its session. */
  readonly generation: number;
  /** When a newer one took its place; null for one that was never used. */
  readonly replacedAt: Date | null;
}

/** Fresh: never used. Grace: the newest one's predecessor, just replaced. Reuse: a copy is about, end the session. */
export type Rotation = 'fresh' | 'grace' | 'reuse';

/** Judges a shown refresh token; `newestGeneration` is the last place in its session's chain. */
export function rotationOf(token: PresentedToken, newestGeneration: number, now: Date): Rotation {
  if (token.replacedAt === null) return 'fresh';
  const direct = token.generation === newestGeneration - 1;
  const young = now.getTime() - token.replacedAt.getTime() <= REFRESH_GRACE_SECONDS * 1000;
  return direct && young ? 'grace' : 'reuse';
}
