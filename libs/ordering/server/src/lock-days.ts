import { sql } from 'kysely';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

const lockOf = sql`hashtextextended('delivery-day:' || asked.day, 0)`;

/**
 * Keeps the plant open on these days until the transaction ends: orders may be placed side by side, and who closes the
 * plant for one of the days waits for them. Days are given in the order of the calendar.
 */
export async function keepDaysOpen(tx: Tx, days: readonly PlantDate[]): Promise<void> {
  await sql`select pg_advisory_xact_lock_shared(${lockOf}) from unnest(${[...days]}::text[]) as asked (day)`.execute(
    tx,
  );
}

/** Waits for all orders that are being placed for the day; those that come later wait until the transaction ends. */
export async function lockDayToClose(tx: Tx, day: PlantDate): Promise<void> {
  await sql`select pg_advisory_xact_lock(${lockOf}) from (values (${day}::text)) as asked (day)`.execute(tx);
}
