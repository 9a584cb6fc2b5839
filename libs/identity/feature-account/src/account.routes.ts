import type { Routes } from '@angular/router';

/** One's own account, in both applications; stands behind `signedIn`. */
export const accountRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@identity.account.title:Your account`,
    loadComponent: () => import('./account.page').then((m) => m.AccountPage),
  },
];
