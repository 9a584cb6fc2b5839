import type { Route, Routes } from '@angular/router';
import { hasRole, signedIn } from '@seamwright/identity/data-access/session';
import { PLACES, type Place } from './places';

const place = ({ path, roles }: Place, loadChildren: Route['loadChildren']): Route => ({
  path,
  canActivate: [signedIn, hasRole(...roles)],
  loadChildren,
});

/** Every feature is a chunk of its own. */
export const routes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`:@@admin.home.title:Your desk`,
    canActivate: [signedIn],
    loadComponent: () => import('./home/home.page').then((m) => m.HomePage),
  },
  place(PLACES.orders, () => import('@seamwright/ordering/feature-order-desk').then((m) => m.orderDeskRoutes)),
  place(PLACES.imports, () => import('@seamwright/ordering/feature-order-import').then((m) => m.orderImportRoutes)),
  place(PLACES.quotes, () => import('@seamwright/pricing/feature-quotes').then((m) => m.quotesRoutes)),
  place(PLACES.prices, () => import('@seamwright/pricing/feature-price-lists').then((m) => m.priceListsRoutes)),
  place(PLACES.cuttingDays, () => import('@seamwright/plant/feature-cutting-day').then((m) => m.cuttingDayRoutes)),
  place(PLACES.scale, () => import('@seamwright/plant/feature-scale').then((m) => m.scaleRoutes)),
  place(PLACES.lots, () => import('@seamwright/stock/feature-lots').then((m) => m.lotsRoutes)),
  place(PLACES.specifications, () =>
    import('@seamwright/catalogue/feature-specifications').then((m) => m.specificationsRoutes),
  ),
  place(PLACES.invoices, () => import('@seamwright/accounts/feature-invoices').then((m) => m.deskInvoicesRoutes)),
  place(PLACES.payments, () => import('@seamwright/accounts/feature-payments').then((m) => m.paymentsRoutes)),
  place(PLACES.reconciliation, () =>
    import('@seamwright/accounts/feature-reconciliation').then((m) => m.reconciliationRoutes),
  ),
  place(PLACES.ledger, () => import('@seamwright/accounts/feature-ledger').then((m) => m.ledgerRoutes)),
  place(PLACES.customers, () => import('@seamwright/identity/feature-customers').then((m) => m.customersRoutes)),
  place(PLACES.people, () => import('@seamwright/identity/feature-people').then((m) => m.peopleRoutes)),
  place(PLACES.calendar, () => import('@seamwright/ordering/feature-calendar').then((m) => m.calendarRoutes)),
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
    title: $localize`:@@admin.notFound.title:Page not found`,
    loadComponent: () => import('./not-found.page').then((m) => m.NotFoundPage),
  },
];
