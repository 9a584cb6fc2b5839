import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { forkJoin } from 'rxjs';
import { getCalendar } from '@seamwright/ordering/contracts';
import { listCuttingDays } from '@seamwright/plant/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { isPlantDate, minorUnits } from '@seamwright/shared/util';
import { asked } from './asked';
import { cuttingDayTasks } from './cutting-days.tasks';
import { HomeBoard } from './home-board';

/** The next cutting days: how much is ordered, and what each waits for. */
@Component({
  selector: 'sw-cutting-days.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Next cutting days"
      i18n-heading="@@admin.home.days"
      none="No day has orders yet."
      i18n-none="@@admin.home.days.none"
      allLabel="All cutting days"
      i18n-allLabel="@@admin.home.days.all"
      [all]="['/cutting-days']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CuttingDaysBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() =>
    forkJoin({
      days: this.api.call(listCuttingDays, { query: { limit: 30 } }),
      calendar: this.api.call(getCalendar, {}),
    }),
  );
  protected readonly tasks = this.answer.as(({ days, calendar: { closures, timeZone, zones } }) =>
    cuttingDayTasks(
      days.items,
      {
        timeZone,
        closures: new Set(closures.map(({ day }) => day).filter(isPlantDate)),
        zones: zones.map((zone) => ({ ...zone, deliveryChargeMinor: minorUnits(zone.deliveryChargeMinor) })),
      },
      new Date(),
      this.locale,
    ),
  );
}
