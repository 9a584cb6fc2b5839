import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { catalogueListEffects, catalogueListFeature } from '@seamwright/catalogue/data-access';

/** The storefront's catalogue. */
export const catalogueRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@catalogue.list.title:Catalogue`,
    providers: [provideState(catalogueListFeature), provideEffects(catalogueListEffects)],
    loadComponent: () => import('./catalogue.page').then((m) => m.CataloguePage),
  },
];
