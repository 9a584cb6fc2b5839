import { inject } from '@angular/core';
import { Router } from '@angular/router';
import { Actions, createEffect, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { catchError, exhaustMap, filter, map, of, tap, withLatestFrom } from 'rxjs';
import { ApiClient, asProblem } from '@seamwright/shared/data-access';
import {
  signInAddress,
  signOutAddress,
  type signIn as SignIn,
  type signOut as SignOut,
} from '@seamwright/identity/contracts/session';
import { IDENTITY_APPLICATION } from './identity-application';
import { PageLoad } from './page-load';
import { returnAddress } from './return-address';
import { SessionTokens } from './session-tokens';
import { SessionActions, SessionApiActions } from './session.actions';
import { selectLastPersonId, sessionFeature } from './session.reducer';

export const restore = createEffect(
  (actions = inject(Actions), tokens = inject(SessionTokens)) =>
    actions.pipe(
      ofType(SessionActions.applicationStarted),
      exhaustMap(() =>
        tokens.refresh().pipe(
          map((session) => SessionApiActions.restored({ person: session?.person ?? null })),
          catchError((error: unknown) => of(SessionApiActions.restoreFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

export const signIn = createEffect(
  (
    actions = inject(Actions),
    api = inject(ApiClient),
    tokens = inject(SessionTokens),
    application = inject(IDENTITY_APPLICATION),
  ) =>
    actions.pipe(
      ofType(SessionActions.signInSubmitted),
      exhaustMap(({ email, password }) =>
        api.call<typeof SignIn>(signInAddress, { body: { application, email, password } }).pipe(
          tap((session) => tokens.keep(session)),
          map(({ person }) => SessionApiActions.signedIn({ person })),
          catchError((error: unknown) => of(SessionApiActions.signInRefused({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

/** Goes where the person wanted to be. Somebody else than before gets a page without anything of theirs in memory. */
export const enter = createEffect(
  (actions = inject(Actions), store = inject(Store), router = inject(Router), pages = inject(PageLoad)) =>
    actions.pipe(
      ofType(SessionApiActions.signedIn),
      withLatestFrom(store.select(selectLastPersonId)),
      tap(([{ person }, lastPersonId]) => {
        const address = returnAddress(router.parseUrl(router.url).queryParams['return']);
        if (lastPersonId === person.id) void router.navigateByUrl(address);
        else pages.inside(address);
      }),
    ),
  { functional: true, dispatch: false },
);

export const signOut = createEffect(
  (
    actions = inject(Actions),
    api = inject(ApiClient),
    tokens = inject(SessionTokens),
    application = inject(IDENTITY_APPLICATION),
  ) =>
    actions.pipe(
      ofType(SessionActions.signOutAsked),
      exhaustMap(() =>
        api.call<typeof SignOut>(signOutAddress, { query: { application } }).pipe(
          tap(() => tokens.drop()),
          map(() => SessionApiActions.signedOut()),
          catchError((error: unknown) => of(SessionApiActions.signOutFailed({ problem: asProblem(error) }))),
        ),
      ),
    ),
  { functional: true },
);

export const leave = createEffect(
  (actions = inject(Actions), pages = inject(PageLoad)) =>
    actions.pipe(
      ofType(SessionApiActions.signedOut),
      tap(() => pages.inside('/sign-in')),
    ),
  { functional: true, dispatch: false },
);

/** Hears what became of the sign-in elsewhere: renewed, or ended by another tab or the server. */
export const hear = createEffect(
  (tokens = inject(SessionTokens)) =>
    tokens.events.pipe(
      map((event) =>
        event.kind === 'ended' ? SessionApiActions.ended() : SessionApiActions.renewed({ person: event.person }),
      ),
    ),
  { functional: true },
);

/** The cookie belongs to somebody else now, who signed in from another tab. */
export const changeOver = createEffect(
  (actions = inject(Actions), store = inject(Store), pages = inject(PageLoad)) =>
    actions.pipe(
      ofType(SessionApiActions.renewed),
      withLatestFrom(store.select(selectLastPersonId)),
      filter(([{ person }, lastPersonId]) => person.id !== lastPersonId),
      tap(() => pages.inside('/')),
    ),
  { functional: true, dispatch: false },
);

/** Asks to sign in again, and keeps the address to come back to. */
export const askAgain = createEffect(
  (actions = inject(Actions), store = inject(Store), router = inject(Router)) =>
    actions.pipe(
      ofType(SessionApiActions.ended),
      withLatestFrom(store.select(sessionFeature.selectEnded)),
      filter(([, ended]) => ended && !router.url.startsWith('/sign-in')),
      tap(() => void router.navigate(['/sign-in'], { queryParams: { return: router.url } })),
    ),
  { functional: true, dispatch: false },
);
