import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { reconciliationEffects, reconciliationFeature } from '@seamwright/accounts/data-access';

/** A week of card money, from the cards to the bank. */
export const reconciliationRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@reconciliation.title:Reconciliation`,
    providers: [provideState(reconciliationFeature), provideEffects(reconciliationEffects)],
    loadComponent: () => import('./reconciliation.page').then((m) => m.ReconciliationPage),
  },
];
