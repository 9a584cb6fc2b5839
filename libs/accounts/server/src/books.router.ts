import {
  getReconciliation,
  importBankStatement,
  ledgerBalances,
  ledgerEntries,
  refreshReconciliation,
} from '@seamwright/accounts/contracts';
import { ACCOUNTS } from '@seamwright/accounts/domain';
import {
  conflict,
  implement,
  implementOnce,
  inTransaction,
  pageFrom,
  type Implementation,
} from '@seamwright/shared/server';
import { RefusalError, type PlantDate } from '@seamwright/shared/util';
import { statementById } from './bank.repository';
import { numberPlace } from './cursors';
import { importStatement } from './import-statement';
import { accountSums, entriesPage } from './journal.repository';
import type { AccountsParts } from './parts';
import { presentReconciliation } from './present-reconciliation';
import { ProcessorSilent } from './processor';
import { syncProcessor } from './sync-processor';

/** Ledger, bank and reconciliation. */
export const bookImplementations = (parts: AccountsParts): Implementation[] => [
  implement(ledgerEntries, ({ database, caller }, { query: { cursor, limit, ...filters } }) =>
    inTransaction(database, caller, async (tx) => {
      const entries = await entriesPage(tx, { ...filters, limit, before: numberPlace(cursor) });
      return pageFrom(
        entries,
        limit,
        ({ number }) => [number],
        ({ lines, ...entry }) => ({ ...entry, lines: lines.map(({ entryId: _entryId, ...line }) => line) }),
      );
    }),
  ),
  implement(ledgerBalances, ({ database, caller }) =>
    inTransaction(database, caller, async (tx) => {
      const sums = await accountSums(tx);
      const place = new Map(ACCOUNTS.map((account, at) => [account, at]));
      const inOrder = sums.toSorted((a, b) => (place.get(a.account) ?? 0) - (place.get(b.account) ?? 0));
      return { items: inOrder.map((sum) => ({ ...sum, balanceMinor: sum.debitMinor - sum.creditMinor })) };
    }),
  ),
  implement(getReconciliation, ({ database, caller, now }, { query }) =>
    inTransaction(database, caller, (tx) =>
      presentReconciliation(tx, parts, now, query.day ? (query.day as PlantDate) : null),
    ),
  ),
  implement(refreshReconciliation, ({ database, log }) =>
    syncProcessor({ database, log, clock: parts.clock }, parts).catch((error: unknown) => {
      throw error instanceof ProcessorSilent ? conflict('processor-silent') : error;
    }),
  ),
  implementOnce(importBankStatement, {
    make(tx, { now, caller, upload }) {
      if (!upload) throw new RefusalError({ code: 'file-missing', params: {} });
      return importStatement(tx, { now, caller, timeZone: parts.timeZone }, upload);
    },
    async present(tx, _context, id) {
      const statement = await statementById(tx, id);
      return { ...statement, importedAt: statement.importedAt.toISOString() };
    },
  }),
];
