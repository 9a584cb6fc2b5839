import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { paymentsEffects, paymentsFeature } from '@seamwright/accounts/data-access';

/** Card payments of all customers. */
export const paymentsRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@payments.title:Card payments`,
    providers: [provideState(paymentsFeature), provideEffects(paymentsEffects)],
    loadComponent: () => import('./payments.page').then((m) => m.PaymentsPage),
  },
];
