import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { AccountsToday } from '@seamwright/accounts/data-access';
import { accountsTasks } from './accounts.tasks';
import { asked } from './asked';
import { HomeBoard } from './home-board';

/** What the accounts desk looks at first: money that nothing explains, what is overdue, and holds that end soon. */
@Component({
  selector: 'sw-accounts.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Money today"
      i18n-heading="@@admin.home.money"
      none="Nothing waits."
      i18n-none="@@admin.home.money.none"
      allLabel="The week of card money"
      i18n-allLabel="@@admin.home.money.all"
      [all]="['/reconciliation']"
      [counted]="false"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountsBoard {
  private readonly accounts = inject(AccountsToday);

  protected readonly answer = asked(() => this.accounts.read(new Date()));
  protected readonly tasks = this.answer.as(accountsTasks);
}
