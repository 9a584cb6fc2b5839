import { inject, Injectable, Injector, type OnDestroy } from '@angular/core';
import {
  catchError,
  defer,
  finalize,
  firstValueFrom,
  from,
  map,
  of,
  shareReplay,
  Subject,
  tap,
  throwError,
  type Observable,
} from 'rxjs';
import { ApiClient, ApiProblem, type AccessTokenSource } from '@seamwright/shared/data-access';
import {
  refreshAddress,
  type refreshSession,
  type SessionPerson,
  type SignedIn,
} from '@seamwright/identity/contracts/session';
import { IDENTITY_APPLICATION } from './identity-application';

/** What became of the sign-in without this tab's doing. */
export type SessionEvent = { readonly kind: 'renewed'; readonly person: SessionPerson } | { readonly kind: 'ended' };

/** Renewed so long before it runs out, so that no call is refused for it. */
const AHEAD_MS = 60_000;

/**
 * The access token, in memory only, and its renewal: once for all who ask at a time, and under a lock that the tabs
 * share, so that the cookie's tokens are used one after the other.
 */
@Injectable()
export class SessionTokens implements AccessTokenSource, OnDestroy {
  // The client asks for tokens here, so it is looked up late.
  readonly #injector = inject(Injector);
  readonly #name = `seamwright-session-${inject(IDENTITY_APPLICATION)}`;
  readonly #application = inject(IDENTITY_APPLICATION);
  readonly #events = new Subject<SessionEvent>();
  readonly #tabs = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(this.#name);
  #token: { readonly text: string; readonly until: number } | null = null;
  #renewing: Observable<SignedIn | null> | null = null;
  #timer: ReturnType<typeof setTimeout> | undefined;

  readonly events = this.#events.asObservable();

  constructor() {
    if (this.#tabs) this.#tabs.onmessage = () => this.#end();
  }

  ngOnDestroy(): void {
    this.#forget();
    this.#tabs?.close();
  }

  current(): string | null {
    return this.#token && this.#token.until > performance.now() ? this.#token.text : null;
  }

  /** Called when the token in force was refused. */
  renew(): Observable<string | null> {
    this.#token = null;
    return this.#renewed();
  }

  /** Takes what a sign-in gave. */
  keep({ accessToken, expiresInSeconds }: SignedIn): void {
    const lifeMs = expiresInSeconds * 1000;
    this.#token = { text: accessToken, until: performance.now() + lifeMs };
    clearTimeout(this.#timer);
    // A failure here is met again by the next call, which says so.
    const ahead = () => void this.#renewed().subscribe({ error: () => undefined });
    this.#timer = setTimeout(ahead, Math.max(lifeMs - AHEAD_MS, lifeMs / 2));
  }

  /** Forgets the token, here and in the other tabs. */
  drop(): void {
    this.#forget();
    this.#tabs?.postMessage('signed-out');
  }

  /** The sign-in that the cookie carries on; null when there is none. */
  refresh(): Observable<SignedIn | null> {
    this.#renewing ??= defer(() => from(this.#locked(() => firstValueFrom(this.#ask())))).pipe(
      tap((session) => (session ? this.keep(session) : this.#forget())),
      finalize(() => (this.#renewing = null)),
      shareReplay(1),
    );
    return this.#renewing;
  }

  #renewed(): Observable<string | null> {
    return this.refresh().pipe(
      tap((session) => (session ? this.#events.next({ kind: 'renewed', person: session.person }) : this.#end())),
      map((session) => session?.accessToken ?? null),
    );
  }

  #ask(): Observable<SignedIn | null> {
    const body = { application: this.#application };
    return this.#injector
      .get(ApiClient)
      .call<typeof refreshSession>(refreshAddress, { body })
      .pipe(
        map(({ session }) => session),
        catchError((error: unknown) =>
          error instanceof ApiProblem && error.problem.status === 401 ? of(null) : throwError(() => error),
        ),
      );
  }

  #locked<T>(work: () => Promise<T>): Promise<T> {
    if (typeof navigator === 'undefined' || !navigator.locks) return work();
    return navigator.locks.request(this.#name, work) as Promise<T>;
  }

  #end(): void {
    this.#forget();
    this.#events.next({ kind: 'ended' });
  }

  #forget(): void {
    clearTimeout(this.#timer);
    this.#token = null;
  }
}
