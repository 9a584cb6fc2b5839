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
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { RouterLink } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import { OrderPageActions, OrdersApiActions, ordersFeature } from '@seamwright/ordering/data-access';
import {
  OrderHistory,
  OrderLines,
  OrderPayment,
  OrderSeam,
  OrderStageChip,
  OrderTotalsBox,
  sourceWord,
} from '@seamwright/ordering/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, ErrorState, Loading, PageHead, Stale, Toast } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** One order as the desk sees it; it can be cancelled with a reason until it is released to the floor. */
@Component({
  selector: 'sw-desk-order-page',
  imports: [
    Card,
    ErrorState,
    Loading,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    OrderHistory,
    OrderLines,
    OrderPayment,
    OrderSeam,
    OrderStageChip,
    OrderTotalsBox,
    PageHead,
    RouterLink,
    Stale,
  ],
  templateUrl: './desk-order.page.html',
  styleUrl: './desk-order.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskOrderPage {
  readonly orderId = input.required<string>();

  private readonly store = inject(Store);
  private readonly toast = inject(Toast);
  private readonly locale = inject(LOCALE_ID);

  protected readonly order = this.store.selectSignal(ordersFeature.selectOrder);
  protected readonly cancelling = this.store.selectSignal(ordersFeature.selectCancelling);
  protected readonly stale = computed(() => this.cancelling().problem?.code === 'stale');
  /** Whether the reason for cancelling is being asked for, and what is typed so far. */
  protected readonly asking = signal(false);
  protected readonly reason = signal('');
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly crumbs = [{ label: $localize`:@@deskOrder.crumb:Orders`, path: '/orders' }];

  constructor() {
    effect(() => {
      this.orderId();
      untracked(() => this.load());
    });
    inject(Actions)
      .pipe(ofType(OrdersApiActions.cancelled), takeUntilDestroyed())
      .subscribe(({ order: { number } }) => {
        this.asking.set(false);
        this.reason.set('');
        void this.toast.show({ text: $localize`:@@deskOrder.cancelledToast:Order ${number}:number: is cancelled.` });
      });
  }

  protected load(): void {
    this.store.dispatch(OrderPageActions.opened({ orderId: this.orderId() }));
  }

  protected headingOf({ number, customer }: OrderDetail): string {
    return $localize`:@@deskOrder.heading:Order ${number}:number: of ${customer.name}:customer:`;
  }

  protected subOf({ customer, deliveryDay, site, source, placedBy }: OrderDetail): string {
    const day = isPlantDate(deliveryDay) ? formatPlantDate(deliveryDay, 'long', this.locale) : deliveryDay;
    const by = placedBy === null ? sourceWord(source) : `${sourceWord(source)}, ${placedBy}`;
    // A customer with one site often has its name.
    return [day, ...(site.name === customer.name ? [] : [site.name]), by].join(' · ');
  }

  protected cancel({ id, rowVersion }: OrderDetail): void {
    const reason = this.reason().trim();
    if (reason !== '') this.store.dispatch(OrderPageActions.cancelPressed({ orderId: id, rowVersion, reason }));
  }
}
