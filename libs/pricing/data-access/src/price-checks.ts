import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import { checkPrices, type PricedLine } from '@seamwright/pricing/contracts';
import type { Answer, CallInput } from '@seamwright/shared/contracts';
import { ApiClient } from '@seamwright/shared/data-access';

export type PriceCheck = CallInput<typeof checkPrices>['body'];
export type PriceCheckAnswer = Answer<typeof checkPrices>;
export type { PricedLine };

/** Asks what lines will weigh and cost, and why. Nothing is kept: each answer belongs to the page that asked. */
@Injectable({ providedIn: 'root' })
export class PriceChecks {
  readonly #api = inject(ApiClient);

  check(body: PriceCheck): Observable<PriceCheckAnswer> {
    return this.#api.call(checkPrices, { body });
  }
}
