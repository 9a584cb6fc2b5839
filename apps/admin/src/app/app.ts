import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { SessionActions, selectPerson, selectRoles } from '@seamwright/identity/data-access/session';
import { AdminShell, Disclosure, FrameIcon, MenuItem, type NavLink } from '@seamwright/shared/ui/frame';
import { placesOf } from './places';

/** The desk's application: its frame around the routed page. */
@Component({
  selector: 'sw-root',
  imports: [AdminShell, Disclosure, FrameIcon, MenuItem, RouterLink],
  template: `
    <sw-admin-shell [links]="links()">
      @if (person(); as known) {
        <sw-disclosure swPerson icon="person" [label]="known.name">
          <a swMenuItem routerLink="/account" i18n="@@admin.menu.account">My account</a>
          <button swMenuItem type="button" (click)="signOut()">
            <sw-icon name="sign-out" />
            <span i18n="@@admin.menu.signOut">Sign out</span>
          </button>
        </sw-disclosure>
      }
    </sw-admin-shell>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {
  readonly #store = inject(Store);
  readonly #roles = this.#store.selectSignal(selectRoles);

  protected readonly person = this.#store.selectSignal(selectPerson);
  protected readonly links = computed<readonly NavLink[]>(() =>
    this.person() ? placesOf(this.#roles()).map(({ label, path }) => ({ label, path: `/${path}` })) : [],
  );

  protected signOut(): void {
    this.#store.dispatch(SessionActions.signOutAsked());
  }
}
