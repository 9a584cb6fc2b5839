import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  inject,
  input,
  signal,
  untracked,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { Store } from '@ngrx/store';
import type { CustomerView, GroupView } from '@seamwright/identity/contracts';
import {
  CustomerPageActions,
  CustomersApi,
  PeopleEditor,
  selectCustomer,
  selectRoles,
  SitesEditor,
} from '@seamwright/identity/data-access';
import { customerKindName, PeopleBoard, SitesBoard } from '@seamwright/identity/ui';
import { Chip, ErrorState, Loading, PageHead } from '@seamwright/shared/ui';
import { CustomerFactsCard } from './customer-facts';
import { CustomerSummary } from './customer-summary';

/** One customer: its facts, its addresses, its people. */
@Component({
  selector: 'sw-customer-page',
  imports: [Chip, CustomerFactsCard, CustomerSummary, ErrorState, Loading, PageHead, PeopleBoard, SitesBoard],
  providers: [PeopleEditor, SitesEditor],
  templateUrl: './customer.page.html',
  host: { class: 'sw-page sw-stack' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomerPage {
  /** From the address. */
  readonly customerId = input.required<string>();

  readonly #store = inject(Store);
  readonly #roles = this.#store.selectSignal(selectRoles);
  protected readonly remote = this.#store.selectSignal(selectCustomer);
  protected readonly customer = computed(() => {
    const { data } = this.remote();
    return data?.id === this.customerId() ? data : null;
  });
  protected readonly sites = inject(SitesEditor);
  protected readonly people = inject(PeopleEditor);
  protected readonly groups = signal<readonly GroupView[]>([]);
  protected readonly keeps = computed(() => this.#holds('admin', 'accounts'));
  protected readonly keepsSites = computed(() => this.#holds('admin', 'accounts', 'rep'));
  protected readonly looksAfter = computed(() => this.#holds('admin', 'rep'));
  protected readonly crumbs = [{ label: $localize`:@@identity.customers.title:Customers`, path: '/customers' }];
  protected readonly sub = computed(() => {
    const customer = this.customer();
    if (!customer) return '';
    const words = [customerKindName(customer.kind), this.#number(customer), customer.groupName];
    return words.filter((word) => word !== null).join(' · ');
  });

  constructor() {
    effect(() => {
      const customerId = this.customerId();
      untracked(() => {
        this.load();
        this.sites.open(customerId);
        if (this.looksAfter()) this.people.open({ customerId });
      });
    });
    inject(CustomersApi)
      .groups()
      .pipe(takeUntilDestroyed(inject(DestroyRef)))
      .subscribe({ next: (groups) => this.groups.set(groups), error: () => this.groups.set([]) });
  }

  protected load(): void {
    this.#store.dispatch(CustomerPageActions.opened({ customerId: this.customerId() }));
  }

  protected received(customer: CustomerView): void {
    this.#store.dispatch(CustomerPageActions.received({ customer }));
  }

  #holds(...roles: readonly string[]): boolean {
    return this.#roles().some((role) => roles.includes(role));
  }

  #number({ number }: CustomerView): string {
    return $localize`:@@identity.customer.numbered:number ${String(number)}:number:`;
  }
}
