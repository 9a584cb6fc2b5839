import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import { listLotNodes, receiveLot, type LotWire } from '@seamwright/stock/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import type { Answer, CallInput } from '@seamwright/shared/contracts';

export type LotPrimal = Answer<typeof listLotNodes>['items'][number];
export type LotReceipt = CallInput<typeof receiveLot>['body'];

/** Booking a lot in: a form that is sent once and keeps nothing. */
@Injectable({ providedIn: 'root' })
export class LotReceipts {
  readonly #api = inject(ApiClient);

  primals(): Observable<{ items: LotPrimal[] }> {
    return this.#api.call(listLotNodes, {});
  }

  /** The same key is sent again when the same lot is booked again. */
  receive(lot: LotReceipt, idempotencyKey: string): Observable<LotWire> {
    return this.#api.call(receiveLot, { body: lot, idempotencyKey });
  }
}
