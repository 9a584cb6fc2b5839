import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import { placeOrder, type NewOrderWire, type OrderDetail } from '@seamwright/ordering/contracts';
import { ApiClient } from '@seamwright/shared/data-access';

/** Sends an order. The same key with the same order places it once, however often it is sent. */
@Injectable({ providedIn: 'root' })
export class OrderPlacing {
  readonly #api = inject(ApiClient);

  place(order: NewOrderWire, idempotencyKey: string): Observable<OrderDetail> {
    return this.#api.call(placeOrder, { body: order, idempotencyKey });
  }
}
