import type { ChosenValues } from '@seamwright/catalogue/domain';
import type { PriceBasis, QuoteDates, QuoteState } from '@seamwright/pricing/domain';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

export interface Quote extends QuoteDates {
  readonly id: string;
  readonly rowVersion: number;
  readonly number: number;
  readonly customerId: string;
  readonly customerName: string;
  readonly state: QuoteState;
  readonly currency: string;
  readonly notes: string;
  readonly writerName: string;
  readonly createdAt: Date;
  readonly sentAt: Date | null;
  readonly decidedAt: Date | null;
  readonly decidedByName: string | null;
}

export interface QuoteLine {
  readonly id: string;
  readonly specificationId: string;
  readonly versionId: string;
  readonly choices: ChosenValues;
  readonly choiceKey: string;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
}

export interface NewQuote extends QuoteDates {
  readonly id: string;
  readonly customerId: string;
  readonly notes: string;
  readonly writtenBy: string;
  readonly writerName: string;
  readonly createdAt: Date;
}

export interface QuotesWanted {
  readonly state?: QuoteState | undefined;
  readonly customerId?: string | undefined;
  /** Quotes with a lower number than this. */
  readonly before?: number | undefined;
  readonly limit: number;
}

function quoteRows(tx: Tx) {
  return tx
    .selectFrom('quotes as q')
    .innerJoin('customers as c', 'c.id', 'q.customerId')
    .leftJoin('people as d', 'd.id', 'q.decidedBy')
    .select([
      'q.id',
      'q.rowVersion',
      'q.number',
      'q.customerId',
      'c.name as customerName',
      'q.state',
      'q.currency',
      'q.pricesFrom',
      'q.pricesUntil',
      'q.answerBy',
      'q.notes',
      'q.writerName',
      'q.createdAt',
      'q.sentAt',
      'q.decidedAt',
      'd.name as decidedByName',
    ]);
}

type QuoteRow = Awaited<ReturnType<ReturnType<typeof quoteRows>['executeTakeFirstOrThrow']>>;

const quoteOf = (row: QuoteRow): Quote => ({
  ...row,
  state: row.state as QuoteState,
  pricesFrom: row.pricesFrom as PlantDate,
  pricesUntil: row.pricesUntil as PlantDate,
  answerBy: row.answerBy as PlantDate,
});

/** Newest first, one more than the limit to tell whether another page follows. */
export async function quotesNewestFirst(tx: Tx, wanted: QuotesWanted): Promise<(Quote & { lineCount: number })[]> {
  const { state, customerId, before, limit } = wanted;
  const rows = await quoteRows(tx)
    .select((select) =>
      select
        .selectFrom('quoteLines as l')
        .whereRef('l.quoteId', '=', 'q.id')
        .select(({ fn }) => fn.countAll<number>().as('count'))
        .as('lineCount'),
    )
    .$if(state !== undefined, (rows) => rows.where('q.state', '=', state ?? ''))
    .$if(customerId !== undefined, (rows) => rows.where('q.customerId', '=', customerId ?? ''))
    .$if(before !== undefined, (rows) => rows.where('q.number', '<', before ?? 0))
    .orderBy('q.number', 'desc')
    .limit(limit + 1)
    .execute();
  return rows.map(({ lineCount, ...row }) => ({ ...quoteOf(row), lineCount: lineCount ?? 0 }));
}

export async function quoteById(tx: Tx, id: string): Promise<Quote | null> {
  const row = await quoteRows(tx).where('q.id', '=', id).executeTakeFirst();
  return row ? quoteOf(row) : null;
}

/** As `quoteById`, and nobody else can change it until the transaction ends. */
export async function lockQuote(tx: Tx, id: string): Promise<Quote | null> {
  const row = await quoteRows(tx).where('q.id', '=', id).forUpdate('q').executeTakeFirst();
  return row ? quoteOf(row) : null;
}

export async function linesOfQuote(tx: Tx, quoteId: string): Promise<QuoteLine[]> {
  const rows = await tx
    .selectFrom('quoteLines')
    .select(['id', 'specificationId', 'versionId', 'choices', 'choiceKey', 'basis', 'priceMinor'])
    .where('quoteId', '=', quoteId)
    .orderBy('position')
    .execute();
  return rows.map((row) => ({ ...row, choices: row.choices as ChosenValues, basis: row.basis as PriceBasis }));
}

/** Writes a draft with its lines in the order given. */
export async function addQuote(tx: Tx, quote: NewQuote, lines: readonly QuoteLine[]): Promise<void> {
  await tx
    .insertInto('quotes')
    .values({ ...quote, state: 'draft' satisfies QuoteState })
    .execute();
  await tx
    .insertInto('quoteLines')
    .values(
      lines.map((line, position) => ({
        ...line,
        choices: JSON.stringify(line.choices),
        quoteId: quote.id,
        customerId: quote.customerId,
        position,
      })),
    )
    .execute();
}

export interface QuoteMoved {
  readonly state: QuoteState;
  readonly sentAt?: Date;
  readonly decidedAt?: Date;
  readonly decidedBy?: string;
}

/** Moves a quote that still has the row version that was read; false when somebody was quicker. */
export async function moveQuote(tx: Tx, id: string, rowVersion: number, moved: QuoteMoved): Promise<boolean> {
  const { numUpdatedRows } = await tx
    .updateTable('quotes')
    .set((set) => ({ ...moved, rowVersion: set('rowVersion', '+', 1) }))
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  return numUpdatedRows === 1n;
}

/** Ends the sent quotes whose last day for an answer is before today; gives what ended. */
export async function expireQuotes(
  tx: Tx,
  today: PlantDate,
  now: Date,
): Promise<{ readonly id: string; readonly customerId: string }[]> {
  return tx
    .updateTable('quotes')
    .set((set) => ({ state: 'expired' satisfies QuoteState, decidedAt: now, rowVersion: set('rowVersion', '+', 1) }))
    .where('state', '=', 'sent' satisfies QuoteState)
    .where('answerBy', '<', today)
    .returning(['id', 'customerId'])
    .execute();
}
