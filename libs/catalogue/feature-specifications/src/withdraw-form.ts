import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { FormControl, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { Card } from '@seamwright/shared/ui';
import { FieldError } from '@seamwright/shared/ui/forms';

/** Takes a specification out of the catalogue, for a reason that is kept. */
@Component({
  selector: 'sw-withdraw-form',
  imports: [Card, FieldError, MatButton, MatFormFieldModule, MatInputModule, ReactiveFormsModule],
  template: `
    <sw-card heading="Withdraw" i18n-heading="@@catalogue.withdraw.form">
      <form (submit)="send($event)">
        <mat-form-field appearance="outline" floatLabel="always">
          <mat-label i18n="@@catalogue.withdraw.reason">Reason</mat-label>
          <input matInput maxlength="300" [formControl]="reason" />
          <mat-error><sw-field-error [control]="reason" /></mat-error>
        </mat-form-field>
        <button matButton="outlined" type="submit" [disabled]="sending()" i18n="@@catalogue.withdraw.act">
          Withdraw
        </button>
      </form>
    </sw-card>
  `,
  styles: `
    mat-form-field {
      inline-size: 100%;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WithdrawForm {
  readonly sending = input(false);
  readonly withdraw = output<string>();

  protected readonly reason = new FormControl('', {
    nonNullable: true,
    validators: [Validators.required, Validators.pattern(/\S/)],
  });

  protected send(event: Event): void {
    event.preventDefault();
    this.reason.markAsTouched();
    if (this.reason.valid) this.withdraw.emit(this.reason.value.trim());
  }
}
