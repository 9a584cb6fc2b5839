import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { QuoteListItem } from '@seamwright/pricing/contracts';
import { QuoteListPageActions, quotesFeature } from '@seamwright/pricing/data-access';
import { QuoteStateChip } from '@seamwright/pricing/ui';
import { DatePipe, Empty, ErrorState, Loading, PageHead } from '@seamwright/shared/ui';

/** What was quoted to the customer: first what waits for an answer, then the rest, each newest first. */
@Component({
  selector: 'sw-received-quotes-page',
  imports: [DatePipe, Empty, ErrorState, Loading, MatButton, PageHead, QuoteStateChip, RouterLink],
  templateUrl: './received-quotes.page.html',
  styleUrl: './received-quotes.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReceivedQuotesPage {
  private readonly store = inject(Store);

  protected readonly list = this.store.selectSignal(quotesFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(quotesFeature.selectHasMore);
  protected readonly loading = computed(() => this.list().status === 'loading');
  protected readonly quotes = computed(() => {
    const all = this.list().data;
    return all && [...all.filter(isWaiting), ...all.filter((quote) => !isWaiting(quote))];
  });

  constructor() {
    this.load();
  }

  protected load(): void {
    this.store.dispatch(QuoteListPageActions.opened({ state: null }));
  }

  protected more(): void {
    this.store.dispatch(QuoteListPageActions.moreWanted());
  }
}

const isWaiting = ({ state }: QuoteListItem): boolean => state === 'sent';
