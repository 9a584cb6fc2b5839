import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { QuotePageActions, QuotesApiActions, quotesFeature } from '@seamwright/pricing/data-access';
import { quoteStates } from '@seamwright/pricing/domain';
import { QuoteFacts, QuoteLines, QuoteSeam, QuoteStateChip } from '@seamwright/pricing/ui';
import { Card, Confirm, ErrorState, Loading, PageHead, Stale, Toast } from '@seamwright/shared/ui';

/** One quote as the desk sees it; a draft can be sent from here. */
@Component({
  selector: 'sw-quote-page',
  imports: [Card, ErrorState, Loading, MatButton, PageHead, QuoteFacts, QuoteLines, QuoteSeam, QuoteStateChip, Stale],
  templateUrl: './quote.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuotePage {
  readonly quoteId = input.required<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly toast = inject(Toast);

  protected readonly quote = this.store.selectSignal(quotesFeature.selectQuote);
  protected readonly deed = this.store.selectSignal(quotesFeature.selectDeed);
  protected readonly stale = computed(() => this.deed().problem?.code === 'stale');
  protected readonly canSend = computed(() => {
    const quote = this.quote().data;
    return quote !== null && quoteStates.allowedMoves(quote.state).includes('send');
  });
  protected readonly crumbs = [{ label: $localize`:@@quote.crumb:Quotes`, path: '/quotes' }];

  constructor() {
    effect(() => {
      this.quoteId();
      untracked(() => this.load());
    });
    inject(Actions)
      .pipe(ofType(QuotesApiActions.deedDone), takeUntilDestroyed())
      .subscribe(({ quote }) => {
        void this.toast.show({
          text: $localize`:@@quote.sentToast:Quote ${quote.number}:number: was sent to ${quote.customerName}:customer:.`,
        });
      });
  }

  protected load(): void {
    this.store.dispatch(QuotePageActions.opened({ quoteId: this.quoteId() }));
  }

  protected headingOf(quote: QuoteDetail): string {
    return $localize`:@@quote.heading:Quote ${quote.number}:number: for ${quote.customerName}:customer:`;
  }

  protected async send(quote: QuoteDetail): Promise<void> {
    const agreed = await this.confirm.ask({
      heading: $localize`:@@quote.send.heading:Send this quote?`,
      text: $localize`:@@quote.send.text:${quote.customerName}:customer: gets it by mail and sees it in the storefront. It can't be changed after that.`,
      act: $localize`:@@quote.send.act:Send the quote`,
      back: $localize`:@@quote.send.back:Not yet`,
    });
    if (agreed)
      this.store.dispatch(
        QuotePageActions.deedPressed({ deed: 'send', quoteId: quote.id, rowVersion: quote.rowVersion }),
      );
  }
}
