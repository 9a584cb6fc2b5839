import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatButtonToggle, MatButtonToggleGroup } from '@angular/material/button-toggle';
import { Router } from '@angular/router';
import { Store } from '@ngrx/store';
import type { InvoiceListItem } from '@seamwright/accounts/contracts';
import { InvoiceListPageActions, invoicesFeature, type InvoiceSearch } from '@seamwright/accounts/data-access';
import { InvoiceStandingChip } from '@seamwright/accounts/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell } from '@seamwright/shared/ui/table';
import { CustomerFilter } from './customer-filter';
import { deskColumns } from './invoice-columns';
import { standingFilters, standingOf } from './standing-filters';

/** Everybody's invoices, newest first, by standing and customer. */
@Component({
  selector: 'sw-desk-invoices-page',
  imports: [
    Card,
    CustomerFilter,
    DataTable,
    Empty,
    ErrorState,
    InvoiceStandingChip,
    MatButton,
    MatButtonToggle,
    MatButtonToggleGroup,
    PageHead,
    TableCell,
  ],
  templateUrl: './desk-invoices.page.html',
  styleUrl: './invoices.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskInvoicesPage {
  /** From the address: which invoices are shown. */
  readonly standing = input<string>();
  readonly customer = input<string>();

  private readonly store = inject(Store);
  private readonly router = inject(Router);

  protected readonly search = computed<InvoiceSearch>(() => ({
    standing: standingOf(this.standing()),
    customerId: this.customer() || null,
  }));
  protected readonly narrowed = computed(() => this.search().standing !== null || this.search().customerId !== null);
  protected readonly list = this.store.selectSignal(invoicesFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(invoicesFeature.selectHasMore);
  protected readonly rows = computed(() => this.list().data ?? []);
  protected readonly loading = computed(() => this.list().status === 'loading');
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly filters = standingFilters;
  protected readonly columns = deskColumns;
  protected readonly idOf = ({ id }: InvoiceListItem): string => id;
  protected readonly linkOf = ({ id }: InvoiceListItem): readonly string[] => ['/invoices', id];

  constructor() {
    effect(() => {
      this.search();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(InvoiceListPageActions.opened({ search: this.search() }));
  }

  protected more(): void {
    this.store.dispatch(InvoiceListPageActions.moreWanted());
  }

  protected show(change: { readonly standing?: string; readonly customer?: string | null }): void {
    const { standing, customerId } = this.search();
    const wanted = { standing: standing ?? '', customer: customerId, ...change };
    void this.router.navigate(['/invoices'], {
      queryParams: { standing: wanted.standing || null, customer: wanted.customer },
    });
  }
}
