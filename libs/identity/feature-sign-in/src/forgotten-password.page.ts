import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { RouterLink } from '@angular/router';
import { LinksApi } from '@seamwright/identity/data-access';
import { normaliseEmail } from '@seamwright/identity/domain';
import { asProblem } from '@seamwright/shared/data-access';
import type { FieldProblem } from '@seamwright/shared/ui';
import { FieldError, FormErrors } from '@seamwright/shared/ui/forms';
import { Entrance } from './entrance';

/** Asks for a link to set a new password; says the same whether or not the address is known. */
@Component({
  selector: 'sw-forgotten-password-page',
  imports: [Entrance, FieldError, FormErrors, MatButton, MatFormFieldModule, MatInput, ReactiveFormsModule, RouterLink],
  templateUrl: './forgotten-password.page.html',
  styleUrl: './entrance-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ForgottenPasswordPage {
  readonly #links = inject(LinksApi);
  readonly #destroyed = inject(DestroyRef);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required, Validators.email]],
  });
  protected readonly sending = signal(false);
  protected readonly sentTo = signal<string | null>(null);
  protected readonly head = signal<readonly FieldProblem[]>([]);

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.sending()) return;
    const email = normaliseEmail(this.form.controls.email.value);
    this.sending.set(true);
    this.head.set([]);
    this.#links
      .forgotPassword(email)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({
        next: () => this.sentTo.set(email),
        error: (error: unknown) => {
          this.sending.set(false);
          this.head.set([{ pointer: '', message: asProblem(error).detail }]);
        },
      });
  }
}
