import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MoneyPipe, PercentPipe } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';

/** What an invoice comes to, in minor units. */
export interface ShownSum {
  readonly netMinor: number;
  readonly totalMinor: number;
  readonly paidMinor: number;
  readonly taxes: readonly { readonly taxPpm: number; readonly netMinor: number; readonly taxMinor: number }[];
}

/** Net, tax by rate, total, what is paid of it and what is left. */
@Component({
  selector: 'sw-invoice-sum',
  imports: [MoneyPipe, PercentPipe],
  template: `
    <dl>
      <div>
        <dt i18n="@@accounts.sum.net">Net</dt>
        <dd>{{ sum().netMinor | swMoney: currency() }}</dd>
      </div>
      @for (tax of sum().taxes; track tax.taxPpm) {
        <div>
          <dt>
            <ng-container i18n="@@accounts.sum.tax"
              >VAT {{ tax.taxPpm | swPercent }} on {{ tax.netMinor | swMoney: currency() }}</ng-container
            >
          </dt>
          <dd>{{ tax.taxMinor | swMoney: currency() }}</dd>
        </div>
      }
      <div class="total">
        <dt i18n="@@accounts.sum.total">Total</dt>
        <dd>{{ sum().totalMinor | swMoney: currency() }}</dd>
      </div>
      <div>
        <dt i18n="@@accounts.sum.paid">Paid</dt>
        <dd>{{ sum().paidMinor | swMoney: currency() }}</dd>
      </div>
      <div>
        <dt i18n="@@accounts.sum.open">Left to pay</dt>
        <dd>{{ open() | swMoney: currency() }}</dd>
      </div>
    </dl>
  `,
  styleUrl: './facts.scss',
  styles: `
    .total {
      padding-block: 8px;
      border-block: 1px solid var(--sw-line);
      font-weight: 600;
    }

    .total dt {
      color: inherit;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvoiceSum {
  readonly sum = input.required<ShownSum>();
  readonly currency = input.required<CurrencyCode>();

  protected readonly open = computed(() => this.sum().totalMinor - this.sum().paidMinor);
}
