import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';
import type { ConfirmQuestion } from './confirm';

/** What `Confirm` opens. Focus begins on the way back, so that a stray Enter destroys nothing. */
@Component({
  selector: 'sw-confirm-dialog',
  imports: [MatButton, MatDialogModule],
  template: `
    <h2 mat-dialog-title>{{ question.heading }}</h2>
    <mat-dialog-content>
      <p id="sw-confirm-text">{{ question.text }}</p>
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button matButton="outlined" type="button" [mat-dialog-close]="false" cdkFocusInitial>{{ back }}</button>
      <button matButton="filled" type="button" [class.sw-danger]="question.destructive" [mat-dialog-close]="true">
        {{ question.act }}
      </button>
    </mat-dialog-actions>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ConfirmDialog {
  protected readonly question = inject<ConfirmQuestion>(MAT_DIALOG_DATA);
  protected readonly back = this.question.back ?? $localize`:@@ui.confirm.back:Back`;
}
