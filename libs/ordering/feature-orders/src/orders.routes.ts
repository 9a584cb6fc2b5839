import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { ordersEffects, ordersFeature } from '@seamwright/ordering/data-access';

/** The buyer's orders: the list, and one of them. */
export const ordersRoutes: Routes = [
  {
    path: '',
    providers: [provideState(ordersFeature), provideEffects(ordersEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@orders.title:Orders`,
        loadComponent: () => import('./orders.page').then((m) => m.OrdersPage),
      },
      {
        path: ':orderId',
        title: $localize`:@@order.title:Order`,
        loadComponent: () => import('./order.page').then((m) => m.OrderPage),
      },
    ],
  },
];
