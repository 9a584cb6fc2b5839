import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { lotsEffects, lotsFeature } from '@seamwright/stock/data-access';

/** Lots: `''` lists them, `receive` books one in, `:lotId` is one. */
export const lotsRoutes: Routes = [
  {
    path: '',
    providers: [provideState(lotsFeature), provideEffects(lotsEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@lots.heading:Lots`,
        loadComponent: () => import('./lots.page').then((m) => m.LotsPage),
      },
      {
        path: 'receive',
        title: $localize`:@@lots.receive:Receive a lot`,
        loadComponent: () => import('./receive-lot.page').then((m) => m.ReceiveLotPage),
      },
      {
        path: ':lotId',
        title: $localize`:@@lots.one:Lot`,
        loadComponent: () => import('./lot.page').then((m) => m.LotPage),
      },
    ],
  },
];
