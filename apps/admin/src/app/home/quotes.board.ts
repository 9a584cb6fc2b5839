import { ChangeDetectionStrategy, Component, inject, LOCALE_ID } from '@angular/core';
import { listQuotes } from '@seamwright/pricing/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { today } from './plant-day';
import { quoteTasks } from './quotes.tasks';

/** Quotes that customers have not answered. */
@Component({
  selector: 'sw-quotes.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Quotes that wait for an answer"
      i18n-heading="@@admin.home.quotes"
      none="Every quote is answered."
      i18n-none="@@admin.home.quotes.none"
      allLabel="All quotes that were sent"
      i18n-allLabel="@@admin.home.quotes.all"
      [all]="['/quotes']"
      [query]="{ state: 'sent' }"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuotesBoard {
  private readonly api = inject(ApiClient);
  private readonly locale = inject(LOCALE_ID);

  protected readonly answer = asked(() => this.api.call(listQuotes, { query: { state: 'sent', limit: 100 } }));
  protected readonly tasks = this.answer.as(({ items }) => quoteTasks(items, today(), this.locale));
}
