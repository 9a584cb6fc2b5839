import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { map, of, switchMap } from 'rxjs';
import { listCuttingDays, listPackingOrders } from '@seamwright/plant/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { packingTasks } from './orders.tasks';

/** Orders on the floor that are left to pack, for the first day that is not done. */
@Component({
  selector: 'sw-packing.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Left to pack"
      i18n-heading="@@admin.home.packing"
      none="Nothing is left to pack."
      i18n-none="@@admin.home.packing.none"
      allLabel="To the scale"
      i18n-allLabel="@@admin.home.packing.all"
      [all]="['/scale']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PackingBoard {
  private readonly api = inject(ApiClient);

  protected readonly answer = asked(() =>
    this.api.call(listCuttingDays, { query: { state: 'released' } }).pipe(
      map(({ items }) => items.map(({ deliveryDay }) => deliveryDay).sort()[0]),
      switchMap((deliveryDay) =>
        deliveryDay === undefined
          ? of([])
          : this.api.call(listPackingOrders, { query: { deliveryDay } }).pipe(map(({ orders }) => orders)),
      ),
    ),
  );
  protected readonly tasks = this.answer.as(packingTasks);
}
