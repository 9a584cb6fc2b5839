import * as z from 'zod';
import { defineEndpoint, id, instant, minor, plantDay, staffOnly } from '@seamwright/shared/contracts';

export const MOST_STATEMENT_BYTES = 5 * 1024 * 1024;

export const bankStatement = z.strictObject({
  id,
  fileName: z.string(),
  importedAt: instant,
  lines: z.int().nonnegative(),
  firstDay: plantDay,
  lastDay: plantDay,
  /** The sum of its lines. */
  sumMinor: minor,
  /** Lines that were found to be payouts. */
  matched: z.int().nonnegative(),
});
export type BankStatement = z.infer<typeof bankStatement>;

export const importBankStatement = defineEndpoint({
  id: 'bank-statements.import',
  summary: 'Takes a bank statement (CSV: Date, Description, Reference, Amount or Debit and Credit), all or nothing',
  method: 'POST',
  path: '/bank-statements',
  access: staffOnly('accounts', 'admin'),
  upload: { maxBytes: MOST_STATEMENT_BYTES },
  response: bankStatement,
  status: 201,
  idempotent: true,
});
