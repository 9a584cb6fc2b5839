import type { Clock } from '@seamwright/shared/server';

/** What the storey is furnished with. */
export interface IdentityParts {
  /** The real time, by which sessions and links live, also where the desk's own clock is moved for a demo. */
  readonly clock: Clock;
  /** The first signs access tokens; all of them are accepted, so that a secret can be changed without signing people out. */
  readonly jwtSecrets: readonly [string, ...string[]];
  /** Where both applications are reached: mailed links begin with it, and requests by cookie must come from it. */
  readonly publicOrigin: string;
  /** Memory that one password check takes, in KiB. */
  readonly argonMemoryKib: number;
}
