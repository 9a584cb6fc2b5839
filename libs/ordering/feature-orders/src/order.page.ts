import { NgTemplateOutlet } from '@angular/common';
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
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { OrderCards } from '@seamwright/accounts/data-access';
import { OrderCard } from '@seamwright/accounts/ui';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import { OrderPageActions, OrdersApiActions, ordersFeature } from '@seamwright/ordering/data-access';
import {
  OrderHistory,
  OrderLines,
  OrderPayment,
  OrderSeam,
  OrderStageChip,
  OrderTotalsBox,
} from '@seamwright/ordering/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Confirm, ErrorState, Loading, PageHead, Stale, Toast } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** One order as its buyer sees it: its seam, expected and real weights, how it is paid, and what happened to it. */
@Component({
  selector: 'sw-order-page',
  imports: [
    Card,
    ErrorState,
    Loading,
    MatButton,
    NgTemplateOutlet,
    OrderCard,
    OrderHistory,
    OrderLines,
    OrderPayment,
    OrderSeam,
    OrderStageChip,
    OrderTotalsBox,
    PageHead,
    Stale,
  ],
  providers: [OrderCards],
  templateUrl: './order.page.html',
  styleUrl: './order.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderPage {
  readonly orderId = input.required<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly toast = inject(Toast);
  private readonly locale = inject(LOCALE_ID);

  protected readonly order = this.store.selectSignal(ordersFeature.selectOrder);
  protected readonly cancelling = this.store.selectSignal(ordersFeature.selectCancelling);
  protected readonly orderCards = inject(OrderCards);
  protected readonly stale = computed(() =>
    [this.cancelling(), this.orderCards.paying()].some(({ problem }) => problem?.code === 'stale'),
  );
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly crumbs = [{ label: $localize`:@@order.crumb:Orders`, path: '/orders' }];

  constructor() {
    effect(() => {
      this.orderId();
      untracked(() => this.load());
    });
    inject(Actions)
      .pipe(ofType(OrdersApiActions.cancelled), takeUntilDestroyed())
      .subscribe(({ order: { number } }) => {
        void this.toast.show({ text: $localize`:@@order.cancelledToast:Order ${number}:number: is cancelled.` });
      });
  }

  protected load(): void {
    this.store.dispatch(OrderPageActions.opened({ orderId: this.orderId() }));
  }

  protected headingOf({ number, deliveryDay }: OrderDetail): string {
    const day = isPlantDate(deliveryDay) ? formatPlantDate(deliveryDay, 'long', this.locale) : deliveryDay;
    return $localize`:@@order.heading:Order ${number}:number: for ${day}:day:`;
  }

  protected untilOf({ cutOffAt }: OrderDetail): string {
    const format = new Intl.DateTimeFormat(this.locale, {
      weekday: 'long',
      hour: '2-digit',
      minute: '2-digit',
      timeZone: 'Europe/London',
    });
    return $localize`:@@order.until:It can be cancelled until ${format.format(new Date(cutOffAt))}:time:.`;
  }

  protected async cancel({ id, number, rowVersion, settlement }: OrderDetail): Promise<void> {
    const agreed = await this.confirm.ask({
      heading: $localize`:@@order.cancel.heading:Cancel order ${number}:number:?`,
      text:
        settlement === 'card'
          ? $localize`:@@order.cancel.card:Nothing will be cut for it, and what is held on the card is let go.`
          : $localize`:@@order.cancel.account:Nothing will be cut for it, and nothing is charged.`,
      act: $localize`:@@order.cancel.act:Cancel the order`,
      back: $localize`:@@order.cancel.back:Keep it`,
      destructive: true,
    });
    if (agreed) this.store.dispatch(OrderPageActions.cancelPressed({ orderId: id, rowVersion, reason: '' }));
  }
}
