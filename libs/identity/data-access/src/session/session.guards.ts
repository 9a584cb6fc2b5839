import { inject } from '@angular/core';
import { Router, type CanActivateFn } from '@angular/router';
import { Store } from '@ngrx/store';
import { filter, map, switchMap, take } from 'rxjs';
import type { Role } from '@seamwright/shared/contracts';
import { returnAddress } from './return-address';
import { selectRoles, selectStatus } from './session.reducer';

/** Whether somebody is signed in, once that is known. */
const settled = (store: Store) =>
  store.select(selectStatus).pipe(
    filter((status) => status !== 'unknown'),
    take(1),
    map((status) => status === 'signed-in'),
  );

/** Lets in whoever is signed in; sends others to the sign-in page, which comes back to the address asked for. */
export const signedIn: CanActivateFn = (_route, { url }) => {
  const router = inject(Router);
  const queryParams = url === '/' ? {} : { return: url };
  return settled(inject(Store)).pipe(map((is) => is || router.createUrlTree(['/sign-in'], { queryParams })));
};

/** For the pages of those who are not signed in; others go on to where they wanted to be. */
export const signedOut: CanActivateFn = (route) => {
  const router = inject(Router);
  return settled(inject(Store)).pipe(
    map((is) => !is || router.parseUrl(returnAddress(route.queryParamMap.get('return')))),
  );
};

/** Lets in whoever holds one of the roles; sends others to their first page. Stands behind `signedIn`. */
export const hasRole =
  (...roles: readonly Role[]): CanActivateFn =>
  () => {
    const router = inject(Router);
    const store = inject(Store);
    return settled(store).pipe(
      switchMap(() => store.select(selectRoles)),
      take(1),
      map((held) => held.some((role) => roles.includes(role)) || router.parseUrl('/')),
    );
  };
