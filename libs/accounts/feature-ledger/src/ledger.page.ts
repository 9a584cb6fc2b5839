import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { AccountBalance } from '@seamwright/accounts/contracts';
import { ledgerFeature, LedgerPageActions, type EntrySearch } from '@seamwright/accounts/data-access';
import { ACCOUNTS } from '@seamwright/accounts/domain';
import { accountWords, LedgerEntries } from '@seamwright/accounts/ui';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, Chip, Empty, ErrorState, Loading, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { currencyCode, unwrap } from '@seamwright/shared/util';

/** What stands on each account, and the entries that made it so. */
@Component({
  selector: 'sw-ledger-page',
  imports: [
    Card,
    Chip,
    DataTable,
    Empty,
    ErrorState,
    LedgerEntries,
    Loading,
    MatButton,
    PageHead,
    RouterLink,
    TableCell,
  ],
  templateUrl: './ledger.page.html',
  styleUrl: './ledger.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LedgerPage {
  /** From the address: whose entries are shown. */
  readonly account = input<string>();
  readonly invoiceId = input<string>();

  private readonly store = inject(Store);
  private readonly router = inject(Router);

  protected readonly search = computed<EntrySearch>(() => ({
    account: ACCOUNTS.find((account) => account === this.account()) ?? null,
    invoiceId: this.invoiceId() || null,
  }));
  protected readonly balances = this.store.selectSignal(ledgerFeature.selectBalances);
  protected readonly entries = this.store.selectSignal(ledgerFeature.selectEntries);
  protected readonly hasMore = this.store.selectSignal(ledgerFeature.selectHasMore);
  protected readonly shown = computed(() => this.entries().data ?? []);
  protected readonly loading = computed(() => this.entries().status === 'loading');
  protected readonly narrowed = computed(() => this.search().account !== null || this.search().invoiceId !== null);
  protected readonly heading = computed(() => {
    const { account } = this.search();
    return account === null
      ? $localize`:@@ledger.entries:Entries`
      : $localize`:@@ledger.entries.of:Entries on ${accountWords(account).name}:account:`;
  });
  protected readonly currency = HOUSE_CURRENCY;
  /** Each currency has books of its own. */
  protected readonly books = computed(() => {
    const items = this.balances().data ?? [];
    return [...new Set(items.map(({ currency }) => currency))].map((code) => {
      const rows = items.filter(({ currency }) => currency === code);
      const sum = (of: (row: AccountBalance) => number) => rows.reduce((total, row) => total + of(row), 0);
      return {
        currency: unwrap(currencyCode(code)),
        rows,
        totals: {
          debitMinor: sum(({ debitMinor }) => debitMinor),
          creditMinor: sum(({ creditMinor }) => creditMinor),
          balanceMinor: sum(({ balanceMinor }) => balanceMinor),
        },
      };
    });
  });
  protected readonly columns: readonly TableColumn<AccountBalance>[] = [
    { key: 'account', label: $localize`:@@ledger.column.account:Account`, kind: 'template' },
    {
      key: 'about',
      label: $localize`:@@ledger.column.about:What stands on it`,
      kind: 'text',
      value: ({ account }) => accountWords(account).about,
    },
    { key: 'debitMinor', label: $localize`:@@ledger.column.debit:Debit`, kind: 'money' },
    { key: 'creditMinor', label: $localize`:@@ledger.column.credit:Credit`, kind: 'money' },
    { key: 'balanceMinor', label: $localize`:@@ledger.column.balance:Balance`, kind: 'money' },
  ];
  protected readonly idOf = ({ account, currency }: AccountBalance): string => `${account} ${currency}`;
  protected readonly nameOf = ({ account }: AccountBalance): string => accountWords(account).name;

  constructor() {
    effect(() => {
      this.search();
      untracked(() => this.load());
    });
  }

  protected load(): void {
    this.store.dispatch(LedgerPageActions.opened({ search: this.search() }));
  }

  protected more(): void {
    this.store.dispatch(LedgerPageActions.moreWanted());
  }

  protected showAll(): void {
    void this.router.navigate(['/ledger']);
  }
}
