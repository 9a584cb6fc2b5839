import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { specificationEffects, specificationFeature } from '@seamwright/catalogue/data-access';

/** The storefront's page of one specification, below `catalogue`. */
export const specificationRoutes: Routes = [
  {
    path: ':code',
    title: $localize`:@@catalogue.specification.title:Specification`,
    providers: [provideState(specificationFeature), provideEffects(specificationEffects)],
    loadComponent: () => import('./specification.page').then((m) => m.SpecificationPage),
  },
];
