import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { cardsEffects, cardsFeature } from '@seamwright/accounts/data-access';

/** The cards that the buyer's customer keeps. */
export const cardsRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@cards.title:Cards`,
    providers: [provideState(cardsFeature), provideEffects(cardsEffects)],
    loadComponent: () => import('./cards.page').then((m) => m.CardsPage),
  },
];
