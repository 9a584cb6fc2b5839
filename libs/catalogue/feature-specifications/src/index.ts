import type { Routes } from '@angular/router';

/** The technical people's list of specifications and one version's record. */
export const specificationsRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@catalogue.technical.title:Specifications`,
    loadComponent: () => import('./specifications.page').then((m) => m.SpecificationsPage),
  },
  {
    path: ':code',
    title: $localize`:@@catalogue.record.title:Specification`,
    loadComponent: () => import('./specification-record.page').then((m) => m.SpecificationRecordPage),
  },
];
