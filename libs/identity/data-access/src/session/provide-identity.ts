import {
  inject,
  makeEnvironmentProviders,
  provideEnvironmentInitializer,
  type EnvironmentProviders,
} from '@angular/core';
import { provideEffects } from '@ngrx/effects';
import { provideState, Store } from '@ngrx/store';
import { ACCESS_TOKEN_SOURCE } from '@seamwright/shared/data-access';
import { IDENTITY_APPLICATION } from './identity-application';
import { SessionTokens } from './session-tokens';
import { SessionActions } from './session.actions';
import * as effects from './session.effects';
import { sessionFeature } from './session.reducer';

/**
 * Who is signed in to an application: the store's session, the access token for calls, and the start that carries on
 * the sign-in of before. Comes after `provideStore` and `provideEffects`.
 */
export function provideIdentity(application: 'storefront' | 'admin'): EnvironmentProviders {
  return makeEnvironmentProviders([
    { provide: IDENTITY_APPLICATION, useValue: application },
    SessionTokens,
    { provide: ACCESS_TOKEN_SOURCE, useExisting: SessionTokens },
    provideState(sessionFeature),
    provideEffects(effects),
    provideEnvironmentInitializer(() => inject(Store).dispatch(SessionActions.applicationStarted())),
  ]);
}
