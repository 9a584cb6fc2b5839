import * as z from 'zod';
import { ACCOUNTS, ENTRY_KINDS } from '@seamwright/accounts/domain';
import {
  currency,
  defineEndpoint,
  id,
  minor,
  pageOf,
  pageQuery,
  plantDay,
  staffOnly,
} from '@seamwright/shared/contracts';

const account = z.enum(ACCOUNTS);
const readers = staffOnly('accounts', 'admin');

export const ledgerEntry = z.strictObject({
  id,
  number: z.int().positive(),
  postedOn: plantDay,
  kind: z.enum(ENTRY_KINDS),
  /** The fact that it posts. */
  sourceKey: z.string(),
  text: z.string(),
  lines: z.array(
    z.strictObject({
      account,
      customerName: z.string().nullable(),
      invoiceNumber: z.int().nullable(),
      currency,
      debitMinor: minor,
      creditMinor: minor,
    }),
  ),
});
export type LedgerEntry = z.infer<typeof ledgerEntry>;

export const ledgerEntries = defineEndpoint({
  id: 'ledger.entries',
  summary: 'Journal entries, newest first, whole',
  method: 'GET',
  path: '/ledger/entries',
  access: readers,
  query: { ...pageQuery, account: account.optional(), invoiceId: id.optional() },
  response: pageOf(ledgerEntry),
});

export const accountBalance = z.strictObject({
  account,
  currency,
  debitMinor: minor,
  creditMinor: minor,
  /** Debits less credits. */
  balanceMinor: minor,
});
export type AccountBalance = z.infer<typeof accountBalance>;

export const ledgerBalances = defineEndpoint({
  id: 'ledger.balances',
  summary: 'What stands on each account',
  method: 'GET',
  path: '/ledger/balances',
  access: readers,
  response: z.strictObject({ items: z.array(accountBalance) }),
});
