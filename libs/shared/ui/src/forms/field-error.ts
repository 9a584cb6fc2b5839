import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import type { AbstractControl } from '@angular/forms';
import { map, startWith, switchMap } from 'rxjs';
import { FIELD_MESSAGES } from './field-messages';

/** What is wrong with a field, in words, beside it: inside `<mat-error>`, or below a field of our own. */
@Component({
  selector: 'sw-field-error',
  template: `
    @if (text(); as words) {
      <span class="text">{{ words }}</span>
    }
  `,
  styles: `
    .text {
      color: var(--sw-brick);
      font-size: 14px;
      line-height: 20px;
    }
  `,
  host: { 'aria-live': 'polite' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FieldError {
  readonly control = input.required<AbstractControl>();

  private readonly messages = inject(FIELD_MESSAGES);
  private readonly state = toSignal(
    toObservable(this.control).pipe(
      switchMap((control) =>
        control.events.pipe(
          startWith(null),
          map(() => (control.touched ? control.errors : null)),
        ),
      ),
    ),
  );

  protected readonly text = computed(() => {
    const errors = this.state();
    return errors ? this.messages(errors) : '';
  });
}
