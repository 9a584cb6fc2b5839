import type { Routes } from '@angular/router';

export const routes: Routes = [
  { path: '', pathMatch: 'full', loadComponent: () => import('./home.page').then((m) => m.HomePage) },
  {
    path: '**',
    title: $localize`:@@storefront.notFound.title:Page not found`,
    loadComponent: () => import('./not-found.page').then((m) => m.NotFoundPage),
  },
];
