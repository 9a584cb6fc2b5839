import { ChangeDetectionStrategy, Component, computed, effect, inject } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { IDENTITY_APPLICATION, selectSignIn, SessionActions } from '@seamwright/identity/data-access';
import { normaliseEmail } from '@seamwright/identity/domain';
import { PasswordField } from '@seamwright/identity/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { Entrance } from './entrance';

/** Signs in with e-mail and password, then goes on to the page that was asked for. */
@Component({
  selector: 'sw-sign-in-page',
  imports: [
    Entrance,
    FieldError,
    FormErrors,
    MatButton,
    MatFormFieldModule,
    MatInput,
    PasswordField,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './sign-in.page.html',
  styleUrl: './entrance-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInPage {
  readonly #store = inject(Store);
  protected readonly signIn = this.#store.selectSignal(selectSignIn);
  protected readonly sub =
    inject(IDENTITY_APPLICATION) === 'admin'
      ? $localize`:@@identity.signIn.desk:The desk, for our staff`
      : $localize`:@@identity.signIn.storefront:Your prices, your cuts, your next delivery`;
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required, Validators.email]],
    password: ['', Validators.required],
  });
  protected readonly head = computed(() => {
    const { problem } = this.signIn();
    return problem ? [{ pointer: '', message: problem.detail }] : [];
  });

  constructor() {
    this.#store.dispatch(SessionActions.signInOpened());
    effect(() => showServerErrors(this.form, this.signIn().problem?.errors ?? []));
  }

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.signIn().submitting) return;
    const { email, password } = this.form.getRawValue();
    this.#store.dispatch(SessionActions.signInSubmitted({ email: normaliseEmail(email), password }));
  }
}
