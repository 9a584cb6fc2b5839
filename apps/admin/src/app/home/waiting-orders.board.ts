import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { listOrders } from '@seamwright/ordering/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { waitingOrderTasks } from './orders.tasks';

/** Orders that are placed but wait, most of them for a card. */
@Component({
  selector: 'sw-waiting-orders.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Orders that wait"
      i18n-heading="@@admin.home.waitingOrders"
      none="Every order is confirmed."
      i18n-none="@@admin.home.waitingOrders.none"
      allLabel="All orders that wait"
      i18n-allLabel="@@admin.home.waitingOrders.all"
      [all]="['/orders']"
      [query]="{ state: 'waiting' }"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WaitingOrdersBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() => this.api.call(listOrders, { query: { state: 'waiting', limit: 100 } }));
  protected readonly tasks = this.answer.as(({ items }) => waitingOrderTasks(items, this.locale));
}
