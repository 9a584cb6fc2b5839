import { inject } from '@angular/core';
import type { CanActivateFn } from '@angular/router';
import { Store } from '@ngrx/store';
import { filter, map, take } from 'rxjs';
import { basketFeature } from './basket.feature';

/**
 * Opens a page once the basket is back, so that none is shown empty that is not. Stands behind `signedIn`: nobody's
 * basket never comes.
 */
export const basketRestored: CanActivateFn = () =>
  inject(Store)
    .select(basketFeature.selectOwner)
    .pipe(
      filter((owner) => owner !== null),
      take(1),
      map(() => true),
    );
