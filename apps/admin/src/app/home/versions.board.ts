import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { listVersions } from '@seamwright/catalogue/contracts';
import { ApiClient } from '@seamwright/shared/data-access';
import { asked } from './asked';
import { HomeBoard } from './home-board';
import { reviewTasks } from './versions.tasks';

/** Versions of specifications that wait for a review. */
@Component({
  selector: 'sw-versions.board',
  imports: [HomeBoard],
  template: `
    <sw-home-board
      heading="Versions in review"
      i18n-heading="@@admin.home.review"
      none="No version waits for a review."
      i18n-none="@@admin.home.review.none"
      allLabel="All specifications"
      i18n-allLabel="@@admin.home.review.all"
      [all]="['/specifications']"
      [remote]="answer.remote()"
      [tasks]="tasks()"
      (retry)="answer.ask()"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class VersionsBoard {
  private readonly api = inject(ApiClient);

  protected readonly answer = asked(() => this.api.call(listVersions, { query: { limit: 200 } }));
  protected readonly tasks = this.answer.as(({ items }) => reviewTasks(items));
}
