import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatButtonToggle, MatButtonToggleGroup } from '@angular/material/button-toggle';
import { Router, RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { QuoteListItem } from '@seamwright/pricing/contracts';
import { QuoteListPageActions, quotesFeature } from '@seamwright/pricing/data-access';
import { QUOTE_STATES, type QuoteState } from '@seamwright/pricing/domain';
import { QuoteStateChip, quoteStateWord } from '@seamwright/pricing/ui';
import { Card, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';

const isState = (text: string | undefined): text is QuoteState => QUOTE_STATES.some((state) => state === text);

/** What was quoted, newest first, by state. */
@Component({
  selector: 'sw-quotes-page',
  imports: [
    Card,
    DataTable,
    Empty,
    ErrorState,
    MatButton,
    MatButtonToggle,
    MatButtonToggleGroup,
    PageHead,
    QuoteStateChip,
    RouterLink,
    TableCell,
  ],
  templateUrl: './quotes.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuotesPage {
  /** From the address: which quotes are shown. */
  readonly state = input<string>();

  private readonly store = inject(Store);
  private readonly router = inject(Router);

  protected readonly shown = computed(() => {
    const state = this.state();
    return isState(state) ? state : null;
  });
  protected readonly list = this.store.selectSignal(quotesFeature.selectList);
  protected readonly hasMore = this.store.selectSignal(quotesFeature.selectHasMore);
  protected readonly rows = computed(() => this.list().data ?? []);
  protected readonly loading = computed(() => this.list().status === 'loading');

  protected readonly filters = [
    { value: '', label: $localize`:@@quotes.filter.all:All` },
    ...QUOTE_STATES.map((state) => ({ value: state, label: quoteStateWord(state) })),
  ];
  protected readonly columns: readonly TableColumn<QuoteListItem>[] = [
    {
      key: 'number',
      label: $localize`:@@quotes.column.number:Quote`,
      kind: 'code',
      value: ({ number }) => String(number),
    },
    { key: 'customerName', label: $localize`:@@quotes.column.customer:Customer`, kind: 'text' },
    { key: 'state', label: $localize`:@@quotes.column.state:State`, kind: 'template' },
    { key: 'pricesFrom', label: $localize`:@@quotes.column.from:Prices from`, kind: 'date' },
    { key: 'pricesUntil', label: $localize`:@@quotes.column.until:until`, kind: 'date' },
    { key: 'answerBy', label: $localize`:@@quotes.column.answerBy:Answer by`, kind: 'date' },
    { key: 'lineCount', label: $localize`:@@quotes.column.lines:Lines`, kind: 'count' },
  ];
  protected readonly idOf = (quote: QuoteListItem): string => quote.id;
  protected readonly linkOf = (quote: QuoteListItem): readonly string[] => ['/quotes', quote.id];

  constructor() {
    effect(() => {
      this.shown();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(QuoteListPageActions.opened({ state: this.shown() }));
  }

  protected more(): void {
    this.store.dispatch(QuoteListPageActions.moreWanted());
  }

  protected show(state: string): void {
    void this.router.navigate(['/quotes'], { queryParams: { state: state === '' ? null : state } });
  }
}
