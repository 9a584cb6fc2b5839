import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { SessionActions, selectPerson, selectRoles } from '@seamwright/identity/data-access/session';
import { basketFeature } from '@seamwright/ordering/data-access/frame';
import { Disclosure, FrameIcon, MenuItem, StorefrontShell, type NavLink } from '@seamwright/shared/ui/frame';
import { NextDeliverySlot } from './next-delivery-slot';

/** The buyers' application: its frame around the routed page. */
@Component({
  selector: 'sw-root',
  imports: [Disclosure, FrameIcon, MenuItem, NextDeliverySlot, RouterLink, StorefrontShell],
  templateUrl: './app.html',
  styleUrl: './app.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {
  readonly #store = inject(Store);

  protected readonly person = this.#store.selectSignal(selectPerson);
  protected readonly basketCount = this.#store.selectSignal(basketFeature.selectCount);
  protected readonly links = computed<readonly NavLink[]>(() => (this.person() ? this.#places() : []));
  protected readonly basketLabel = computed(
    () => $localize`:@@storefront.basket:Basket, ${this.basketCount()}:count: lines`,
  );

  readonly #roles = this.#store.selectSignal(selectRoles);
  readonly #places = computed<readonly NavLink[]>(() => [
    { label: $localize`:@@storefront.nav.catalogue:Catalogue`, path: '/catalogue' },
    { label: $localize`:@@storefront.nav.orders:Orders`, path: '/orders' },
    { label: $localize`:@@storefront.nav.quotes:Quotes`, path: '/quotes' },
    { label: $localize`:@@storefront.nav.invoices:Invoices`, path: '/invoices' },
    ...(this.#roles().includes('buyer_owner')
      ? [{ label: $localize`:@@storefront.nav.team:Team`, path: '/team' }]
      : []),
  ]);

  protected signOut(): void {
    this.#store.dispatch(SessionActions.signOutAsked());
  }
}
