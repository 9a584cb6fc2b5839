import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  LOCALE_ID,
  untracked,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatButtonToggle, MatButtonToggleGroup } from '@angular/material/button-toggle';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { selectRoles } from '@seamwright/identity/data-access/session';
import { ORDER_FILTERS, placeOrder, type OrderListItem } from '@seamwright/ordering/contracts';
import { OrderListPageActions, ordersFeature, type OrderSearch } from '@seamwright/ordering/data-access';
import { OrderStageChip, paymentWords, sourceWord, stageWord } from '@seamwright/ordering/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Chip, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { isPlantDate } from '@seamwright/shared/util';

const isFilter = (text: string | undefined): text is (typeof ORDER_FILTERS)[number] =>
  ORDER_FILTERS.some((state) => state === text);

/** Orders of all customers that the desk serves, by day and state. */
@Component({
  selector: 'sw-order-desk-page',
  imports: [
    Card,
    Chip,
    DataTable,
    Empty,
    ErrorState,
    MatButton,
    MatButtonToggle,
    MatButtonToggleGroup,
    MatFormField,
    MatInput,
    MatLabel,
    OrderStageChip,
    PageHead,
    RouterLink,
    TableCell,
  ],
  templateUrl: './order-desk.page.html',
  styleUrl: './order-desk.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderDeskPage {
  /** From the address: which orders are shown. */
  readonly day = input<string>();
  readonly state = input<string>();

  private readonly store = inject(Store);
  private readonly locale = inject(LOCALE_ID);
  private readonly router = inject(Router);

  protected readonly search = computed<OrderSearch>(() => {
    const [day, state] = [this.day(), this.state()];
    return {
      deliveryDay: day !== undefined && isPlantDate(day) ? day : null,
      state: isFilter(state) ? state : null,
      customerId: null,
    };
  });
  private readonly roles = this.store.selectSignal(selectRoles);
  /** Whether the person may order for a customer; others only look. */
  protected readonly mayPlace = computed(
    () => placeOrder.access.who === 'roles' && placeOrder.access.roles.some((role) => this.roles().includes(role)),
  );
  protected readonly list = this.store.selectSignal(ordersFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(ordersFeature.selectHasMore);
  protected readonly rows = computed(() => this.list().data ?? []);
  protected readonly loading = computed(() => this.list().status === 'loading');
  protected readonly filters = [
    { value: '', label: $localize`:@@desk.filter.all:All` },
    ...ORDER_FILTERS.map((state) => ({ value: state, label: stageWord(state) })),
  ];
  protected readonly columns: readonly TableColumn<OrderListItem>[] = [
    {
      key: 'number',
      label: $localize`:@@desk.column.number:Order`,
      kind: 'code',
      value: ({ number }) => String(number),
    },
    {
      key: 'customer',
      label: $localize`:@@desk.column.customer:Customer`,
      kind: 'text',
      value: ({ customer }) => customer.name,
      sortable: true,
    },
    { key: 'deliveryDay', label: $localize`:@@desk.column.day:Delivery`, kind: 'date', sortable: true },
    { key: 'stage', label: $localize`:@@desk.column.stage:Stage`, kind: 'template' },
    {
      key: 'payment',
      label: $localize`:@@desk.column.payment:Payment`,
      kind: 'text',
      value: ({ payment }) => paymentWords(payment, HOUSE_CURRENCY, this.locale).word,
    },
    {
      key: 'source',
      label: $localize`:@@desk.column.source:Came by`,
      kind: 'text',
      value: ({ source }) => sourceWord(source),
    },
    { key: 'lines', label: $localize`:@@desk.column.lines:Lines`, kind: 'count' },
    {
      key: 'total',
      label: $localize`:@@desk.column.total:Total`,
      kind: 'money',
      value: ({ totals }) => (totals.packed ?? totals.estimate).totalMinor,
      sortable: true,
    },
  ];
  protected readonly idOf = (order: OrderListItem): string => order.id;
  protected readonly linkOf = (order: OrderListItem): readonly string[] => ['/orders', order.id];

  constructor() {
    effect(() => {
      this.search();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(OrderListPageActions.opened({ search: this.search() }));
  }

  protected more(): void {
    this.store.dispatch(OrderListPageActions.moreWanted());
  }

  protected show(change: { readonly day?: string; readonly state?: string }): void {
    const { deliveryDay, state } = this.search();
    const wanted = { day: deliveryDay ?? '', state: state ?? '', ...change };
    void this.router.navigate(['/orders'], {
      queryParams: { day: wanted.day || null, state: wanted.state || null },
    });
  }
}
