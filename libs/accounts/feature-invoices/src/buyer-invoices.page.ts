import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatButtonToggle, MatButtonToggleGroup } from '@angular/material/button-toggle';
import { Router, RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { InvoiceListItem } from '@seamwright/accounts/contracts';
import { InvoiceListPageActions, invoicesFeature } from '@seamwright/accounts/data-access';
import { InvoiceStandingChip } from '@seamwright/accounts/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell } from '@seamwright/shared/ui/table';
import { buyerColumns } from './invoice-columns';
import { standingFilters, standingOf } from './standing-filters';

/** The buyer's invoices, newest first. */
@Component({
  selector: 'sw-buyer-invoices-page',
  imports: [
    Card,
    DataTable,
    Empty,
    ErrorState,
    InvoiceStandingChip,
    MatButton,
    MatButtonToggle,
    MatButtonToggleGroup,
    PageHead,
    RouterLink,
    TableCell,
  ],
  templateUrl: './buyer-invoices.page.html',
  styleUrl: './invoices.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BuyerInvoicesPage {
  /** From the address: which invoices are shown. */
  readonly standing = input<string>();

  private readonly store = inject(Store);
  private readonly router = inject(Router);

  protected readonly shown = computed(() => standingOf(this.standing()));
  protected readonly list = this.store.selectSignal(invoicesFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(invoicesFeature.selectHasMore);
  protected readonly rows = computed(() => this.list().data ?? []);
  protected readonly loading = computed(() => this.list().status === 'loading');
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly filters = standingFilters;
  protected readonly columns = buyerColumns;
  protected readonly idOf = ({ id }: InvoiceListItem): string => id;
  protected readonly linkOf = ({ id }: InvoiceListItem): readonly string[] => ['/invoices', id];

  constructor() {
    effect(() => {
      this.shown();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(InvoiceListPageActions.opened({ search: { standing: this.shown(), customerId: null } }));
  }

  protected more(): void {
    this.store.dispatch(InvoiceListPageActions.moreWanted());
  }

  protected show(standing: string): void {
    void this.router.navigate(['/invoices'], { queryParams: { standing: standing === '' ? null : standing } });
  }
}
