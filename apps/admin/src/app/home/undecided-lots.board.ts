import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { forkJoin } from 'rxjs';
import { ApiClient } from '@seamwright/shared/data-access';
import { listLotNodes, listLots } from '@seamwright/stock/contracts';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { undecidedTasks } from './lots.tasks';

/** Lots that nothing is cut from until somebody decides. */
@Component({
  selector: 'sw-undecided-lots.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Lots on hold or to release"
      i18n-heading="@@admin.home.undecided"
      none="Every lot is decided."
      i18n-none="@@admin.home.undecided.none"
      allLabel="All lots"
      i18n-allLabel="@@admin.home.undecided.all"
      [all]="['/lots']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UndecidedLotsBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() =>
    forkJoin({
      held: this.api.call(listLots, { query: { state: 'on-hold' } }),
      received: this.api.call(listLots, { query: { state: 'received' } }),
      primals: this.api.call(listLotNodes, {}),
    }),
  );
  protected readonly tasks = this.answer.as(({ held, received, primals }) =>
    undecidedTasks([...held.items, ...received.items], primals.items, this.locale),
  );
}
