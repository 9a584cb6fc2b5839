import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { whyForbidden, withDefaults, type ChosenValues, type OfferedNumbers } from '@seamwright/catalogue/domain';
import type { CurrencyCode } from '@seamwright/shared/util';
import { Choice, type ChoiceOption } from '@seamwright/shared/ui/forms';

/** A choice that was made: which, and the value. */
export interface ValueChosen {
  readonly choice: string;
  readonly value: string;
}

/** All choices of a specification, with what each value changes in the price and why one is impossible. */
@Component({
  selector: 'sw-spec-choices',
  imports: [Choice],
  template: `
    @for (choice of choices(); track choice.key) {
      <sw-choice
        [label]="choice.label"
        [hint]="choice.unit"
        [options]="choice.options"
        [value]="choice.value"
        [currency]="currency()"
        per="kg"
        (valueChange)="choose(choice.key, $event)"
      />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 20px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecChoices {
  readonly offer = input.required<Pick<OfferedNumbers, 'choices' | 'choiceRules'>>();
  readonly chosen = input.required<ChosenValues>();
  readonly currency = input.required<CurrencyCode>();
  readonly valueChosen = output<ValueChosen>();

  protected readonly choices = computed(() => {
    const offer = this.offer();
    const full = withDefaults(offer.choices, this.chosen());
    return offer.choices.map(({ key, label, unit = '', values, defaultValue }) => {
      const usual = values.find(({ value }) => value === defaultValue)?.priceChangeMinorPerKg ?? 0;
      const options = values.map((offered): ChoiceOption => {
        const refused = whyForbidden(offer, full, key, offered.value);
        return {
          value: offered.value,
          label: capital(offered.label),
          deltaMinor: offered.priceChangeMinorPerKg - usual,
          // What is chosen already is shown as chosen, even if it stands against another choice.
          ...(refused !== null && full[key] !== offered.value ? { refused } : {}),
        };
      });
      return { key, label, unit, options, value: full[key] ?? null };
    });
  });

  protected choose(choice: string, value: string | null): void {
    if (value !== null) this.valueChosen.emit({ choice, value });
  }
}

const capital = (label: string): string => label.charAt(0).toUpperCase() + label.slice(1);
