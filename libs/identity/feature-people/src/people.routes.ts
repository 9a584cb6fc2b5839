import type { Routes } from '@angular/router';
import { hasRole } from '@seamwright/identity/data-access/session';

/** The staff and what each may do, for administrators. */
export const peopleRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@identity.people.title:People and roles`,
    canActivate: [hasRole('admin')],
    loadComponent: () => import('./people.page').then((m) => m.PeoplePage),
  },
];
