import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { Problem } from '@seamwright/shared/contracts';
import type { GroupView } from '@seamwright/identity/contracts';
import { CustomersApi } from '@seamwright/identity/data-access';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, PageHead } from '@seamwright/shared/ui';
import { newId } from '@seamwright/shared/util';
import { CustomerForm, type CustomerFormValue } from './customer-form';

/** Opens an account; its sites and people follow on its page. */
@Component({
  selector: 'sw-new-customer-page',
  imports: [Card, CustomerForm, MatButton, PageHead, RouterLink],
  template: `
    <sw-page-head
      heading="New customer"
      i18n-heading="@@identity.customers.new"
      sub="Delivery addresses and people follow on the next page."
      i18n-sub="@@identity.customers.newSub"
      [crumbs]="crumbs"
    />
    <sw-card>
      <sw-customer-form [groups]="groups()" [saving]="saving()" [problem]="refused()" (save)="save($event)">
        <a matButton="outlined" routerLink="/customers" i18n="@@identity.form.cancel">Cancel</a>
      </sw-customer-form>
    </sw-card>
  `,
  host: { class: 'sw-page sw-stack' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewCustomerPage {
  readonly #api = inject(CustomersApi);
  readonly #router = inject(Router);
  readonly #destroyed = inject(DestroyRef);
  /** The same for every try, so that a lost answer opens no second account; another after a refusal. */
  #key = newId();
  protected readonly crumbs = [{ label: $localize`:@@identity.customers.title:Customers`, path: '/customers' }];
  protected readonly groups = signal<readonly GroupView[]>([]);
  protected readonly saving = signal(false);
  protected readonly refused = signal<Problem | null>(null);

  constructor() {
    this.#api
      .groups()
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({ next: (groups) => this.groups.set(groups), error: () => this.groups.set([]) });
  }

  protected save({ active: _active, ...facts }: CustomerFormValue): void {
    this.saving.set(true);
    this.refused.set(null);
    this.#api
      .create(facts, this.#key)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({
        next: ({ id }) => void this.#router.navigate(['/customers', id]),
        error: (error: unknown) => {
          const problem = asProblem(error);
          if (problem.status >= 400 && problem.status < 500) this.#key = newId();
          this.saving.set(false);
          this.refused.set(problem);
        },
      });
  }
}
