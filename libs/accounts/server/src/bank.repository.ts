import { sql } from 'kysely';
import type { BankLineToMatch, PayoutMatch, PayoutToMatch, StatementLine } from '@seamwright/accounts/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

export interface NewStatement {
  readonly id: string;
  readonly fileName: string;
  readonly fileHash: string;
  readonly importedAt: Date;
  readonly importedBy: string;
}

export const isTaken = async (tx: Tx, fileHash: string): Promise<boolean> =>
  (await tx.selectFrom('bankStatements').select('id').where('fileHash', '=', fileHash).executeTakeFirst()) !==
  undefined;

export async function insertStatement(
  tx: Tx,
  statement: NewStatement,
  currency: string,
  lines: readonly StatementLine[],
): Promise<void> {
  await tx.insertInto('bankStatements').values(statement).execute();
  const rows = lines.map((line) => ({ id: newId(), statementId: statement.id, currency, ...line }));
  // One statement takes at most 65,535 parameters.
  for (let at = 0; at < rows.length; at += 1000)
    await tx
      .insertInto('bankLines')
      .values(rows.slice(at, at + 1000))
      .execute();
}

/** A statement with what became of its lines; throws `not-found`. */
export const statementById = (tx: Tx, id: string) =>
  tx
    .selectFrom('bankStatements as s')
    .leftJoin('bankLines as l', 'l.statementId', 's.id')
    .leftJoin('bankMatches as m', 'm.bankLineId', 'l.id')
    .select(['s.id', 's.fileName', 's.importedAt'])
    .select([
      sql<number>`count(l.id)`.as('lines'),
      sql<string>`min(l.booked_on)`.as('firstDay'),
      sql<string>`max(l.booked_on)`.as('lastDay'),
      sql<number>`coalesce(sum(l.amount_minor), 0)::bigint`.as('sumMinor'),
      sql<number>`count(m.payout_id)`.as('matched'),
    ])
    .where('s.id', '=', id)
    .groupBy('s.id')
    .executeTakeFirstOrThrow(notFound);

const lineRows = (tx: Tx) =>
  tx
    .selectFrom('bankLines as l')
    .leftJoin('bankMatches as m', 'm.bankLineId', 'l.id')
    .select(['l.id', 'l.bookedOn', 'l.amountMinor', 'l.currency', 'l.text', 'l.reference']);

/** Keeps two matchings from pairing the same payout at once. */
export async function matchOneAtATime(tx: Tx): Promise<void> {
  await sql`select pg_advisory_xact_lock(hashtextextended('matching payouts with the bank', 0))`.execute(tx);
}

/** What came in since a day and is not matched. */
export const unmatchedLines = (tx: Tx, since: string): Promise<BankLineToMatch[]> =>
  lineRows(tx)
    .where('m.payoutId', 'is', null)
    .where('l.amountMinor', '>', 0)
    .where('l.bookedOn', '>=', since)
    .orderBy('l.bookedOn')
    .orderBy('l.id')
    .execute();

/** Payouts that should be at the bank and are not matched. */
export const unmatchedPayouts = (tx: Tx, since: string): Promise<PayoutToMatch[]> =>
  tx
    .selectFrom('processorPayouts as p')
    .leftJoin('bankMatches as m', 'm.payoutId', 'p.id')
    .select(['p.id', 'p.amountMinor', 'p.currency', 'p.arrivalOn'])
    .where('m.payoutId', 'is', null)
    .where('p.state', 'in', ['pending', 'in-transit', 'paid'])
    .where('p.arrivalOn', '>=', since)
    .orderBy('p.arrivalOn')
    .orderBy('p.id')
    .execute();

export async function insertMatches(tx: Tx, now: Date, matches: readonly PayoutMatch[]): Promise<void> {
  if (matches.length === 0) return;
  await tx
    .insertInto('bankMatches')
    .values(matches.map((match) => ({ ...match, matchedAt: now })))
    .execute();
}

/** The matches of these payouts, with their bank lines. */
export async function matchesOfPayouts(
  tx: Tx,
  payoutIds: readonly string[],
): Promise<(PayoutMatch & { readonly line: BankLineToMatch })[]> {
  if (payoutIds.length === 0) return [];
  const found = await tx
    .selectFrom('bankMatches as m')
    .innerJoin('bankLines as l', 'l.id', 'm.bankLineId')
    .select(['m.payoutId', 'm.bankLineId', 'm.matchedBy', 'm.differenceMinor'])
    .select(['l.id', 'l.bookedOn', 'l.amountMinor', 'l.currency', 'l.text', 'l.reference'])
    .where('m.payoutId', 'in', [...payoutIds])
    .execute();
  return found.map(({ payoutId, bankLineId, matchedBy, differenceMinor, ...line }) => ({
    payoutId,
    bankLineId,
    matchedBy: matchedBy as PayoutMatch['matchedBy'],
    differenceMinor,
    line,
  }));
}

/** Unmatched lines that were booked from a day to another. */
export const unmatchedLinesBetween = (
  tx: Tx,
  from: string,
  until: string,
  currency: string,
): Promise<BankLineToMatch[]> =>
  lineRows(tx)
    .where('m.payoutId', 'is', null)
    .where('l.currency', '=', currency)
    .where('l.bookedOn', '>=', from)
    .where('l.bookedOn', '<=', until)
    .orderBy('l.bookedOn')
    .execute();
