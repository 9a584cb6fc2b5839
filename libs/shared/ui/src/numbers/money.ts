import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CurrencyCode } from '@seamwright/shared/util';
import { MoneyPipe } from './money.pipe';

/** An amount of money, with what it is for in a lighter weight when it is a price: £14.20/kg. */
@Component({
  selector: 'sw-money',
  imports: [MoneyPipe],
  template: `<span [textContent]="minor() | swMoney: currency()"></span
    ><span class="sw-unit" [textContent]="unit()"></span>`,
  styleUrl: './number.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Money {
  /** Whole minor units; nothing is shown for null. */
  readonly minor = input.required<number | null>();
  readonly currency = input.required<CurrencyCode>();
  /** What the price is for: "kg", "case". */
  readonly per = input('');

  protected readonly unit = computed(() => (this.per() === '' || this.minor() === null ? '' : `/${this.per()}`));
}
