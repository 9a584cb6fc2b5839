import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';
import { listCards, listPayments, type CardWire } from '@seamwright/accounts/contracts';
import { ApiClient } from '@seamwright/shared/data-access';

/** The cards that the buyer's customer keeps, to choose from when an order is paid by card. */
@Injectable({ providedIn: 'root' })
export class PaymentCards {
  readonly #api = inject(ApiClient);

  list(): Observable<readonly CardWire[]> {
    return this.#api.call(listCards, {}).pipe(map(({ items }) => items));
  }

  /** Where the bank asks the holder to confirm the newest payment of an order; empty when it does not. */
  confirmationOf(orderId: string): Observable<string> {
    return this.#api
      .call(listPayments, { query: { orderId, limit: 1 } })
      .pipe(map(({ items: [newest] }) => newest?.actionUrl ?? ''));
  }
}
