import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { getCalendar } from '@seamwright/ordering/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { closureTasks } from './people.tasks';
import { today } from './plant-day';

/** Days ahead on which nothing is cut and no van goes. */
@Component({
  selector: 'sw-closures.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Closures ahead"
      i18n-heading="@@admin.home.closures"
      none="No closure is planned."
      i18n-none="@@admin.home.closures.none"
      allLabel="The calendar"
      i18n-allLabel="@@admin.home.closures.all"
      [all]="['/calendar']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ClosuresBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() => this.api.call(getCalendar, {}));
  protected readonly tasks = this.answer.as(({ closures }) => closureTasks(closures, today(), this.locale));
}
