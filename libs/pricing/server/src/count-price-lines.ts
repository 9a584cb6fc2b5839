import { sql } from 'kysely';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

/** How many price lines of these specifications are in force on a day or later. */
export async function countPriceLines(tx: Tx, specificationIds: readonly string[], from: PlantDate): Promise<number> {
  if (specificationIds.length === 0) return 0;
  const { count } = await tx
    .selectFrom('priceLines')
    .select(({ fn }) => fn.countAll<number>().as('count'))
    .where('specificationId', 'in', specificationIds)
    .where(sql<boolean>`(upper_inf(valid) or upper(valid) > ${from}::date)`)
    .executeTakeFirstOrThrow();
  return count;
}
