import type { Routes } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState } from '@ngrx/store';
import { cuttingDaysEffects, cuttingDaysFeature } from '@seamwright/plant/data-access';

/** Cutting days: `''` lists them, `:deliveryDay` is one. */
export const cuttingDayRoutes: Routes = [
  {
    path: '',
    providers: [provideState(cuttingDaysFeature), provideEffects(cuttingDaysEffects)],
    children: [
      {
        path: '',
        title: $localize`:@@cuttingDays.heading:Cutting days`,
        loadComponent: () => import('./cutting-days.page').then((m) => m.CuttingDaysPage),
      },
      {
        path: ':deliveryDay',
        title: $localize`:@@cuttingDay.title:Cutting day`,
        loadComponent: () => import('./cutting-day.page').then((m) => m.CuttingDayPage),
      },
    ],
  },
];
