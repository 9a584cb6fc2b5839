import { ChangeDetectionStrategy, Component, computed, forwardRef, input, model, signal } from '@angular/core';
import { type ControlValueAccessor, NG_VALUE_ACCESSOR } from '@angular/forms';
import { Icon } from '../icons/icon';
import { readUnits, withPoint } from './smallest-units';

/**
 * A quantity that can be typed or stepped: pieces, cases, or "about" so many kg. The value is always a whole number of
 * the smallest unit: with one decimal, 125 is shown as 12.5. Null means that what was typed is not a quantity.
 */
@Component({
  selector: 'sw-quantity',
  imports: [Icon],
  templateUrl: './quantity.html',
  styleUrl: './quantity.scss',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: forwardRef(() => QuantityField), multi: true }],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuantityField implements ControlValueAccessor {
  /** What is counted, for screen readers: "Quantity of Striploin steak". */
  readonly label = input.required<string>();
  /** The unit behind the number: "steaks", "cases of 5 kg", "kg". */
  readonly unit = input('');
  /** Whether the quantity is about so much, marked ≈. */
  readonly about = input(false);
  readonly min = input(0);
  readonly max = input(9_999);
  readonly step = input(1);
  readonly decimals = input(0);
  readonly value = model<number | null>(null);

  protected readonly disabled = signal(false);
  /** What is being typed; null while it is what the value says. */
  protected readonly typed = signal<string | null>(null);
  protected readonly shown = computed(() => this.typed() ?? this.textOf(this.value()));
  protected readonly invalid = computed(() => this.typed() !== null && this.allowed(this.typed()) === null);
  protected readonly atMin = computed(() => (this.value() ?? this.min()) <= this.min());
  protected readonly atMax = computed(() => (this.value() ?? this.min()) >= this.max());
  private changed: (value: number | null) => void = () => undefined;
  private touched: () => void = () => undefined;

  protected type(text: string): void {
    this.typed.set(text);
    this.take(this.allowed(text));
  }

  protected leave(): void {
    if (!this.invalid()) {
      this.typed.set(null);
    }
    this.touched();
  }

  protected stepBy(steps: 1 | -1): void {
    const next = (this.value() ?? this.min()) + steps * this.step();
    this.typed.set(null);
    this.take(Math.min(this.max(), Math.max(this.min(), next)));
  }

  protected onArrow(event: Event, steps: 1 | -1): void {
    event.preventDefault();
    this.stepBy(steps);
  }

  writeValue(value: number | null): void {
    this.typed.set(null);
    this.value.set(value);
  }

  registerOnChange(changed: (value: number | null) => void): void {
    this.changed = changed;
  }

  registerOnTouched(touched: () => void): void {
    this.touched = touched;
  }

  setDisabledState(disabled: boolean): void {
    this.disabled.set(disabled);
  }

  private take(value: number | null): void {
    this.value.set(value);
    this.changed(value);
  }

  private textOf(value: number | null): string {
    return value === null ? '' : withPoint(value, this.decimals());
  }

  private allowed(text: string | null): number | null {
    const value = readUnits(text ?? '', this.decimals());
    return value === null || value < this.min() || value > this.max() ? null : value;
  }
}
