import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { Money } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';

interface ShownTotal {
  readonly netMinor: number;
  readonly taxMinor: number;
  readonly totalMinor: number;
}

/** What an order will cost; `packed` once its real weight is known. Whole minor units. */
export interface ShownTotals {
  readonly min: ShownTotal;
  readonly estimate: ShownTotal;
  readonly max: ShownTotal;
  readonly packed?: ShownTotal | null;
}

/** Delivery, tax, and what it comes to: most likely with its range, or as packed. */
@Component({
  selector: 'sw-order-totals',
  imports: [Money],
  template: `
    <dl>
      <div>
        <dt i18n="@@order.totals.goods">Goods</dt>
        <dd><sw-money [minor]="shown().netMinor - deliveryMinor()" [currency]="currency()" /></dd>
      </div>
      <div>
        <dt i18n="@@order.totals.delivery">Delivery</dt>
        <dd><sw-money [minor]="deliveryMinor()" [currency]="currency()" /></dd>
      </div>
      <div>
        <dt i18n="@@order.totals.tax">Tax</dt>
        <dd><sw-money [minor]="shown().taxMinor" [currency]="currency()" /></dd>
      </div>
      <div class="total">
        <dt>
          @if (totals().packed) {
            <ng-container i18n="@@order.totals.packed">Total as packed</ng-container>
          } @else {
            <ng-container i18n="@@order.totals.likely">Total, most likely</ng-container>
          }
        </dt>
        <dd><sw-money [minor]="shown().totalMinor" [currency]="currency()" /></dd>
      </div>
      @if (!totals().packed) {
        <div>
          <dt i18n="@@order.totals.range">Between</dt>
          <dd>
            <sw-money [minor]="totals().min.totalMinor" [currency]="currency()" /> –
            <sw-money [minor]="totals().max.totalMinor" [currency]="currency()" />
          </dd>
        </div>
      }
      @if (held()) {
        <div>
          <dt i18n="@@order.totals.held">Held on the card, at most</dt>
          <dd><sw-money [minor]="totals().max.totalMinor" [currency]="currency()" /></dd>
        </div>
      }
    </dl>
  `,
  styleUrl: './order-totals.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderTotalsBox {
  readonly totals = input.required<ShownTotals>();
  readonly deliveryMinor = input.required<number>();
  readonly currency = input.required<CurrencyCode>();
  /** Whether a card is going to be held for the upper bound. */
  readonly held = input(false);

  protected readonly shown = computed(() => this.totals().packed ?? this.totals().estimate);
}
