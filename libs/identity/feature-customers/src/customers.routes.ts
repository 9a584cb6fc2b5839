import type { Routes } from '@angular/router';

/** The customers, for the staff. The pages and the store's customers are fetched when first wanted. */
export const customersRoutes: Routes = [
  { path: '', loadChildren: () => import('./customers.pages').then((m) => m.customersPages) },
];
