import { ChangeDetectionStrategy, Component, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { OrderCards } from '@seamwright/accounts/data-access';
import { OrderCard } from '@seamwright/accounts/ui';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import { OrderPageActions, ordersFeature } from '@seamwright/ordering/data-access';
import { OrderPayment, OrderSeam, OrderTotalsBox } from '@seamwright/ordering/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, ErrorState, Loading, PageHead } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** What became of the basket: the order with its seam, and how the card stands. */
@Component({
  selector: 'sw-placed-page',
  imports: [
    Card,
    ErrorState,
    Loading,
    MatButton,
    OrderCard,
    OrderPayment,
    OrderSeam,
    OrderTotalsBox,
    PageHead,
    RouterLink,
  ],
  providers: [OrderCards],
  templateUrl: './placed.page.html',
  styles: `
    .pair {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(360px, 100%), 1fr));
      gap: 24px;
      align-items: start;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlacedPage {
  readonly orderId = input.required<string>();

  private readonly store = inject(Store);

  protected readonly order = this.store.selectSignal(ordersFeature.selectOrder);
  protected readonly orderCards = inject(OrderCards);
  protected readonly currency = HOUSE_CURRENCY;

  constructor() {
    effect(() => {
      this.orderId();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(OrderPageActions.opened({ orderId: this.orderId() }));
  }

  protected headingOf({ number, stage }: OrderDetail): string {
    return stage === 'waiting'
      ? $localize`:@@placed.waiting:Order ${number}:number: is placed and waits for payment`
      : $localize`:@@placed.confirmed:Order ${number}:number: is confirmed`;
  }

  protected subOf({ deliveryDay, site }: OrderDetail): string {
    const day = isPlantDate(deliveryDay) ? formatPlantDate(deliveryDay, 'long') : deliveryDay;
    return $localize`:@@placed.sub:For ${day}:day:, ${site.name}:site:.`;
  }
}
