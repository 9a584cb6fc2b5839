import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';
import {
  getSpecification,
  searchSpecifications,
  type PublicSpecification,
  type SpecificationCard,
} from '@seamwright/catalogue/contracts';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomersApi } from '@seamwright/identity/data-access';
import { ApiClient } from '@seamwright/shared/data-access';

const SHOWN = 8;

/** What a rep picks from while writing a quote: customers by name, specifications by code or words. */
@Injectable({ providedIn: 'root' })
export class QuotePickers {
  readonly #api = inject(ApiClient);
  readonly #customers = inject(CustomersApi);

  customers(q: string): Observable<readonly CustomerView[]> {
    return this.#customers.list({ q, limit: SHOWN }).pipe(map(({ items }) => items.filter(({ active }) => active)));
  }

  specifications(q: string): Observable<readonly SpecificationCard[]> {
    return this.#api.call(searchSpecifications, { query: { q, limit: SHOWN } }).pipe(map(({ items }) => items));
  }

  /** A specification with its choices. */
  specification(code: string): Observable<PublicSpecification> {
    return this.#api.call(getSpecification, { params: { code } });
  }
}
