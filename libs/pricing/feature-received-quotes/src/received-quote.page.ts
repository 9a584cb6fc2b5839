import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  LOCALE_ID,
  untracked,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { QuotePageActions, QuotesApiActions, quotesFeature } from '@seamwright/pricing/data-access';
import { quoteStates } from '@seamwright/pricing/domain';
import { QuoteFacts, QuoteLines, QuoteSeam, QuoteStateChip } from '@seamwright/pricing/ui';
import { Card, Confirm, DatePipe, ErrorState, Loading, PageHead, Stale, Toast } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** A quote as the customer reads it, with what accepting means, and the answer. */
@Component({
  selector: 'sw-received-quote-page',
  imports: [
    Card,
    DatePipe,
    ErrorState,
    Loading,
    MatButton,
    PageHead,
    QuoteFacts,
    QuoteLines,
    QuoteSeam,
    QuoteStateChip,
    RouterLink,
    Stale,
  ],
  templateUrl: './received-quote.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReceivedQuotePage {
  readonly quoteId = input.required<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly toast = inject(Toast);
  private readonly locale = inject(LOCALE_ID);

  protected readonly quote = this.store.selectSignal(quotesFeature.selectQuote);
  protected readonly deed = this.store.selectSignal(quotesFeature.selectDeed);
  protected readonly stale = computed(() => this.deed().problem?.code === 'stale');
  protected readonly canAnswer = computed(() => {
    const quote = this.quote().data;
    return quote !== null && quoteStates.allowedMoves(quote.state).includes('accept');
  });
  protected readonly crumbs = [{ label: $localize`:@@received.crumb:Quotes`, path: '/quotes' }];

  constructor() {
    effect(() => {
      this.quoteId();
      untracked(() => this.load());
    });
    inject(Actions)
      .pipe(ofType(QuotesApiActions.deedDone), takeUntilDestroyed())
      .subscribe(({ deed }) => {
        const text =
          deed === 'accept'
            ? $localize`:@@received.acceptedToast:Accepted. Your next orders use these prices.`
            : $localize`:@@received.declinedToast:Declined. Your prices stay as they were.`;
        void this.toast.show({ text });
      });
  }

  protected load(): void {
    this.store.dispatch(QuotePageActions.opened({ quoteId: this.quoteId() }));
  }

  protected headingOf({ number }: QuoteDetail): string {
    return $localize`:@@received.one.heading:Quote ${number}:number:`;
  }

  protected async accept(quote: QuoteDetail): Promise<void> {
    const [from, until] = [this.dayText(quote.pricesFrom), this.dayText(quote.pricesUntil)];
    const agreed = await this.confirm.ask({
      heading: $localize`:@@received.accept.heading:Accept these prices?`,
      text: $localize`:@@received.accept.text:They become your agreed prices for deliveries from ${from}:from: to ${until}:until:, for these choices, and take the place of prices agreed before. Accepting orders nothing yet.`,
      act: $localize`:@@received.accept.act:Accept the prices`,
      back: $localize`:@@received.accept.back:Not yet`,
    });
    if (agreed) this.answer(quote, 'accept');
  }

  protected async decline(quote: QuoteDetail): Promise<void> {
    const agreed = await this.confirm.ask({
      heading: $localize`:@@received.decline.heading:Decline this quote?`,
      text: $localize`:@@received.decline.text:Your prices stay as they are. A declined quote can't be accepted later; your rep can write a new one.`,
      act: $localize`:@@received.decline.act:Decline the quote`,
      back: $localize`:@@received.decline.back:Keep it open`,
      destructive: true,
    });
    if (agreed) this.answer(quote, 'decline');
  }

  private answer({ id: quoteId, rowVersion }: QuoteDetail, deed: 'accept' | 'decline'): void {
    this.store.dispatch(QuotePageActions.deedPressed({ deed, quoteId, rowVersion }));
  }

  private dayText(day: string): string {
    return isPlantDate(day) ? formatPlantDate(day, 'short', this.locale) : day;
  }
}
