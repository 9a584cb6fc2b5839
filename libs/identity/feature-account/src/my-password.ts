import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Store } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import { AccountApi, selectPerson } from '@seamwright/identity/data-access';
import { newPassword, PasswordField } from '@seamwright/identity/ui';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, Toast, type FieldProblem } from '@seamwright/shared/ui';
import { FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';

/** Changes one's own password. */
@Component({
  selector: 'sw-my-password',
  imports: [Card, FormErrors, MatButton, PasswordField, ReactiveFormsModule],
  templateUrl: './my-password.html',
  styleUrl: './account.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MyPassword {
  readonly #api = inject(AccountApi);
  readonly #toast = inject(Toast);
  readonly #destroyed = inject(DestroyRef);
  protected readonly person = inject(Store).selectSignal(selectPerson);
  protected readonly saving = signal(false);
  protected readonly head = signal<readonly FieldProblem[]>([]);
  protected readonly form = inject(NonNullableFormBuilder).group({
    currentPassword: ['', Validators.required],
    password: ['', [Validators.required, newPassword(() => this.person()?.email ?? '')]],
  });

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    this.saving.set(true);
    this.head.set([]);
    const { currentPassword, password } = this.form.getRawValue();
    this.#api
      .changePassword(currentPassword, password)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({ next: () => this.#changed(), error: (error: unknown) => this.#refused(asProblem(error)) });
  }

  #changed(): void {
    this.saving.set(false);
    this.form.reset();
    void this.#toast.show({
      text: $localize`:@@identity.account.passwordChanged:Your password was changed. Other browsers were signed out.`,
    });
  }

  #refused({ detail, errors }: Problem): void {
    this.saving.set(false);
    const homeless = showServerErrors(this.form, errors);
    this.head.set(errors.length > 0 ? homeless : [{ pointer: '', message: detail }]);
  }
}
