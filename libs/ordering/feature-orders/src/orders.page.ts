import { ChangeDetectionStrategy, Component, computed, inject, LOCALE_ID } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { OrderListItem } from '@seamwright/ordering/contracts';
import { OrderListPageActions, ordersFeature } from '@seamwright/ordering/data-access';
import { OrderStageChip, paymentWords } from '@seamwright/ordering/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';

/** The buyer's orders, newest first. */
@Component({
  selector: 'sw-orders-page',
  imports: [Card, DataTable, Empty, ErrorState, MatButton, OrderStageChip, PageHead, RouterLink, TableCell],
  templateUrl: './orders.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrdersPage {
  private readonly store = inject(Store);
  private readonly locale = inject(LOCALE_ID);

  protected readonly list = this.store.selectSignal(ordersFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(ordersFeature.selectHasMore);
  protected readonly rows = computed(() => this.list().data ?? []);
  protected readonly loading = computed(() => this.list().status === 'loading');
  /** The site is told where there is more than one. */
  protected readonly columns = computed(() =>
    new Set(this.rows().map(({ site }) => site.id)).size > 1
      ? this.#columns
      : this.#columns.filter(({ key }) => key !== 'site'),
  );
  readonly #columns: readonly TableColumn<OrderListItem>[] = [
    {
      key: 'number',
      label: $localize`:@@orders.column.number:Order`,
      kind: 'code',
      value: ({ number }) => String(number),
    },
    { key: 'deliveryDay', label: $localize`:@@orders.column.day:Delivery`, kind: 'date', sortable: true },
    { key: 'site', label: $localize`:@@orders.column.site:Site`, kind: 'text', value: ({ site }) => site.name },
    { key: 'stage', label: $localize`:@@orders.column.stage:Stage`, kind: 'template' },
    {
      key: 'payment',
      label: $localize`:@@orders.column.payment:Payment`,
      kind: 'text',
      value: ({ payment }) => paymentWords(payment, HOUSE_CURRENCY, this.locale).word,
    },
    { key: 'lines', label: $localize`:@@orders.column.lines:Lines`, kind: 'count' },
    {
      key: 'total',
      label: $localize`:@@orders.column.total:Total`,
      kind: 'money',
      value: ({ totals }) => (totals.packed ?? totals.estimate).totalMinor,
    },
  ];
  protected readonly idOf = (order: OrderListItem): string => order.id;
  protected readonly linkOf = (order: OrderListItem): readonly string[] => ['/orders', order.id];

  constructor() {
    this.load();
  }

  protected load(): void {
    this.store.dispatch(OrderListPageActions.opened({ search: { deliveryDay: null, state: null, customerId: null } }));
  }

  protected more(): void {
    this.store.dispatch(OrderListPageActions.moreWanted());
  }
}
