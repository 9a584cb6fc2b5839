import type { Routes } from '@angular/router';
import { hasRole } from '@seamwright/identity/data-access/session';

/** A customer's people and addresses, for its account owner. */
export const teamRoutes: Routes = [
  {
    path: '',
    title: $localize`:@@identity.team.title:Team and addresses`,
    canActivate: [hasRole('buyer_owner')],
    loadComponent: () => import('./team.page').then((m) => m.TeamPage),
  },
];
