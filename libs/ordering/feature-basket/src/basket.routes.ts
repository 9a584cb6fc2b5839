import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { checkoutEffects, checkoutFeature, ordersEffects, ordersFeature } from '@seamwright/ordering/data-access';

/** The buyer's basket with its checkout, and what became of it. */
export const basketRoutes: Routes = [
  {
    path: '',
    providers: [
      provideState(checkoutFeature),
      provideState(ordersFeature),
      provideEffects(checkoutEffects, ordersEffects),
    ],
    children: [
      {
        path: '',
        title: $localize`:@@basket.title:Basket`,
        loadComponent: () => import('./basket.page').then((m) => m.BasketPage),
      },
      {
        path: 'placed/:orderId',
        title: $localize`:@@placed.title:Order placed`,
        loadComponent: () => import('./placed.page').then((m) => m.PlacedPage),
      },
    ],
  },
];
