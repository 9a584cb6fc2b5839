import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  LOCALE_ID,
  signal,
  untracked,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { PaymentWire } from '@seamwright/accounts/contracts';
import {
  holdEndsSoon,
  paymentsFeature,
  PaymentsPageActions,
  type PaymentSearch,
} from '@seamwright/accounts/data-access';
import { PAYMENT_STATES } from '@seamwright/accounts/domain';
import { CardPayment, instantWords, PaymentStateChip, paymentStateWords } from '@seamwright/accounts/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Chip, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';

/** Card payments, newest first: what is held, taken and let go, and what ends soon. */
@Component({
  selector: 'sw-payments-page',
  imports: [
    Card,
    CardPayment,
    Chip,
    DataTable,
    Empty,
    ErrorState,
    MatButton,
    MatFormField,
    MatLabel,
    MatSelectModule,
    PageHead,
    PaymentStateChip,
    RouterLink,
    TableCell,
  ],
  templateUrl: './payments.page.html',
  styleUrl: './payments.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PaymentsPage {
  /** From the address: which payments are shown, and which is looked at. */
  readonly state = input<string>();
  readonly orderId = input<string>();
  readonly payment = input<string>();

  private readonly store = inject(Store);
  private readonly router = inject(Router);
  private readonly locale = inject(LOCALE_ID);
  private readonly now = signal(new Date());

  protected readonly search = computed<PaymentSearch>(() => ({
    state: PAYMENT_STATES.find((state) => state === this.state()) ?? null,
    customerId: null,
    orderId: this.orderId() || null,
  }));
  protected readonly narrowed = computed(() => this.search().state !== null || this.search().orderId !== null);
  protected readonly list = this.store.selectSignal(paymentsFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(paymentsFeature.selectHasMore);
  protected readonly rows = computed(() => this.list().data ?? []);
  protected readonly loading = computed(() => this.list().status === 'loading');
  protected readonly looked = computed(() => {
    const id = this.payment();
    return id ? (this.rows().find((row) => row.id === id) ?? null) : null;
  });
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly states = PAYMENT_STATES.map((state) => ({ state, word: paymentStateWords(state).word }));
  protected readonly columns: readonly TableColumn<PaymentWire>[] = [
    {
      key: 'order',
      label: $localize`:@@payments.column.order:Order`,
      kind: 'template',
      value: ({ order }) => order.number,
    },
    {
      key: 'customer',
      label: $localize`:@@payments.column.customer:Customer`,
      kind: 'text',
      sortable: true,
      value: ({ customer }) => customer.name,
    },
    { key: 'state', label: $localize`:@@payments.column.state:State`, kind: 'template' },
    { key: 'holdMinor', label: $localize`:@@payments.column.held:Held`, kind: 'money', sortable: true },
    {
      key: 'capturedMinor',
      label: $localize`:@@payments.column.taken:Taken`,
      kind: 'money',
      sortable: true,
      value: ({ capturedMinor, state }) => (state === 'captured' ? capturedMinor : null),
    },
    { key: 'letGoMinor', label: $localize`:@@payments.column.letGo:Let go`, kind: 'money' },
    {
      key: 'createdAt',
      label: $localize`:@@payments.column.asked:Asked`,
      kind: 'code',
      value: ({ createdAt }) => instantWords(createdAt, this.locale),
    },
    { key: 'more', label: $localize`:@@payments.column.more:More`, kind: 'template', align: 'end' },
  ];
  protected readonly idOf = ({ id }: PaymentWire): string => id;

  constructor() {
    effect(() => {
      this.search();
      untracked(() => this.load());
    });
    // The payment that the address names may stand further back; what failed is tried again by the person only.
    effect(() => {
      if (!this.payment() || this.looked() || this.list().status !== 'loaded' || !this.hasMore()) return;
      untracked(() => this.more());
    });
  }

  protected load(): void {
    this.now.set(new Date());
    this.store.dispatch(PaymentsPageActions.opened({ search: this.search() }));
  }

  protected more(): void {
    this.store.dispatch(PaymentsPageActions.moreWanted());
  }

  protected endsSoon(payment: PaymentWire): boolean {
    return holdEndsSoon(payment, this.now());
  }

  protected ends({ holdEndsAt }: PaymentWire): string {
    return holdEndsAt === null ? '' : instantWords(holdEndsAt, this.locale);
  }

  protected show(change: { readonly state?: string; readonly orderId?: null; readonly payment?: string | null }): void {
    void this.router.navigate(['/payments'], {
      queryParams: {
        state: change.state === undefined ? this.search().state : change.state || null,
        orderId: change.orderId === undefined ? this.search().orderId : change.orderId,
        payment: change.payment ?? null,
      },
    });
  }
}
