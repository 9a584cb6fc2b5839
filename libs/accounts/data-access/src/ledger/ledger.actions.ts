import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { AccountBalance, LedgerEntry } from '@seamwright/accounts/contracts';
import type { Account } from '@seamwright/accounts/domain';
import type { Problem } from '@seamwright/shared/contracts';

/** Which entries are shown; null for all. */
export interface EntrySearch {
  readonly account: Account | null;
  readonly invoiceId: string | null;
}

export const LedgerPageActions = createActionGroup({
  source: 'Ledger Page',
  events: { Opened: props<{ search: EntrySearch }>(), 'More Wanted': emptyProps() },
});

export const LedgerApiActions = createActionGroup({
  source: 'Ledger API',
  events: {
    'Balances Loaded': props<{ items: AccountBalance[] }>(),
    'Balances Failed': props<{ problem: Problem }>(),
    'Entries Loaded': props<{ items: LedgerEntry[]; nextCursor: string | null; first: boolean }>(),
    'Entries Failed': props<{ problem: Problem }>(),
  },
});

export const LedgerLiveActions = createActionGroup({ source: 'Ledger Live', events: { Changed: emptyProps() } });
