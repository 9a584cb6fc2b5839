import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { ledgerEffects, ledgerFeature } from '@seamwright/accounts/data-access';

/** The books: balances and journal entries. */
export const ledgerRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@ledger.title:Ledger`,
    providers: [provideState(ledgerFeature), provideEffects(ledgerEffects)],
    loadComponent: () => import('./ledger.page').then((m) => m.LedgerPage),
  },
];
