import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatLabel, MatPrefix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { map, startWith, switchMap } from 'rxjs';
import { whyForbidden } from '@seamwright/catalogue/domain';
import type { PricedLine } from '@seamwright/pricing/data-access';
import { HOUSE_CURRENCY, PRICE_BASES } from '@seamwright/pricing/domain';
import { basisWord, PriceWhy } from '@seamwright/pricing/ui';
import { Kg, KgPipe, Money, MoneyPipe } from '@seamwright/shared/ui';
import { Choice, FieldError, type ChoiceOption } from '@seamwright/shared/ui/forms';
import { expectedCase, type QuoteLineDraft } from './quote-line-draft';

/** One line of a quote while it is written: choices, basis and price, and beside it the price that holds without it. */
@Component({
  selector: 'sw-quote-line-editor',
  imports: [
    Choice,
    FieldError,
    Kg,
    KgPipe,
    MatButton,
    MatError,
    MatFormField,
    MatInput,
    MatLabel,
    MatOption,
    MatPrefix,
    MatSelect,
    Money,
    MoneyPipe,
    PriceWhy,
    ReactiveFormsModule,
  ],
  templateUrl: './quote-line-editor.html',
  styleUrl: './quote-line-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuoteLineEditor {
  readonly draft = input.required<QuoteLineDraft>();
  /** The price in force for the customer without this quote; null while it is not known. */
  readonly today = input<PricedLine | null>(null);
  readonly remove = output();

  protected readonly currency = HOUSE_CURRENCY;
  protected readonly bases = PRICE_BASES;
  protected readonly wordOf = basisWord;

  /** Turns with every keystroke, so that what follows from the form is worked out anew. */
  private readonly typed = toSignal(
    toObservable(this.draft).pipe(
      switchMap(({ form }) =>
        form.valueChanges.pipe(
          startWith(null),
          map(() => form.getRawValue()),
        ),
      ),
    ),
  );
  protected readonly expected = computed(() => {
    this.typed();
    return expectedCase(this.draft());
  });
  protected readonly refused = computed(() => {
    const expected = this.expected();
    return typeof expected === 'string' ? expected : null;
  });
  protected readonly oneCase = computed(() => {
    const expected = this.expected();
    return typeof expected === 'string' ? null : expected;
  });
  protected readonly choices = computed(() => {
    const chosen = this.typed()?.chosen ?? {};
    const { specification, offer, form } = this.draft();
    return specification.choices.map(({ key, label, unit, values }) => ({
      key,
      label,
      unit: unit ?? '',
      control: form.controls.chosen.get(key),
      options: values.map(({ value, label: text, priceChangeMinorPerKg }): ChoiceOption => {
        const refused = whyForbidden(offer, chosen, key, value);
        return { value, label: text, deltaMinor: priceChangeMinorPerKg, ...(refused === null ? {} : { refused }) };
      }),
    }));
  });
}
