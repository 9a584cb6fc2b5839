import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { ordersEffects, ordersFeature } from '@seamwright/ordering/data-access';

/** The order desk: all orders, a phone order, and one of them. */
export const orderDeskRoutes: Routes = [
  {
    path: '',
    providers: [provideState(ordersFeature), provideEffects(ordersEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@desk.title:Orders`,
        loadComponent: () => import('./order-desk.page').then((m) => m.OrderDeskPage),
      },
      {
        path: 'new',
        title: $localize`:@@phoneOrder.title:New phone order`,
        loadComponent: () => import('./phone-order.page').then((m) => m.PhoneOrderPage),
      },
      {
        path: ':orderId',
        title: $localize`:@@deskOrder.title:Order`,
        loadComponent: () => import('./desk-order.page').then((m) => m.DeskOrderPage),
      },
    ],
  },
];
