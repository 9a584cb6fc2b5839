import type { Routes } from '@angular/router';
import { hasRole, signedIn } from '@seamwright/identity/data-access/session';
import { basketRestored } from '@seamwright/ordering/data-access/frame';

/** Every feature is a chunk of its own. */
export const routes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'catalogue' },
  {
    path: 'catalogue',
    canActivate: [signedIn],
    children: [
      {
        path: '',
        pathMatch: 'full',
        loadChildren: () => import('@seamwright/catalogue/feature-catalogue').then((m) => m.catalogueRoutes),
      },
      {
        path: '',
        loadChildren: () => import('@seamwright/catalogue/feature-specification').then((m) => m.specificationRoutes),
      },
    ],
  },
  {
    path: 'basket',
    canActivate: [signedIn, basketRestored],
    loadChildren: () => import('@seamwright/ordering/feature-basket').then((m) => m.basketRoutes),
  },
  {
    path: 'orders',
    canActivate: [signedIn],
    loadChildren: () => import('@seamwright/ordering/feature-orders').then((m) => m.ordersRoutes),
  },
  {
    path: 'quotes',
    canActivate: [signedIn],
    loadChildren: () => import('@seamwright/pricing/feature-received-quotes').then((m) => m.receivedQuotesRoutes),
  },
  {
    path: 'invoices',
    canActivate: [signedIn],
    loadChildren: () => import('@seamwright/accounts/feature-invoices').then((m) => m.buyerInvoicesRoutes),
  },
  {
    path: 'cards',
    canActivate: [signedIn],
    loadChildren: () => import('@seamwright/accounts/feature-cards').then((m) => m.cardsRoutes),
  },
  {
    path: 'team',
    canActivate: [signedIn, hasRole('buyer_owner')],
    loadChildren: () => import('@seamwright/identity/feature-team').then((m) => m.teamRoutes),
  },
  {
    path: 'account',
    canActivate: [signedIn],
    loadChildren: () => import('@seamwright/identity/feature-account').then((m) => m.accountRoutes),
  },
  {
    path: '',
    loadChildren: () => import('@seamwright/identity/feature-sign-in').then((m) => m.signInRoutes),
  },
  {
    path: '**',
    title: $localize`:@@storefront.notFound.title:Page not found`,
    loadComponent: () => import('./not-found.page').then((m) => m.NotFoundPage),
  },
];
