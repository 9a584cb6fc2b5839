import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';
import type { Answer, CallInput } from '@seamwright/shared/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import {
  addSite,
  createCustomer,
  createGroup,
  getCustomer,
  listCustomers,
  listGroups,
  listSites,
  updateCustomer,
  updateSite,
  type CustomerFacts,
  type CustomerView,
  type GroupView,
  type SiteFacts,
  type SiteView,
} from '@seamwright/identity/contracts';

/** Customers, their sites and groups. */
@Injectable({ providedIn: 'root' })
export class CustomersApi {
  readonly #api = inject(ApiClient);

  list(query: CallInput<typeof listCustomers>['query'] = {}): Observable<Answer<typeof listCustomers>> {
    return this.#api.call(listCustomers, { query });
  }

  get(customerId: string): Observable<CustomerView> {
    return this.#api.call(getCustomer, { params: { customerId } });
  }

  /** The key stays the same for every try of one new account. */
  create(facts: CustomerFacts, idempotencyKey: string): Observable<CustomerView> {
    return this.#api.call(createCustomer, { body: facts, idempotencyKey });
  }

  update(
    customerId: string,
    facts: CustomerFacts & { readonly active: boolean },
    rowVersion: number,
  ): Observable<CustomerView> {
    return this.#api.call(updateCustomer, { params: { customerId }, body: facts, ifMatch: rowVersion });
  }

  sites(customerId: string): Observable<SiteView[]> {
    return this.#api.call(listSites, { params: { customerId } }).pipe(map(({ items }) => items));
  }

  /** The key stays the same for every try of one new site. */
  addSite(customerId: string, facts: SiteFacts, idempotencyKey: string): Observable<SiteView> {
    return this.#api.call(addSite, { params: { customerId }, body: facts, idempotencyKey });
  }

  updateSite(
    site: Pick<SiteView, 'id' | 'customerId' | 'rowVersion'>,
    facts: SiteFacts & { readonly active: boolean },
  ) {
    const params = { customerId: site.customerId, siteId: site.id };
    return this.#api.call(updateSite, { params, body: facts, ifMatch: site.rowVersion });
  }

  groups(): Observable<GroupView[]> {
    return this.#api.call(listGroups, {}).pipe(map(({ items }) => items));
  }

  createGroup(name: string, idempotencyKey: string): Observable<GroupView> {
    return this.#api.call(createGroup, { body: { name }, idempotencyKey });
  }
}
