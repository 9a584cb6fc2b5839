import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { listInvoices } from '@seamwright/accounts/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { overdueTasks } from './accounts.tasks';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { today } from './plant-day';

/** Invoices whose day of payment has passed, the oldest first. */
@Component({
  selector: 'sw-overdue-invoices.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Overdue invoices"
      i18n-heading="@@admin.home.overdue"
      none="No invoice is overdue."
      i18n-none="@@admin.home.overdue.none"
      allLabel="All overdue invoices"
      i18n-allLabel="@@admin.home.overdue.all"
      [all]="['/invoices']"
      [query]="{ standing: 'overdue' }"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OverdueInvoicesBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() => this.api.call(listInvoices, { query: { standing: 'overdue', limit: 100 } }));
  protected readonly tasks = this.answer.as(({ items }) => overdueTasks(items, today(), this.locale));
}
