import type { Routes } from '@angular/router';

/** Orders from a workbook. */
export const orderImportRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@orderImport.title:Orders from a workbook`,
    loadComponent: () => import('./order-import.page').then((m) => m.OrderImportPage),
  },
];
