import { ChangeDetectionStrategy, Component, forwardRef, inject, input, LOCALE_ID, model, signal } from '@angular/core';
import { type ControlValueAccessor, NG_VALUE_ACCESSOR } from '@angular/forms';
import { formatMoney, minorUnits, type CurrencyCode } from '@seamwright/shared/util';

/** One of the values that can be chosen. */
export interface ChoiceOption {
  readonly value: string;
  readonly label: string;
  /** A word under the label: "1 a pack". */
  readonly note?: string;
  /** What choosing it changes in the price, whole minor units; 0 is "as priced". Stands instead of the note. */
  readonly deltaMinor?: number;
  /** Why it can't be chosen. It is shown with its reason, not hidden. */
  readonly refused?: string;
}

let made = 0;

/** A choice among a few values side by side, with what each costs. Radio buttons to keyboard and screen reader. */
@Component({
  selector: 'sw-choice',
  templateUrl: './choice.html',
  styleUrl: './choice.scss',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: forwardRef(() => Choice), multi: true }],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Choice implements ControlValueAccessor {
  /** What is chosen: "Trim level". */
  readonly label = input.required<string>();
  /** What the labels mean, at the far side of the head: "fat cover, mm". */
  readonly hint = input('');
  readonly options = input.required<readonly ChoiceOption[]>();
  readonly currency = input<CurrencyCode>('GBP');
  /** What a price difference is for: "kg". */
  readonly per = input('');
  /** The chosen option's value. */
  readonly value = model<string | null>(null);

  protected readonly name = `sw-choice-${++made}`;
  protected readonly disabled = signal(false);
  private readonly locale = inject(LOCALE_ID);
  private changed: (value: string) => void = () => undefined;
  protected touched: () => void = () => undefined;

  protected noteOf(option: ChoiceOption): string {
    return (
      option.refused ?? (option.deltaMinor === undefined ? (option.note ?? '') : this.difference(option.deltaMinor))
    );
  }

  protected choose(option: ChoiceOption): void {
    this.value.set(option.value);
    this.changed(option.value);
  }

  writeValue(value: string | null): void {
    this.value.set(value);
  }

  registerOnChange(changed: (value: string) => void): void {
    this.changed = changed;
  }

  registerOnTouched(touched: () => void): void {
    this.touched = touched;
  }

  setDisabledState(disabled: boolean): void {
    this.disabled.set(disabled);
  }

  private difference(minor: number): string {
    if (minor === 0) {
      return $localize`:@@ui.choice.asPriced:as priced`;
    }
    const amount = formatMoney(minorUnits(Math.abs(minor)), this.currency(), this.locale);
    return `${minor < 0 ? '−' : '+'} ${amount}${this.per() === '' ? '' : `/${this.per()}`}`;
  }
}
