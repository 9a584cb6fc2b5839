import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Store } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import type { Me } from '@seamwright/identity/contracts';
import { AccountApi, SessionActions } from '@seamwright/identity/data-access';
import { roleName } from '@seamwright/identity/ui';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, ErrorState, Loading, Toast } from '@seamwright/shared/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';

/** Who one is here, and one's name to be changed. */
@Component({
  selector: 'sw-my-name',
  imports: [
    Card,
    ErrorState,
    FieldError,
    FormErrors,
    Loading,
    MatButton,
    MatFormFieldModule,
    MatInput,
    ReactiveFormsModule,
  ],
  templateUrl: './my-name.html',
  styleUrl: './account.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MyName {
  readonly #api = inject(AccountApi);
  readonly #store = inject(Store);
  readonly #toast = inject(Toast);
  readonly #destroyed = inject(DestroyRef);
  protected readonly me = signal<Me | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly refused = signal<Problem | null>(null);
  protected readonly saving = signal(false);
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
  });

  constructor() {
    this.load();
  }

  protected roles({ roles }: Me): string {
    return roles.map(roleName).join(', ');
  }

  protected load(): void {
    this.problem.set(null);
    this.#api
      .me()
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({ next: (me) => this.#show(me), error: (error: unknown) => this.problem.set(asProblem(error)) });
  }

  protected submit(): void {
    const me = this.me();
    this.form.markAllAsTouched();
    if (!me || this.form.invalid || this.saving()) return;
    this.saving.set(true);
    this.refused.set(null);
    this.#api
      .rename(this.form.controls.name.value.trim(), me.rowVersion)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({
        next: (renamed) => {
          this.#show(renamed);
          this.#store.dispatch(SessionActions.renamed({ name: renamed.name }));
          void this.#toast.show({ text: $localize`:@@identity.account.renamed:Your name was changed.` });
        },
        error: (error: unknown) => this.#keep(asProblem(error)),
      });
  }

  #show(me: Me): void {
    this.me.set(me);
    this.saving.set(false);
    this.form.reset({ name: me.name });
  }

  #keep(problem: Problem): void {
    this.saving.set(false);
    this.refused.set(problem);
    showServerErrors(this.form, problem.errors);
    // The newer version is fetched, so that saving once more is meant.
    if (problem.code === 'stale')
      this.#api
        .me()
        .pipe(takeUntilDestroyed(this.#destroyed))
        .subscribe((me) => this.me.set(me));
  }
}
