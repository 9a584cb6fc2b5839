import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { packingEffects, packingFeature } from '@seamwright/plant/data-access';

/** The scale: `''` lists the orders on the floor, `:deliveryDay/:orderId` packs one. */
export const scaleRoutes: Routes = [
  {
    path: '',
    providers: [provideState(packingFeature), provideEffects(packingEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@scale.heading:Scale`,
        loadComponent: () => import('./scale-orders.page').then((m) => m.ScaleOrdersPage),
      },
      {
        path: ':deliveryDay/:orderId',
        title: $localize`:@@scale.heading:Scale`,
        loadComponent: () => import('./scale.page').then((m) => m.ScalePage),
      },
    ],
  },
];
