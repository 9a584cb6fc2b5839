import { ChangeDetectionStrategy, Component, input, model } from '@angular/core';

/** One of a few things in large touch targets; radio buttons to keyboard and screen reader. */
@Component({
  selector: 'sw-touch-choice',
  template: `
    <fieldset>
      <legend>{{ label() }}</legend>
      <div class="options">
        @for (option of options(); track option.value) {
          <label [class.on]="value() === option.value">
            <input
              type="radio"
              [name]="name"
              [value]="option.value"
              [checked]="value() === option.value"
              (change)="value.set(option.value)"
            />
            <span>{{ option.label }}</span>
            @if (option.note; as note) {
              <span class="note">{{ note }}</span>
            }
          </label>
        }
      </div>
    </fieldset>
  `,
  styleUrl: './touch-choice.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TouchChoice {
  readonly label = input.required<string>();
  readonly options = input.required<readonly TouchOption[]>();
  readonly value = model.required<string | null>();
  protected readonly name = `sw-touch-choice-${++made}`;
}

export interface TouchOption {
  readonly value: string;
  readonly label: string;
  readonly note?: string;
}

let made = 0;
