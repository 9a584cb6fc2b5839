import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import { offeredNumbers } from '@seamwright/catalogue/data-access';
import { whyForbidden } from '@seamwright/catalogue/domain';
import { WHEN_SHORT, type WhenShort } from '@seamwright/ordering/domain';
import { whenShortWord } from '@seamwright/ordering/ui';
import type { PricedLine } from '@seamwright/pricing/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { basisWord, PriceWhy } from '@seamwright/pricing/ui';
import { Ladder, Money } from '@seamwright/shared/ui';
import { Choice, QuantityField, type ChoiceOption } from '@seamwright/shared/ui/forms';

type Unit = 'piece' | 'case' | 'kg';

/** A line while it is taken. `amount` counts pieces or cases, or grams for kg; null while what is typed is none. */
export interface PhoneLine {
  readonly id: string;
  readonly specification: PublicSpecification;
  readonly chosen: Readonly<Record<string, string>>;
  readonly unit: Unit;
  readonly amount: number | null;
  readonly whenShort: WhenShort;
  readonly note: string;
}

/** A new line for a specification, with its usual choices. */
export const phoneLine = (id: string, specification: PublicSpecification): PhoneLine => ({
  id,
  specification,
  chosen: Object.fromEntries(specification.choices.map(({ key, defaultValue }) => [key, defaultValue])),
  unit: 'piece',
  amount: 1,
  whenShort: 'send-what-there-is',
  note: '',
});

/** The line as it is sent; null while it has no quantity. */
export function lineToSend({ specification, chosen, unit, amount, whenShort, note }: PhoneLine) {
  if (amount === null) return null;
  const quantity = unit === 'kg' ? { unit, grams: amount, notLess: false } : { unit, count: amount };
  return { specificationId: specification.specificationId, chosen: { ...chosen }, quantity, whenShort, note };
}

/** One line of a phone order: choices, quantity, and what it will weigh and cost this customer. */
@Component({
  selector: 'sw-phone-order-line',
  imports: [
    Choice,
    Ladder,
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
  templateUrl: './phone-order-line.html',
  styleUrl: './phone-order-line.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PhoneOrderLine {
  readonly line = model.required<PhoneLine>();
  /** What the desk says of it; null until it has answered. */
  readonly priced = input<PricedLine | null>(null);
  readonly removed = output();

  protected readonly currency = HOUSE_CURRENCY;
  protected readonly whenShorts = WHEN_SHORT;
  protected readonly wordOf = whenShortWord;
  protected readonly perOf = basisWord;
  protected readonly units: readonly { value: Unit; label: string }[] = [
    { value: 'piece', label: $localize`:@@phoneLine.unit.piece:pieces` },
    { value: 'case', label: $localize`:@@phoneLine.unit.case:cases` },
    { value: 'kg', label: $localize`:@@phoneLine.unit.kg:kg, about` },
  ];
  protected readonly accepted = computed(() => {
    const priced = this.priced();
    return priced?.ok ? priced : null;
  });
  protected readonly refused = computed(() => {
    const priced = this.priced();
    return priced && !priced.ok ? priced.message : null;
  });
  protected readonly label = computed(
    () => $localize`:@@phoneLine.quantity:Quantity of ${this.line().specification.name}:name:`,
  );
  protected readonly choices = computed(() => {
    const { specification, chosen } = this.line();
    const offer = offeredNumbers(specification);
    return specification.choices.map(({ key, label, unit, values }) => ({
      key,
      label,
      unit: unit ?? '',
      options: values.map(({ value, label: text, priceChangeMinorPerKg }): ChoiceOption => {
        const refused = whyForbidden(offer, chosen, key, value);
        return { value, label: text, deltaMinor: priceChangeMinorPerKg, ...(refused === null ? {} : { refused }) };
      }),
    }));
  });

  protected change(change: Partial<PhoneLine>): void {
    this.line.update((line) => ({ ...line, ...change }));
  }

  protected choose(key: string, value: string | null): void {
    if (value !== null && value !== this.line().chosen[key])
      this.change({ chosen: { ...this.line().chosen, [key]: value } });
  }

  protected count(amount: number | null): void {
    if (amount !== this.line().amount) this.change({ amount });
  }

  /** Another unit is another number: one piece or case, or the weight of one piece. */
  protected measure(unit: Unit): void {
    this.change({ unit, amount: unit === 'kg' ? this.line().specification.pieceNominalGrams : 1 });
  }
}
