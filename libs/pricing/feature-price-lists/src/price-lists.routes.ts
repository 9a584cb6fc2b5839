import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { priceListsEffects, priceListsFeature } from '@seamwright/pricing/data-access';

/** The desk's price lists: all of them, and the prices of one. */
export const priceListsRoutes: Routes = [
  {
    path: '',
    providers: [provideState(priceListsFeature), provideEffects(priceListsEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@priceLists.title:Price lists`,
        loadComponent: () => import('./price-lists.page').then((m) => m.PriceListsPage),
      },
      {
        path: ':priceListId',
        title: $localize`:@@priceList.title:Price list`,
        loadComponent: () => import('./price-list.page').then((m) => m.PriceListPage),
      },
    ],
  },
];
