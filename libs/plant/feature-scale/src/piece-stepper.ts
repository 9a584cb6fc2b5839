import { ChangeDetectionStrategy, Component, input, model } from '@angular/core';
import { Icon } from '@seamwright/shared/ui';

/** A small number of pieces, one more or one less at a touch. */
@Component({
  selector: 'sw-piece-stepper',
  imports: [Icon],
  template: `
    <span class="label" [id]="id">{{ label() }}</span>
    <div role="group" [attr.aria-labelledby]="id">
      <button
        type="button"
        [disabled]="value() <= least()"
        (click)="value.set(value() - 1)"
        aria-label="One less"
        i18n-aria-label="@@scale.stepper.less"
      >
        <sw-icon name="minus" [size]="28" />
      </button>
      <output aria-live="polite">{{ value() }}</output>
      <button
        type="button"
        [disabled]="value() >= most()"
        (click)="value.set(value() + 1)"
        aria-label="One more"
        i18n-aria-label="@@scale.stepper.more"
      >
        <sw-icon name="plus" [size]="28" />
      </button>
    </div>
  `,
  styleUrl: './piece-stepper.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PieceStepper {
  readonly label = input.required<string>();
  readonly least = input(1);
  readonly most = input.required<number>();
  readonly value = model.required<number>();
  protected readonly id = `sw-piece-stepper-${++made}`;
}

let made = 0;
