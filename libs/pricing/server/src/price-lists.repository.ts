import { sql } from 'kysely';
import type { PriceBasis, PriceBreak, PriceLevel, Validity } from '@seamwright/pricing/domain';
import type { Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { daysOf } from './day-range';

export interface PriceListHead {
  readonly id: string;
  readonly level: PriceLevel;
  readonly name: string;
  /** The customer or group that it is for. */
  readonly owner: string | null;
  readonly currency: string;
  readonly lineCount: number;
}

export interface PriceLine extends Validity {
  readonly id: string;
  readonly rowVersion: number;
  readonly priceListId: string;
  readonly level: PriceLevel;
  readonly customerId: string | null;
  readonly specificationId: string;
  readonly code: string;
  readonly name: string;
  readonly choiceKey: string | null;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
  readonly quoteNumber: number | null;
  readonly breaks: readonly PriceBreak[];
}

export interface NewPriceLine extends Validity {
  readonly specificationId: string;
  readonly choiceKey: string | null;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
  readonly breaks: readonly PriceBreak[];
}

export interface NewPriceList {
  readonly level: PriceLevel;
  readonly groupId: string | null;
  readonly customerId: string | null;
  readonly name: string;
  readonly lines: readonly NewPriceLine[];
}

/** Words that stand anywhere in a text, as a LIKE pattern; what is special in patterns is taken as it is typed. */
const anywhere = (words: string): string => `%${words.replace(/[\\%_]/g, '\\$&')}%`;

/** Base first, then groups, customers and agreements, each by owner. */
const rankOf = sql<number>`case list.level when 'base' then 0 when 'group' then 1 when 'customer' then 2 else 3 end`;
const ownerOf = sql<string | null>`coalesce(c.name, g.name)`;

function listRows(tx: Tx) {
  return tx
    .selectFrom('priceLists as list')
    .leftJoin('customers as c', 'c.id', 'list.customerId')
    .leftJoin('customerGroups as g', 'g.id', 'list.groupId')
    .select(['list.id', 'list.level', 'list.name', 'list.currency', ownerOf.as('owner'), rankOf.as('rank')])
    .select((select) =>
      select
        .selectFrom('priceLines as l')
        .whereRef('l.priceListId', '=', 'list.id')
        .select(({ fn }) => fn.countAll<number>().as('count'))
        .as('lineCount'),
    );
}

type ListRow = Awaited<ReturnType<ReturnType<typeof listRows>['executeTakeFirstOrThrow']>>;

const headOf = ({ id, level, name, currency, owner, lineCount }: ListRow): PriceListHead => ({
  id,
  level: level as PriceLevel,
  name,
  currency,
  owner,
  lineCount: lineCount ?? 0,
});

export interface ListsWanted {
  readonly level?: PriceLevel | undefined;
  readonly q?: string | undefined;
  /** Rank, owner and id of the last list that was seen. */
  readonly after: readonly [number, string, string] | null;
  readonly limit: number;
}

/** One more than the limit, each with its place in the order. */
export async function priceLists(
  tx: Tx,
  { level, q, after, limit }: ListsWanted,
): Promise<(PriceListHead & { readonly rank: number })[]> {
  const rows = await listRows(tx)
    .$if(level !== undefined, (rows) => rows.where('list.level', '=', level ?? ''))
    .$if(Boolean(q), (rows) =>
      rows.where(sql<boolean>`(list.name ilike ${anywhere(q ?? '')} or ${ownerOf} ilike ${anywhere(q ?? '')})`),
    )
    .$if(after !== null, (rows) => {
      const [rank, owner, id] = after ?? [0, '', ''];
      return rows.where(
        sql<boolean>`(${rankOf}, coalesce(${ownerOf}, ''), list.id) > (${rank}, ${owner}, ${id}::uuid)`,
      );
    })
    .orderBy('rank')
    .orderBy(sql`coalesce(${ownerOf}, '')`)
    .orderBy('list.id')
    .limit(limit + 1)
    .execute();
  return rows.map((row) => ({ ...headOf(row), rank: row.rank }));
}

export async function priceListById(tx: Tx, id: string): Promise<PriceListHead | null> {
  const row = await listRows(tx).where('list.id', '=', id).executeTakeFirst();
  return row ? headOf(row) : null;
}

function lineRows(tx: Tx) {
  return (
    tx
      .selectFrom('priceLines as l')
      .innerJoin('priceLists as list', 'list.id', 'l.priceListId')
      .innerJoin('specifications as s', 's.id', 'l.specificationId')
      .leftJoin('quoteLines as ql', 'ql.id', 'l.quoteLineId')
      .leftJoin('quotes as q', 'q.id', 'ql.quoteId')
      // The newest approved version names the specification, withdrawn or not.
      .leftJoinLateral(
        (from) =>
          from
            .selectFrom('specificationVersions as v')
            .whereRef('v.specificationId', '=', 's.id')
            .where('v.state', '=', 'approved')
            .select('v.name')
            .orderBy('v.version', 'desc')
            .limit(1)
            .as('newest'),
        (join) => join.onTrue(),
      )
      .select([
        'l.id',
        'l.rowVersion',
        'l.priceListId',
        'list.level',
        'l.customerId',
        'l.specificationId',
        's.code',
        'newest.name',
        'l.choiceKey',
        'l.basis',
        'l.priceMinor',
        'q.number as quoteNumber',
        sql<string>`lower(l.valid)`.as('validFrom'),
        sql<string | null>`upper(l.valid)`.as('validUntil'),
      ])
  );
}

type LineRow = Awaited<ReturnType<ReturnType<typeof lineRows>['executeTakeFirstOrThrow']>>;

async function withBreaks(tx: Tx, rows: readonly LineRow[]): Promise<PriceLine[]> {
  if (rows.length === 0) return [];
  const breaks = await tx
    .selectFrom('priceBreaks')
    .select(['priceLineId', 'fromQuantity', 'priceMinor'])
    .where(
      'priceLineId',
      'in',
      rows.map(({ id }) => id),
    )
    .orderBy('fromQuantity')
    .execute();
  return rows.map((row) => ({
    ...row,
    name: row.name ?? row.code,
    level: row.level as PriceLevel,
    basis: row.basis as PriceBasis,
    breaks: breaks
      .filter(({ priceLineId }) => priceLineId === row.id)
      .map(({ fromQuantity, priceMinor }) => ({ fromQuantity, priceMinor })),
  }));
}

export interface LinesWanted {
  readonly priceListId: string;
  readonly q?: string | undefined;
  /** Lines that ended before this day are left out. */
  readonly from: string;
  /** Code, first day and id of the last line that was seen. */
  readonly after: readonly [string, string, string] | null;
  readonly limit: number;
}

/** By code, then by day; one more than the limit. */
export async function priceLinesOfList(
  tx: Tx,
  { priceListId, q, from, after, limit }: LinesWanted,
): Promise<PriceLine[]> {
  const rows = await lineRows(tx)
    .where('l.priceListId', '=', priceListId)
    .where(sql<boolean>`(upper_inf(l.valid) or upper(l.valid) > ${from}::date)`)
    .$if(Boolean(q), (rows) =>
      rows.where(sql<boolean>`(s.code ilike ${anywhere(q ?? '')} or newest.name ilike ${anywhere(q ?? '')})`),
    )
    .$if(after !== null, (rows) => {
      const [code, day, id] = after ?? ['', '', ''];
      return rows.where(sql<boolean>`(s.code, lower(l.valid), l.id) > (${code}, ${day}::date, ${id}::uuid)`);
    })
    .orderBy('s.code')
    .orderBy('validFrom')
    .orderBy('l.id')
    .limit(limit + 1)
    .execute();
  return withBreaks(tx, rows);
}

export async function priceLineById(tx: Tx, id: string): Promise<PriceLine | null> {
  const rows = await lineRows(tx).where('l.id', '=', id).execute();
  const [line] = await withBreaks(tx, rows);
  return line ?? null;
}

/** Changes a line that still has the row version that was read; false when somebody was quicker. */
export async function changePriceLine(
  tx: Tx,
  { id, rowVersion }: Pick<PriceLine, 'id' | 'rowVersion'>,
  change: { readonly priceMinor: number } | { readonly valid: Validity },
): Promise<boolean> {
  const { numUpdatedRows } = await tx
    .updateTable('priceLines')
    .set((set) => ({
      ...('valid' in change ? { valid: daysOf(change.valid) } : change),
      rowVersion: set('rowVersion', '+', 1),
    }))
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  return numUpdatedRows === 1n;
}

export async function replaceBreaks(tx: Tx, priceLineId: string, breaks: readonly PriceBreak[]): Promise<void> {
  await tx.deleteFrom('priceBreaks').where('priceLineId', '=', priceLineId).execute();
  if (breaks.length > 0)
    await tx
      .insertInto('priceBreaks')
      .values(breaks.map((each) => ({ ...each, priceLineId })))
      .execute();
}

/** Adds lines to a list, with their breaks; gives their ids in the order given. */
export async function addPriceLines(
  tx: Tx,
  list: { readonly id: string; readonly customerId: string | null },
  lines: readonly NewPriceLine[],
): Promise<string[]> {
  if (lines.length === 0) return [];
  const rows = lines.map((line) => ({ ...line, id: newId() }));
  await tx
    .insertInto('priceLines')
    .values(
      rows.map(({ id, specificationId, choiceKey, basis, priceMinor, validFrom, validUntil }) => ({
        id,
        priceListId: list.id,
        customerId: list.customerId,
        specificationId,
        choiceKey,
        basis,
        priceMinor,
        valid: daysOf({ validFrom, validUntil }),
      })),
    )
    .execute();
  const breaks = rows.flatMap(({ id, breaks }) => breaks.map((each) => ({ ...each, priceLineId: id })));
  if (breaks.length > 0) await tx.insertInto('priceBreaks').values(breaks).execute();
  return rows.map(({ id }) => id);
}

/** Adds a list with its lines; gives its id. */
export async function addPriceList(tx: Tx, { lines, ...list }: NewPriceList): Promise<string> {
  const id = newId();
  await tx
    .insertInto('priceLists')
    .values({ id, ...list })
    .execute();
  await addPriceLines(tx, { id, customerId: list.customerId }, lines);
  return id;
}
