import { computed, inject, type Signal } from '@angular/core';
import { Store } from '@ngrx/store';
import { selectRoles } from '@seamwright/identity/data-access/session';
import { receiveLot } from '@seamwright/stock/contracts';

/** Whether the person may book lots in, hold and release them: those whom the endpoint names. */
export function mayDecideLots(): Signal<boolean> {
  const roles = inject(Store).selectSignal(selectRoles);
  const { access } = receiveLot;
  return computed(() => access.who === 'anyone' || access.roles.some((role) => roles().includes(role)));
}
