import { sql } from 'kysely';
import { notFound, type Tx } from '@seamwright/shared/server';
import { addDays, newId, type PlantDate } from '@seamwright/shared/util';
import { closuresFor } from '@seamwright/ordering/server';
import { cuttingDayOf, isClosedToOrders, type CuttingDay, type CuttingDayState } from '@seamwright/plant/domain';

/** A day with what is ordered for it. */
export interface CountedDay extends CuttingDay {
  readonly orders: number;
  readonly waitingOrders: number;
  readonly packedOrders: number;
  readonly lines: number;
}

type DayRow = Omit<CuttingDay, 'deliveryDay' | 'cuttingDay' | 'state'> & {
  readonly deliveryDay: string;
  readonly cuttingDay: string;
  readonly state: string;
};

const dayOf = <Row extends DayRow>(row: Row) => ({
  ...row,
  deliveryDay: row.deliveryDay as PlantDate,
  cuttingDay: row.cuttingDay as PlantDate,
  state: row.state as CuttingDayState,
});

const COLUMNS = [
  'd.id',
  'd.rowVersion',
  'd.deliveryDay',
  'd.cuttingDay',
  'd.state',
  'd.closedAt',
  'd.releasedAt',
  'd.finishedAt',
] as const;

/**
 * Makes the delivery day's row when it is not there yet, and holds a share lock on it until the transaction ends: who
 * closes the day waits for those who place orders, and they see it closed afterwards.
 */
export async function dayForOrders(tx: Tx, deliveryDay: PlantDate): Promise<CuttingDay> {
  const found = await sharedDay(tx, deliveryDay);
  if (found) return found;
  await tx
    .insertInto('cuttingDays')
    .values({
      id: newId<'CuttingDay'>(),
      deliveryDay,
      cuttingDay: cuttingDayOf(deliveryDay, await closuresFor(tx, deliveryDay)),
      state: 'open',
    })
    .onConflict((conflict) => conflict.column('deliveryDay').doNothing())
    .execute();
  const made = await sharedDay(tx, deliveryDay);
  if (!made) throw notFound();
  return made;
}

/** The day as it is, which nobody can move until the transaction ends; null when nothing was ordered for it. */
export async function sharedDay(tx: Tx, deliveryDay: PlantDate): Promise<CuttingDay | null> {
  const row = await tx
    .selectFrom('cuttingDays as d')
    .select(COLUMNS)
    .where('d.deliveryDay', '=', deliveryDay)
    .forShare()
    .executeTakeFirst();
  return row ? dayOf(row) : null;
}

/** Which of these days are closed to orders; a day that nothing was ordered for is open. Locks nothing. */
export async function daysClosedToOrders(tx: Tx, days: readonly PlantDate[]): Promise<Set<PlantDate>> {
  if (days.length === 0) return new Set();
  const rows = await tx
    .selectFrom('cuttingDays')
    .select(['deliveryDay', 'state'])
    .where('deliveryDay', '=', sql<string>`any(${[...days]}::date[])`)
    .execute();
  const closed = rows.filter(({ state }) => isClosedToOrders(state as CuttingDayState));
  return new Set(closed.map(({ deliveryDay }) => deliveryDay as PlantDate));
}

/** The day, locked for moving it: waits for all who hold its share. Throws `not-found`. */
export async function lockDay(tx: Tx, deliveryDay: PlantDate): Promise<CuttingDay> {
  const row = await tx
    .selectFrom('cuttingDays as d')
    .select(COLUMNS)
    .where('d.deliveryDay', '=', deliveryDay)
    .forUpdate()
    .executeTakeFirst();
  if (!row) throw notFound();
  return dayOf(row);
}

/** Writes a locked day's new state. */
export async function saveDay(
  tx: Tx,
  { id, rowVersion }: CuttingDay,
  moved: {
    readonly state: CuttingDayState;
    readonly closedAt?: Date;
    readonly closedBy?: string | null;
    readonly releasedAt?: Date;
    readonly finishedAt?: Date;
  },
): Promise<void> {
  await tx
    .updateTable('cuttingDays')
    .set({ ...moved, rowVersion: rowVersion + 1 })
    .where('id', '=', id)
    .execute();
}

/** How far after its cutting a delivery can lie. */
const FARTHEST_AHEAD = 60;

/** The days that may be cut on `day`, locked, with how many orders stand for each. */
export async function daysAround(tx: Tx, day: PlantDate): Promise<(CuttingDay & { readonly orders: number })[]> {
  const rows = await tx
    .selectFrom('cuttingDays as d')
    .select(COLUMNS)
    .select(({ selectFrom }) =>
      selectFrom('orders as o')
        .whereRef('o.deliveryDay', '=', 'd.deliveryDay')
        .where('o.cancelledAt', 'is', null)
        .select(sql<number>`count(*)`.as('orders'))
        .as('orders'),
    )
    .where('d.deliveryDay', '>', day)
    .where('d.deliveryDay', '<=', addDays(day, FARTHEST_AHEAD))
    .orderBy('d.deliveryDay')
    .forUpdate()
    .execute();
  return rows.map((row) => dayOf({ ...row, orders: row.orders ?? 0 }));
}

/** Writes a locked day's new day of cutting. */
export async function moveCuttingDay(tx: Tx, { id, rowVersion }: CuttingDay, cuttingDay: PlantDate): Promise<void> {
  await tx
    .updateTable('cuttingDays')
    .set({ cuttingDay, rowVersion: rowVersion + 1 })
    .where('id', '=', id)
    .execute();
}

const countedDays = (tx: Tx) =>
  tx
    .selectFrom('cuttingDays as d')
    .leftJoinLateral(
      (e) =>
        e
          .selectFrom('orders as o')
          .whereRef('o.deliveryDay', '=', 'd.deliveryDay')
          .where('o.cancelledAt', 'is', null)
          .select([
            sql<number>`count(*)`.as('orders'),
            sql<number>`count(*) filter (where cardinality(o.waiting_for) > 0)`.as('waitingOrders'),
            sql<number>`count(*) filter (where o.packed_at is not null)`.as('packedOrders'),
            sql<number>`coalesce(sum((select count(*) from order_lines l where l.order_id = o.id)), 0)::bigint`.as(
              'lines',
            ),
          ])
          .as('c'),
      (join) => join.onTrue(),
    )
    .select(COLUMNS)
    .select(['c.orders', 'c.waitingOrders', 'c.packedOrders', 'c.lines']);

type CountedRow = Awaited<ReturnType<ReturnType<typeof countedDays>['executeTakeFirstOrThrow']>>;

const countedOf = (row: CountedRow): CountedDay =>
  dayOf({
    ...row,
    orders: row.orders ?? 0,
    waitingOrders: row.waitingOrders ?? 0,
    packedOrders: row.packedOrders ?? 0,
    lines: row.lines ?? 0,
  });

/** Throws `not-found` for a day that nothing was ever ordered for. */
export async function countedDay(tx: Tx, deliveryDay: PlantDate): Promise<CountedDay> {
  const row = await countedDays(tx).where('d.deliveryDay', '=', deliveryDay).executeTakeFirst();
  if (!row) throw notFound();
  return countedOf(row);
}

export interface DaysWanted {
  readonly limit: number;
  /** Only days before this one. */
  readonly before?: string;
  readonly state?: CuttingDayState;
}

/** The latest delivery day first, one more than `limit` when there are more. An open day without orders is nobody's work. */
export async function latestDays(tx: Tx, { limit, before, state }: DaysWanted): Promise<CountedDay[]> {
  let query = countedDays(tx)
    .where((e) => e.or([e('d.state', '<>', 'open'), e('c.orders', '>', 0)]))
    .orderBy('d.deliveryDay', 'desc')
    .limit(limit + 1);
  if (before !== undefined) query = query.where('d.deliveryDay', '<', before);
  if (state !== undefined) query = query.where('d.state', '=', state);
  return (await query.execute()).map(countedOf);
}
