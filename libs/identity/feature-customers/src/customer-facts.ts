import { ChangeDetectionStrategy, Component, DestroyRef, inject, input, output, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Problem } from '@seamwright/shared/contracts';
import type { CustomerView, GroupView } from '@seamwright/identity/contracts';
import { CustomersApi } from '@seamwright/identity/data-access';
import { customerKindName, differences, NewerState, termsFromName, type NewerValue } from '@seamwright/identity/ui';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, Toast } from '@seamwright/shared/ui';
import { CustomerForm, type CustomerFormValue } from './customer-form';

/** A customer's facts, changed in place. When somebody else saved first, the newer state is offered. */
@Component({
  selector: 'sw-customer-facts',
  imports: [Card, CustomerForm, NewerState],
  template: `
    <sw-card heading="Account and terms" i18n-heading="@@identity.customer.facts">
      @if (newer()) {
        <sw-newer-state [values]="newerValues()" (take)="takeNewer()" (keep)="newer.set(null)" />
      }
      <sw-customer-form
        [customer]="customer()"
        [groups]="groups()"
        [saving]="saving()"
        [problem]="refused()"
        (save)="save($event)"
      />
    </sw-card>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomerFactsCard {
  readonly customer = input.required<CustomerView>();
  readonly groups = input<readonly GroupView[]>([]);
  /** The customer as it is on the server now. */
  readonly received = output<CustomerView>();

  readonly #api = inject(CustomersApi);
  readonly #toast = inject(Toast);
  readonly #destroyed = inject(DestroyRef);
  protected readonly saving = signal(false);
  protected readonly refused = signal<Problem | null>(null);
  protected readonly newer = signal<CustomerView | null>(null);
  protected readonly newerValues = signal<readonly NewerValue[]>([]);
  #rowVersion: number | null = null;

  protected save({ ...facts }: CustomerFormValue): void {
    const { id, rowVersion } = this.customer();
    this.saving.set(true);
    this.refused.set(null);
    this.#api
      .update(id, facts, this.#rowVersion ?? rowVersion)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({
        next: (saved) => {
          this.#settle(saved);
          void this.#toast.show({ text: $localize`:@@identity.customer.saved:${saved.name}:name: was saved.` });
        },
        error: (error: unknown) => this.#keep(asProblem(error)),
      });
  }

  protected takeNewer(): void {
    const newer = this.newer();
    if (newer) this.#settle(newer);
  }

  #settle(customer: CustomerView): void {
    this.saving.set(false);
    this.newer.set(null);
    this.#rowVersion = null;
    this.received.emit(customer);
  }

  #keep(problem: Problem): void {
    this.saving.set(false);
    if (problem.code !== 'stale') return this.refused.set(problem);
    this.#api
      .get(this.customer().id)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({
        next: (now) => {
          this.#rowVersion = now.rowVersion;
          this.newerValues.set(differences(this.customer(), now, FIELDS));
          this.newer.set(now);
        },
        error: (error: unknown) => this.refused.set(asProblem(error)),
      });
  }
}

const FIELDS: Parameters<typeof differences<CustomerView>>[2] = [
  { key: 'name', label: $localize`:@@identity.customer.name:Name` },
  { key: 'kind', label: $localize`:@@identity.customer.kind:Kind`, say: ({ kind }) => customerKindName(kind) },
  { key: 'groupId', label: $localize`:@@identity.customer.group:Group`, say: ({ groupName }) => groupName ?? '–' },
  { key: 'billingAddress', label: $localize`:@@identity.customer.billing:Billing address` },
  { key: 'invoiceEmail', label: $localize`:@@identity.customer.invoiceEmail:Invoices go to` },
  { key: 'vatNumber', label: $localize`:@@identity.customer.vat:VAT number` },
  { key: 'termsDays', label: $localize`:@@identity.customer.terms:Pays within` },
  {
    key: 'termsFrom',
    label: $localize`:@@identity.customer.termsFrom:Counted`,
    say: ({ termsFrom }) => termsFromName(termsFrom),
  },
  {
    key: 'active',
    label: $localize`:@@identity.person.state:State`,
    say: ({ active }) =>
      active ? $localize`:@@identity.customer.active:active` : $localize`:@@identity.customer.inactive:not active`,
  },
];
