import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { listPeople } from '@seamwright/identity/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { invitedTasks } from './people.tasks';

/** Whoever was invited and has not joined yet. */
@Component({
  selector: 'sw-invited.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Invited, not joined yet"
      i18n-heading="@@admin.home.invitedPeople"
      none="Everybody who was invited has joined."
      i18n-none="@@admin.home.invitedPeople.none"
      allLabel="All people"
      i18n-allLabel="@@admin.home.invitedPeople.all"
      [all]="['/people']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvitedBoard {
  private readonly api = inject(ApiClient);

  protected readonly answer = asked(() => this.api.call(listPeople, { query: { limit: 200 } }));
  protected readonly tasks = this.answer.as(({ items }) => invitedTasks(items));
}
