import { ChangeDetectionStrategy, Component, computed, DestroyRef, inject, input, signal } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import type { Problem } from '@seamwright/shared/contracts';
import { LinksApi } from '@seamwright/identity/data-access';
import { MIN_PASSWORD_LENGTH } from '@seamwright/identity/domain';
import { newPassword, PasswordField } from '@seamwright/identity/ui';
import { asProblem } from '@seamwright/shared/data-access';
import type { FieldProblem } from '@seamwright/shared/ui';
import { FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { Entrance } from './entrance';

/** Where a mailed link leads: choose a password, and be signed in. The secret stands behind the address's hash sign. */
@Component({
  selector: 'sw-choose-password-page',
  imports: [Entrance, FormErrors, MatButton, PasswordField, ReactiveFormsModule, RouterLink],
  templateUrl: './choose-password.page.html',
  styleUrl: './entrance-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoosePasswordPage {
  /** From the route: which kind of link it is. */
  readonly link = input.required<'invitation' | 'password-reset'>();

  readonly #links = inject(LinksApi);
  readonly #destroyed = inject(DestroyRef);
  readonly #fragment = toSignal(inject(ActivatedRoute).fragment);
  protected readonly token = computed(() => new URLSearchParams(this.#fragment() ?? '').get('token') ?? '');
  protected readonly invited = computed(() => this.link() === 'invitation');
  protected readonly heading = computed(() =>
    this.invited()
      ? $localize`:@@identity.accept.heading:Welcome: choose a password`
      : $localize`:@@identity.setPassword.title:Set a new password`,
  );
  protected readonly hint = $localize`:@@identity.password.rule:At least ${MIN_PASSWORD_LENGTH}:least: characters; a short sentence is easy to keep`;
  protected readonly form = inject(NonNullableFormBuilder).group({
    password: ['', [Validators.required, newPassword()]],
  });
  protected readonly saving = signal(false);
  protected readonly head = signal<readonly FieldProblem[]>([]);
  protected readonly spent = signal(false);

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    this.saving.set(true);
    this.head.set([]);
    const { password } = this.form.getRawValue();
    const using = this.invited()
      ? this.#links.acceptInvitation(this.token(), password)
      : this.#links.resetPassword(this.token(), password);
    using
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({ error: (error: unknown) => this.#refused(asProblem(error)) });
  }

  #refused({ code, detail, errors }: Problem): void {
    this.saving.set(false);
    this.spent.set(code === 'link-not-valid');
    const homeless = showServerErrors(this.form, errors);
    this.head.set(errors.length > 0 ? homeless : [{ pointer: '', message: detail }]);
  }
}
