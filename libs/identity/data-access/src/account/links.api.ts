import { inject, Injectable } from '@angular/core';
import { Store } from '@ngrx/store';
import { tap, type Observable } from 'rxjs';
import { ApiClient } from '@seamwright/shared/data-access';
import { acceptInvitation, forgotPassword, resetPassword, type UsedLink } from '@seamwright/identity/contracts';
import { IDENTITY_APPLICATION } from '../session/identity-application';
import { PageLoad } from '../session/page-load';
import { SessionTokens } from '../session/session-tokens';
import { SessionApiActions } from '../session/session.actions';

/** What is done by mailed links. A link that was used signs in. */
@Injectable({ providedIn: 'root' })
export class LinksApi {
  readonly #api = inject(ApiClient);
  readonly #application = inject(IDENTITY_APPLICATION);
  readonly #pages = inject(PageLoad);
  readonly #store = inject(Store);
  readonly #tokens = inject(SessionTokens);

  forgotPassword(email: string): Observable<undefined> {
    return this.#api.call(forgotPassword, { body: { email } });
  }

  acceptInvitation(token: string, password: string, name?: string): Observable<UsedLink> {
    const body = { token, password, ...(name ? { name } : {}) };
    return this.#api.call(acceptInvitation, { body }).pipe(tap((used) => this.#enter(used)));
  }

  resetPassword(token: string, password: string): Observable<UsedLink> {
    return this.#api.call(resetPassword, { body: { token, password } }).pipe(tap((used) => this.#enter(used)));
  }

  #enter(used: UsedLink): void {
    if (used.application !== this.#application) {
      this.#pages.outside(used.application === 'admin' ? '/admin/' : '/');
      return;
    }
    this.#tokens.keep(used);
    this.#store.dispatch(SessionApiActions.signedIn({ person: used.person }));
  }
}
