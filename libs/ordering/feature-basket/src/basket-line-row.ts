import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import type { BasketLine, CheckedLine } from '@seamwright/ordering/data-access';
import { WHEN_SHORT, type WhenShort } from '@seamwright/ordering/domain';
import { whenShortWord } from '@seamwright/ordering/ui';
import { basisWord, PriceWhy } from '@seamwright/pricing/ui';
import { Chip, Ladder, Loading, Money } from '@seamwright/shared/ui';
import { QuantityField } from '@seamwright/shared/ui/forms';
import type { CurrencyCode } from '@seamwright/shared/util';

/** A line of the basket: its quantity, what it will weigh and cost, and what to do when it falls short. */
@Component({
  selector: 'sw-basket-line-row',
  imports: [
    Chip,
    Ladder,
    Loading,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    Money,
    PriceWhy,
    QuantityField,
  ],
  templateUrl: './basket-line-row.html',
  styleUrl: './basket-line-row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BasketLineRow {
  readonly line = input.required<CheckedLine>();
  readonly currency = input.required<CurrencyCode>();
  readonly changed = output<Partial<Pick<BasketLine, 'quantity' | 'whenShort' | 'note'>>>();
  readonly removed = output();

  protected readonly whenShorts = WHEN_SHORT;
  protected readonly wordOf = whenShortWord;
  protected readonly perOf = basisWord;
  protected readonly priced = computed(() => {
    const { priced } = this.line();
    return priced?.ok ? priced : null;
  });
  protected readonly refused = computed(() => {
    const { priced } = this.line();
    return priced && !priced.ok ? priced.message : null;
  });
  protected readonly label = computed(() => $localize`:@@basket.line.quantity:Quantity of ${this.line().name}:name:`);
  protected readonly value = computed(() => {
    const { quantity } = this.line();
    return quantity.unit === 'kg' ? quantity.grams : quantity.count;
  });
  protected readonly unitWord = computed(() => {
    const { quantity } = this.line();
    if (quantity.unit === 'kg') return $localize`:@@basket.unit.kg:kg`;
    const one = quantity.count === 1;
    if (quantity.unit === 'case')
      return one ? $localize`:@@basket.unit.case:case` : $localize`:@@basket.unit.cases:cases`;
    return one ? $localize`:@@basket.unit.piece:piece` : $localize`:@@basket.unit.pieces:pieces`;
  });

  protected count(value: number | null): void {
    const { quantity } = this.line();
    // What is not a quantity stays in its field, marked, until it is one.
    if (value === null || value === this.value()) return;
    this.changed.emit({
      quantity: quantity.unit === 'kg' ? { ...quantity, grams: value } : { ...quantity, count: value },
    });
  }

  protected short(whenShort: WhenShort): void {
    this.changed.emit({ whenShort });
  }

  protected write(note: string): void {
    if (note.trim() !== this.line().note) this.changed.emit({ note: note.trim() });
  }
}
