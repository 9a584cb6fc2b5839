import { InjectionToken } from '@angular/core';
import type { Observable } from 'rxjs';

/** Where calls get the access token from; the identity storey provides it. */
export interface AccessTokenSource {
  /** The token in force, or null when nobody is signed in. */
  current(): string | null;
  /** A new token after the old one was refused; null when the sign-in has ended. */
  renew(): Observable<string | null>;
}

export const ACCESS_TOKEN_SOURCE = new InjectionToken<AccessTokenSource>('ACCESS_TOKEN_SOURCE');
