import { ChangeDetectionStrategy, Component, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Store } from '@ngrx/store';
import { InvoicePageActions } from '@seamwright/accounts/data-access';
import { CardPayment, InvoiceLines, InvoiceStandingChip, InvoiceSum } from '@seamwright/accounts/ui';
import { Card, ErrorState, Icon, Loading, PageHead, Stale } from '@seamwright/shared/ui';
import { InvoiceFacts } from './invoice-facts';
import { invoiceView } from './invoice-view';

/** One invoice as its buyer sees it: lines with real weights, what is paid, and the paper. */
@Component({
  selector: 'sw-buyer-invoice-page',
  imports: [
    Card,
    CardPayment,
    ErrorState,
    Icon,
    InvoiceFacts,
    InvoiceLines,
    InvoiceStandingChip,
    InvoiceSum,
    Loading,
    MatButton,
    PageHead,
    Stale,
  ],
  templateUrl: './buyer-invoice.page.html',
  styleUrl: './invoice.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BuyerInvoicePage {
  readonly invoiceId = input.required<string>();

  private readonly store = inject(Store);
  protected readonly view = invoiceView(() => this.invoiceId());

  constructor() {
    effect(() => {
      this.invoiceId();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(InvoicePageActions.opened({ invoiceId: this.invoiceId() }));
  }
}
