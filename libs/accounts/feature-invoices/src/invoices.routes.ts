import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { invoicesEffects, invoicesFeature } from '@seamwright/accounts/data-access';

/** The buyer's invoices: the list, and one of them. */
export const buyerInvoicesRoutes: Routes = [
  {
    path: '',
    providers: [provideState(invoicesFeature), provideEffects(invoicesEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@invoices.title:Invoices`,
        loadComponent: () => import('./buyer-invoices.page').then((m) => m.BuyerInvoicesPage),
      },
      {
        path: ':invoiceId',
        title: $localize`:@@invoice.title:Invoice`,
        loadComponent: () => import('./buyer-invoice.page').then((m) => m.BuyerInvoicePage),
      },
    ],
  },
];

/** All customers' invoices, for the accounts desk. */
export const deskInvoicesRoutes: Routes = [
  {
    path: '',
    providers: [provideState(invoicesFeature), provideEffects(invoicesEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@deskInvoices.title:Invoices`,
        loadComponent: () => import('./desk-invoices.page').then((m) => m.DeskInvoicesPage),
      },
      {
        path: ':invoiceId',
        title: $localize`:@@deskInvoice.title:Invoice`,
        loadComponent: () => import('./desk-invoice.page').then((m) => m.DeskInvoicePage),
      },
    ],
  },
];
