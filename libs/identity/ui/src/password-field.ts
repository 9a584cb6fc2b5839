import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import { ReactiveFormsModule, type FormControl } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { FieldError } from '@seamwright/shared/ui/forms';

/** A password, hidden until asked to be shown. */
@Component({
  selector: 'sw-password-field',
  imports: [FieldError, MatButton, MatFormFieldModule, MatInput, ReactiveFormsModule],
  templateUrl: './password-field.html',
  styles: `
    :host,
    mat-form-field {
      display: block;
      inline-size: 100%;
    }

    button {
      margin-inline-end: 8px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PasswordField {
  readonly control = input.required<FormControl<string>>();
  readonly label = input.required<string>();
  readonly hint = input('');
  readonly autocomplete = input.required<'current-password' | 'new-password'>();

  protected readonly shown = signal(false);
}
