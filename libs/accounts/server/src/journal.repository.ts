import { sql } from 'kysely';
import type { Account, EntryKind, JournalEntry } from '@seamwright/accounts/domain';
import type { Tx } from '@seamwright/shared/server';
import { newId, plantToday } from '@seamwright/shared/util';

/** When and where it is posted. */
export interface Posting {
  readonly now: Date;
  readonly timeZone: string;
}

/**
 * Posts entries with their texts. A fact that was posted already is left as it is. Gives how many were posted. The
 * database refuses one that does not balance.
 */
export async function post(
  tx: Tx,
  { now, timeZone }: Posting,
  entries: readonly (JournalEntry & { readonly text: string })[],
): Promise<number> {
  const wanted = entries.filter(({ lines }) => lines.length > 0);
  if (wanted.length === 0) return 0;
  const postedOn = plantToday(now, timeZone);
  const posted = await tx
    .insertInto('journalEntries')
    .values(
      wanted.map(({ kind, sourceKey, text }) => ({ id: newId(), kind, sourceKey, text, postedOn, postedAt: now })),
    )
    .onConflict((conflict) => conflict.column('sourceKey').doNothing())
    .returning(['id', 'sourceKey'])
    .execute();
  const idOf = new Map(posted.map(({ sourceKey, id }) => [sourceKey, id]));
  const lines = wanted.flatMap((entry) => {
    const entryId = idOf.get(entry.sourceKey);
    return entryId ? entry.lines.map((line) => ({ id: newId(), entryId, currency: entry.currency, ...line })) : [];
  });
  if (lines.length > 0) await tx.insertInto('journalLines').values(lines).execute();
  return posted.length;
}

export interface KeptLine {
  readonly entryId: string;
  readonly account: Account;
  readonly customerName: string | null;
  readonly invoiceNumber: number | null;
  readonly currency: string;
  readonly debitMinor: number;
  readonly creditMinor: number;
}

export interface KeptEntry {
  readonly id: string;
  readonly number: number;
  readonly postedOn: string;
  readonly kind: EntryKind;
  readonly sourceKey: string;
  readonly text: string;
  readonly lines: readonly KeptLine[];
}

export interface EntriesQuestion {
  readonly limit: number;
  /** The number of the last entry that was shown. */
  readonly before: number | null;
  readonly account?: Account | undefined;
  readonly invoiceId?: string | undefined;
}

/** Entries newest first, whole, one more than the limit when there are more; those that touch an account or invoice. */
export async function entriesPage(tx: Tx, wanted: EntriesQuestion): Promise<KeptEntry[]> {
  let query = tx
    .selectFrom('journalEntries as e')
    .select(['e.id', 'e.number', 'e.postedOn', 'e.kind', 'e.sourceKey', 'e.text'])
    .orderBy('e.number', 'desc')
    .limit(wanted.limit + 1);
  if (wanted.before !== null) query = query.where('e.number', '<', wanted.before);
  const { account, invoiceId } = wanted;
  if (account || invoiceId) {
    query = query.where(({ exists, selectFrom }) => {
      let touching = selectFrom('journalLines as l').select('l.id').whereRef('l.entryId', '=', 'e.id');
      if (account) touching = touching.where('l.account', '=', account);
      if (invoiceId) touching = touching.where('l.invoiceId', '=', invoiceId);
      return exists(touching);
    });
  }
  const entries = await query.execute();
  const lines = await linesOf(
    tx,
    entries.map(({ id }) => id),
  );
  return entries.map((entry) => ({
    ...entry,
    kind: entry.kind as EntryKind,
    lines: lines.filter(({ entryId }) => entryId === entry.id),
  }));
}

async function linesOf(tx: Tx, entryIds: readonly string[]): Promise<KeptLine[]> {
  if (entryIds.length === 0) return [];
  const found = await tx
    .selectFrom('journalLines as l')
    .leftJoin('customers as c', 'c.id', 'l.customerId')
    .leftJoin('invoices as i', 'i.id', 'l.invoiceId')
    .select(['l.entryId', 'l.account', 'c.name as customerName', 'i.number as invoiceNumber', 'l.currency'])
    .select(['l.debitMinor', 'l.creditMinor'])
    .where('l.entryId', '=', sql<string>`any(${[...entryIds]}::uuid[])`)
    .orderBy('l.id')
    .execute();
  return found.map((line) => ({ ...line, account: line.account as Account }));
}

export interface AccountSum {
  readonly account: Account;
  readonly currency: string;
  readonly debitMinor: number;
  readonly creditMinor: number;
}

/** Debits and credits of every account that was posted to. */
export async function accountSums(tx: Tx): Promise<AccountSum[]> {
  const found = await tx
    .selectFrom('journalLines')
    .select(['account', 'currency'])
    .select([
      sql<number>`sum(debit_minor)::bigint`.as('debitMinor'),
      sql<number>`sum(credit_minor)::bigint`.as('creditMinor'),
    ])
    .groupBy(['account', 'currency'])
    .execute();
  return found.map((row) => ({ ...row, account: row.account as Account }));
}
