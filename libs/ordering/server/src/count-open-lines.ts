import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

/** How many lines of orders that stand are of these specifications and to be delivered on a day or later. */
export async function countOpenOrderLines(
  tx: Tx,
  specificationIds: readonly string[],
  from: PlantDate,
): Promise<number> {
  if (specificationIds.length === 0) return 0;
  const { count } = await tx
    .selectFrom('orderLines as l')
    .innerJoin('orders as o', 'o.id', 'l.orderId')
    .select(({ fn }) => fn.countAll<number>().as('count'))
    .where('l.specificationId', 'in', specificationIds)
    .where('o.deliveryDay', '>=', from)
    .where('o.cancelledAt', 'is', null)
    .executeTakeFirstOrThrow();
  return count;
}
