import { ChangeDetectionStrategy, Component, input, model } from '@angular/core';
import { Icon } from '@seamwright/shared/ui';

/** Digits to touch with gloves on: they move in from the right as grams, so that no point has to be found. */
@Component({
  selector: 'sw-number-pad',
  imports: [Icon],
  template: `
    <div role="group" [attr.aria-label]="label()">
      @for (digit of digits; track digit) {
        <button type="button" (click)="press(digit)">{{ digit }}</button>
      }
      <button type="button" class="word" (click)="value.set(0)" i18n="@@scale.pad.clear">Clear</button>
      <button type="button" (click)="press('0')">0</button>
      <button type="button" (click)="back()" aria-label="Take the last digit away" i18n-aria-label="@@scale.pad.back">
        <sw-icon name="back" [size]="32" />
      </button>
    </div>
  `,
  styleUrl: './number-pad.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NumberPad {
  readonly label = input.required<string>();
  /** Whole grams. */
  readonly value = model.required<number>();
  readonly most = input(999_999);

  protected readonly digits = ['1', '2', '3', '4', '5', '6', '7', '8', '9'];

  protected press(digit: string): void {
    const next = this.value() * 10 + Number(digit);
    if (next <= this.most()) this.value.set(next);
  }

  protected back(): void {
    this.value.set(Math.floor(this.value() / 10));
  }
}
