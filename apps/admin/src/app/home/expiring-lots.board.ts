import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { forkJoin } from 'rxjs';
import { ApiClient } from '@seamwright/shared/data-access';
import { listLotNodes, listLots } from '@seamwright/stock/contracts';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { expiringTasks } from './lots.tasks';
import { today } from './plant-day';

/** Lots that want to be cut before they are over. */
@Component({
  selector: 'sw-expiring-lots.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Use within two days"
      i18n-heading="@@admin.home.expiring"
      none="Every lot keeps longer."
      i18n-none="@@admin.home.expiring.none"
      allLabel="All lots"
      i18n-allLabel="@@admin.home.expiring.all"
      [all]="['/lots']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ExpiringLotsBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() =>
    forkJoin({
      lots: this.api.call(listLots, { query: { state: 'released', limit: 200 } }),
      primals: this.api.call(listLotNodes, {}),
    }),
  );
  protected readonly tasks = this.answer.as(({ lots, primals }) =>
    expiringTasks(lots.items, primals.items, today(), this.locale),
  );
}
