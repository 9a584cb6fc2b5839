import { computed, DestroyRef, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Observable } from 'rxjs';
import type { Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { newId } from '@seamwright/shared/util';
import type { PersonView } from '@seamwright/identity/contracts';
import { PeopleApi, type NewInvitation, type PersonChange } from './people.api';

/** Whose people are shown. */
export interface PeopleScope {
  readonly customerId: string | null;
  readonly who?: 'staff' | 'buyers';
  readonly q?: string;
}

export interface PersonDone {
  readonly kind: 'invited' | 'saved' | 'invited-again' | 'signed-out';
  readonly name: string;
}

/**
 * A list of people and the one of them that is being invited or changed; provided by the page that shows it. When
 * somebody else saved first, the newer state is fetched and offered, and what was typed stays.
 */
@Injectable()
export class PeopleEditor {
  readonly #api = inject(PeopleApi);
  readonly #destroyed = inject(DestroyRef);
  #scope: PeopleScope = { customerId: null };
  #key = newId();
  #rowVersion = 0;
  readonly #cursor = signal<string | null>(null);
  readonly #people = signal<readonly PersonView[] | null>(null);
  readonly #problem = signal<Problem | null>(null);
  readonly #loading = signal(false);
  readonly #editing = signal<PersonView | 'new' | null>(null);
  readonly #saving = signal(false);
  readonly #refused = signal<Problem | null>(null);
  readonly #newer = signal<{ readonly read: PersonView; readonly now: PersonView } | null>(null);
  readonly #done = signal<PersonDone | null>(null);

  readonly people = this.#people.asReadonly();
  readonly hasMore = computed(() => this.#cursor() !== null);
  readonly problem = this.#problem.asReadonly();
  readonly loading = this.#loading.asReadonly();
  readonly editing = this.#editing.asReadonly();
  readonly saving = this.#saving.asReadonly();
  readonly refused = this.#refused.asReadonly();
  readonly newer = this.#newer.asReadonly();
  readonly done = this.#done.asReadonly();

  open(scope: PeopleScope): void {
    this.#scope = scope;
    this.#cursor.set(null);
    this.#list();
  }

  load(): void {
    this.open(this.#scope);
  }

  more(): void {
    this.#list();
  }

  begin(person: PersonView | 'new'): void {
    this.#key = newId();
    this.#rowVersion = person === 'new' ? 0 : person.rowVersion;
    this.#refused.set(null);
    this.#newer.set(null);
    this.#editing.set(person);
  }

  leave(): void {
    this.#editing.set(null);
    this.#refused.set(null);
    this.#newer.set(null);
  }

  save({ email, active, ...standing }: Omit<NewInvitation, 'customerId'> & PersonChange): void {
    const person = this.#editing();
    if (person === null) return;
    this.#saving.set(true);
    this.#refused.set(null);
    const invitation = { ...standing, email, customerId: this.#scope.customerId };
    const saving =
      person === 'new'
        ? this.#api.invite(invitation, this.#key)
        : this.#api.update(person.id, { ...standing, active }, this.#rowVersion);
    this.#while(saving).subscribe({
      next: (saved) => {
        this.#saving.set(false);
        this.leave();
        this.#done.set({ kind: person === 'new' ? 'invited' : 'saved', name: saved.name });
        this.load();
      },
      error: (error: unknown) => this.#keep(person, asProblem(error)),
    });
  }

  takeNewer(): void {
    const newer = this.#newer();
    if (newer) this.begin(newer.now);
  }

  keepMine(): void {
    this.#newer.set(null);
  }

  inviteAgain(person: PersonView): void {
    this.#do(this.#api.inviteAgain(person.id), { kind: 'invited-again', name: person.name });
  }

  endSessions(person: PersonView): void {
    this.#do(this.#api.endSessions(person.id), { kind: 'signed-out', name: person.name });
  }

  #list(): void {
    const { customerId, who, q } = this.#scope;
    const cursor = this.#cursor();
    this.#loading.set(true);
    this.#problem.set(null);
    this.#while(
      this.#api.list({
        ...(customerId ? { customerId } : {}),
        ...(who ? { who } : {}),
        ...(q ? { q } : {}),
        ...(cursor ? { cursor } : {}),
      }),
    ).subscribe({
      next: ({ items, nextCursor }) => {
        this.#loading.set(false);
        this.#cursor.set(nextCursor);
        this.#people.update((before) => (cursor ? [...(before ?? []), ...items] : items));
      },
      error: (error: unknown) => {
        this.#loading.set(false);
        this.#problem.set(asProblem(error));
      },
    });
  }

  #do(deed: Observable<unknown>, done: PersonDone): void {
    this.#refused.set(null);
    this.#while(deed).subscribe({
      next: () => this.#done.set(done),
      error: (error: unknown) => this.#refused.set(asProblem(error)),
    });
  }

  #keep(person: PersonView | 'new', problem: Problem): void {
    this.#saving.set(false);
    // What was refused was not stored, and may be sent changed; a lost answer is asked for again by the same key.
    if (problem.status >= 400 && problem.status < 500) this.#key = newId();
    if (person === 'new' || problem.code !== 'stale') return this.#refused.set(problem);
    this.#while(this.#api.get(person.id)).subscribe({
      next: (now) => {
        this.#rowVersion = now.rowVersion;
        this.#newer.set({ read: person, now });
      },
      error: (error: unknown) => this.#refused.set(asProblem(error)),
    });
  }

  #while<T>(call: Observable<T>): Observable<T> {
    return call.pipe(takeUntilDestroyed(this.#destroyed));
  }
}
