import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import { ApiClient } from '@seamwright/shared/data-access';
import {
  changePassword,
  endSession,
  getMe,
  listSessions,
  renameMe,
  signOutEverywhere,
  type Me,
  type OpenSession,
} from '@seamwright/identity/contracts';

/** One's own account. */
@Injectable({ providedIn: 'root' })
export class AccountApi {
  readonly #api = inject(ApiClient);

  me(): Observable<Me> {
    return this.#api.call(getMe, {});
  }

  rename(name: string, rowVersion: number): Observable<Me> {
    return this.#api.call(renameMe, { body: { name }, ifMatch: rowVersion });
  }

  sessions(): Observable<{ items: OpenSession[] }> {
    return this.#api.call(listSessions, {});
  }

  endSession(sessionId: string): Observable<undefined> {
    return this.#api.call(endSession, { params: { sessionId } });
  }

  signOutEverywhere(): Observable<undefined> {
    return this.#api.call(signOutEverywhere, {});
  }

  changePassword(currentPassword: string, password: string): Observable<undefined> {
    return this.#api.call(changePassword, { body: { currentPassword, password } });
  }
}
