import type { Routes } from '@angular/router';

/** Delivery zones, cut-offs and closures. */
export const calendarRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@calendar.title:Calendar`,
    loadComponent: () => import('./calendar.page').then((m) => m.CalendarPage),
  },
];
