import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { Store } from '@ngrx/store';
import type { Problem } from '@seamwright/shared/contracts';
import type { OpenSession } from '@seamwright/identity/contracts';
import { AccountApi, SessionActions } from '@seamwright/identity/data-access';
import { describeDevice } from '@seamwright/identity/ui';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, Chip, Confirm, ErrorState, Loading } from '@seamwright/shared/ui';

/** The browsers in which one is signed in, to be signed out one by one or all together. */
@Component({
  selector: 'sw-my-sessions',
  imports: [Card, Chip, DatePipe, ErrorState, Loading, MatButton],
  templateUrl: './my-sessions.html',
  styleUrl: './account.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MySessions {
  readonly #api = inject(AccountApi);
  readonly #store = inject(Store);
  readonly #confirm = inject(Confirm);
  readonly #destroyed = inject(DestroyRef);
  protected readonly sessions = signal<readonly OpenSession[] | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly describeDevice = describeDevice;

  constructor() {
    this.load();
  }

  protected load(): void {
    this.problem.set(null);
    this.#api
      .sessions()
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({ next: ({ items }) => this.sessions.set(items), error: (error: unknown) => this.#failed(error) });
  }

  protected end({ id }: OpenSession): void {
    this.#api
      .endSession(id)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({ next: () => this.load(), error: (error: unknown) => this.#failed(error) });
  }

  protected async everywhere(): Promise<void> {
    const sure = await this.#confirm.ask({
      heading: $localize`:@@identity.account.everywhere:Sign out everywhere`,
      text: $localize`:@@identity.account.everywhereAsk:Every browser is signed out, this one too. You can sign in again at once.`,
      act: $localize`:@@identity.account.everywhere:Sign out everywhere`,
    });
    if (!sure) return;
    this.#api.signOutEverywhere().subscribe({
      next: () => this.#store.dispatch(SessionActions.signOutAsked()),
      error: (error: unknown) => this.#failed(error),
    });
  }

  #failed(error: unknown): void {
    this.problem.set(asProblem(error));
  }
}
