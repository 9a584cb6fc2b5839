import { ChangeDetectionStrategy, Component } from '@angular/core';
import { PageHead } from '@seamwright/shared/ui';
import { MyName } from './my-name';
import { MyPassword } from './my-password';
import { MySessions } from './my-sessions';

/** One's own name, password and signed-in browsers. */
@Component({
  selector: 'sw-account-page',
  imports: [MyName, MyPassword, MySessions, PageHead],
  template: `
    <sw-page-head heading="Your account" i18n-heading="@@identity.account.title" />
    <sw-my-name />
    <sw-my-password />
    <sw-my-sessions />
  `,
  styles: `
    :host {
      max-inline-size: 880px;
    }
  `,
  host: { class: 'sw-page sw-stack' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountPage {}
