import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { InvoicePageActions, invoicesFeature } from '@seamwright/accounts/data-access';
import { CardPayment, InvoiceLines, InvoiceStandingChip, InvoiceSum, LedgerEntries } from '@seamwright/accounts/ui';
import { Card, ErrorState, Icon, Loading, PageHead, Stale } from '@seamwright/shared/ui';
import { InvoiceFacts } from './invoice-facts';
import { invoiceView } from './invoice-view';

/** One invoice as the accounts desk sees it: with its card payment and what it posted. */
@Component({
  selector: 'sw-desk-invoice-page',
  imports: [
    Card,
    CardPayment,
    ErrorState,
    Icon,
    InvoiceFacts,
    InvoiceLines,
    InvoiceStandingChip,
    InvoiceSum,
    LedgerEntries,
    Loading,
    MatButton,
    PageHead,
    RouterLink,
    Stale,
  ],
  templateUrl: './desk-invoice.page.html',
  styleUrl: './invoice.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeskInvoicePage {
  readonly invoiceId = input.required<string>();

  private readonly store = inject(Store);
  protected readonly view = invoiceView(() => this.invoiceId());
  protected readonly postings = this.store.selectSignal(invoicesFeature.selectPostings);
  protected readonly entries = computed(() => this.postings().data ?? []);

  constructor() {
    effect(() => {
      this.invoiceId();
      untracked(() => this.load());
    });
    // What is paid meanwhile is posted too.
    const paidMinor = computed(() => this.view.invoice().data?.paidMinor);
    effect(() => {
      if (paidMinor() !== undefined) untracked(() => this.loadPostings());
    });
  }

  protected load(): void {
    this.store.dispatch(InvoicePageActions.opened({ invoiceId: this.invoiceId() }));
  }

  protected loadPostings(): void {
    this.store.dispatch(InvoicePageActions.postingsWanted({ invoiceId: this.invoiceId() }));
  }
}
