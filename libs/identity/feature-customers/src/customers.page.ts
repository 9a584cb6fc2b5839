import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { debounceTime } from 'rxjs';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomersPageActions, selectCustomersPage, selectRoles } from '@seamwright/identity/data-access';
import type { CustomerKind } from '@seamwright/identity/domain';
import { customerKindName, customerKindNames } from '@seamwright/identity/ui';
import { Card, Chip, Empty, ErrorState, Icon, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';

/** The customers by name, narrowed by words and kind. */
@Component({
  selector: 'sw-customers-page',
  imports: [
    Card,
    Chip,
    DataTable,
    Empty,
    ErrorState,
    Icon,
    MatButton,
    MatFormFieldModule,
    MatInput,
    MatSelectModule,
    PageHead,
    ReactiveFormsModule,
    RouterLink,
    TableCell,
  ],
  templateUrl: './customers.page.html',
  styleUrl: './customers.page.scss',
  host: { class: 'sw-page sw-stack' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomersPage {
  readonly #store = inject(Store);
  readonly #roles = this.#store.selectSignal(selectRoles);
  protected readonly page = this.#store.selectSignal(selectCustomersPage);
  protected readonly mayOpen = computed(() => this.#roles().some((role) => role === 'admin' || role === 'accounts'));
  protected readonly kinds = customerKindNames;
  protected readonly search = inject(NonNullableFormBuilder).group({ q: '', kind: '' as CustomerKind | '' });
  protected readonly columns: readonly TableColumn<CustomerView>[] = [
    { key: 'name', label: $localize`:@@identity.customer.name:Name`, kind: 'text' },
    // A name of a kind, not an amount: no separators, but in line at the right.
    {
      key: 'number',
      label: $localize`:@@identity.customer.number:Number`,
      kind: 'text',
      value: ({ number }) => String(number),
      align: 'end',
    },
    {
      key: 'kind',
      label: $localize`:@@identity.customer.kind:Kind`,
      kind: 'text',
      value: ({ kind }) => customerKindName(kind),
    },
    { key: 'groupName', label: $localize`:@@identity.customer.group:Group`, kind: 'text' },
    {
      key: 'termsDays',
      label: $localize`:@@identity.customer.termsShort:Terms`,
      kind: 'text',
      value: ({ termsDays }) => $localize`:@@identity.customer.days:${termsDays}:days: days`,
      align: 'end',
    },
    { key: 'active', label: $localize`:@@identity.person.state:State`, kind: 'template' },
  ];
  protected readonly rowId = ({ id }: CustomerView) => id;
  protected readonly rowLink = ({ id }: CustomerView) => ['/customers', id];

  constructor() {
    this.search.reset({ q: this.page().query.q, kind: this.page().query.kind ?? '' });
    this.load();
    this.search.valueChanges.pipe(debounceTime(200), takeUntilDestroyed()).subscribe(() => {
      const { q, kind } = this.search.getRawValue();
      this.#store.dispatch(CustomersPageActions.searched({ query: { q: q.trim(), kind: kind || null } }));
    });
  }

  protected load(): void {
    this.#store.dispatch(CustomersPageActions.opened());
  }

  protected more(): void {
    this.#store.dispatch(CustomersPageActions.moreWanted());
  }

  protected isActive(row: unknown): boolean {
    return (row as CustomerView).active;
  }
}
