import { computed, DestroyRef, inject, signal, type Signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Observable } from 'rxjs';
import { asProblem, failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';

/** A question to the server that a board of the first page asks when it opens, and again when it is told to. */
export class Asked<T> {
  readonly #remote = signal<Remote<T>>(idle());
  readonly remote = this.#remote.asReadonly();

  constructor(
    private readonly question: () => Observable<T>,
    private readonly destroyed: DestroyRef,
  ) {
    this.ask();
  }

  ask(): void {
    this.#remote.update(loading);
    this.question()
      .pipe(takeUntilDestroyed(this.destroyed))
      .subscribe({
        next: (data) => this.#remote.set(loaded(data)),
        error: (error: unknown) => this.#remote.update((before) => failed(before, asProblem(error))),
      });
  }

  /** The answer as it is shown; null until there is one. */
  as<Shown>(view: (data: T) => Shown): Signal<Shown | null> {
    return computed(() => {
      const { data } = this.remote();
      return data === null ? null : view(data);
    });
  }
}

/** Asks once, for as long as the component lives that makes it. */
export const asked = <T>(question: () => Observable<T>): Asked<T> => new Asked(question, inject(DestroyRef));
