import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';
import { listDeliveryDays, type DeliveryDaysAnswer } from '@seamwright/ordering/contracts';
import type { CallInput } from '@seamwright/shared/contracts';
import { ApiClient } from '@seamwright/shared/data-access';

export type DaysQuestion = NonNullable<CallInput<typeof listDeliveryDays>['query']>;

/** The next delivery days, and how far the server's clock is ahead of this device's, in milliseconds. */
export interface DeliveryDaysNow extends DeliveryDaysAnswer {
  readonly clockAheadMs: number;
}

/** Asks which days can be ordered for. The time left is counted by the server's clock, not the device's. */
@Injectable({ providedIn: 'root' })
export class DeliveryDays {
  readonly #api = inject(ApiClient);

  next(query: DaysQuestion): Observable<DeliveryDaysNow> {
    return this.#api
      .call(listDeliveryDays, { query })
      .pipe(map((answer) => ({ ...answer, clockAheadMs: Date.parse(answer.serverTime) - Date.now() })));
  }
}

/** Whole minutes from the device's `now` to the cut-off, never rounded up; below zero when it has passed. */
export const minutesLeft = (cutOffAt: string, now: number, clockAheadMs: number): number =>
  Math.floor((Date.parse(cutOffAt) - now - clockAheadMs) / 60_000);
