import { computed, inject, Injectable, type Signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { Store } from '@ngrx/store';
import { catchError, distinctUntilChanged, filter, of, switchMap } from 'rxjs';
import type { CardWire } from '@seamwright/accounts/contracts';
import { OrderPageActions, ordersFeature } from '@seamwright/ordering/data-access';
import { checkOtherCard } from '@seamwright/ordering/domain';
import { PaymentCards } from './payment-cards';

const NO_CARDS: readonly CardWire[] = [];

/** What can be done about the card of the open order. Provided by the page that shows the order. */
@Injectable()
export class OrderCards {
  readonly #store = inject(Store);
  readonly #cards = inject(PaymentCards);
  readonly #order = this.#store.selectSignal(ordersFeature.selectOrder);
  readonly #payment = computed(() => this.#order().data?.payment ?? null);

  readonly paying = this.#store.selectSignal(ordersFeature.selectPaying);
  /** Whether another card may be tried now. */
  readonly mayTry = computed(() => {
    const order = this.#order().data;
    if (!order || order.settlement !== 'card') return false;
    return checkOtherCard({ ...order, cardState: order.payment?.state ?? null }).ok;
  });
  readonly declineCode = computed(() => this.#payment()?.declineCode ?? null);
  /** Fetched once another card may be tried. Cards that can't be fetched leave the desk to be rung. */
  readonly cards: Signal<readonly CardWire[]> = toSignal(
    toObservable(this.mayTry).pipe(
      filter(Boolean),
      switchMap(() => this.#cards.list().pipe(catchError(() => of(NO_CARDS)))),
    ),
    { initialValue: NO_CARDS },
  );
  /** Where the bank asks the holder to confirm; empty when it does not. */
  readonly confirmAt: Signal<string> = toSignal(
    toObservable(
      computed(() => (this.#payment()?.state === 'needs-action' ? (this.#order().data?.id ?? null) : null)),
    ).pipe(
      distinctUntilChanged(),
      switchMap((id) => (id === null ? of('') : this.#cards.confirmationOf(id).pipe(catchError(() => of(''))))),
    ),
    { initialValue: '' },
  );

  payWith(cardId: string): void {
    const order = this.#order().data;
    if (!order) return;
    const { id: orderId, rowVersion } = order;
    this.#store.dispatch(OrderPageActions.otherCardChosen({ orderId, rowVersion, cardId }));
  }
}
