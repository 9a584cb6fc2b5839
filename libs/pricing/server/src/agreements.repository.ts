import { sql } from 'kysely';
import { withoutDays, type PriceBasis, type Validity } from '@seamwright/pricing/domain';
import type { Tx } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { daysOf } from './day-range';

export interface AgreedPrice {
  readonly specificationId: string;
  readonly choiceKey: string;
  readonly basis: PriceBasis;
  readonly priceMinor: number;
  readonly quoteLineId: string;
}

/** The customer's list of agreed prices, made with the first; nobody else agrees prices with them until the transaction ends. */
export async function lockAgreementList(tx: Tx, customerId: string): Promise<string> {
  await tx
    .insertInto('priceLists')
    .values({ id: newId(), level: 'agreement', customerId, name: $localize`Agreed prices` })
    .onConflict((conflict) => conflict.constraint('price_lists_once').doNothing())
    .execute();
  const { id } = await tx
    .selectFrom('priceLists')
    .select('id')
    .where('level', '=', 'agreement')
    .where('customerId', '=', customerId)
    .forUpdate()
    .executeTakeFirstOrThrow();
  return id;
}

/** Puts prices in force on those days. An older agreement for the same choices keeps its days before and after. */
export async function agreePrices(
  tx: Tx,
  { listId, customerId }: { readonly listId: string; readonly customerId: string },
  validity: Validity,
  prices: readonly AgreedPrice[],
): Promise<void> {
  const agreed = new Set(prices.map(keyOf));
  const older = await tx
    .selectFrom('priceLines')
    .select([
      'id',
      'specificationId',
      'choiceKey',
      'basis',
      'priceMinor',
      'quoteLineId',
      sql<string>`lower(valid)`.as('validFrom'),
      sql<string | null>`upper(valid)`.as('validUntil'),
    ])
    .where('priceListId', '=', listId)
    .where(sql<boolean>`valid && ${daysOf(validity)}`)
    .execute();
  const replaced = older.filter((line) => agreed.has(keyOf(line)));
  if (replaced.length > 0)
    await tx
      .deleteFrom('priceLines')
      .where(
        'id',
        'in',
        replaced.map(({ id }) => id),
      )
      .execute();
  const kept = replaced.flatMap(({ id: _id, validFrom, validUntil, ...line }) =>
    withoutDays({ validFrom, validUntil }, validity).map((part) => ({ ...line, valid: daysOf(part) })),
  );
  const added = prices.map((price) => ({ ...price, valid: daysOf(validity) }));
  await tx
    .insertInto('priceLines')
    .values([...kept, ...added].map((line) => ({ ...line, id: newId(), priceListId: listId, customerId })))
    .execute();
}

const keyOf = (line: { readonly specificationId: string; readonly choiceKey: string | null }): string =>
  `${line.specificationId} ${line.choiceKey ?? ''}`;
