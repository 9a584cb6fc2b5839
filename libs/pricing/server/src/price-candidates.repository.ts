import { sql } from 'kysely';
import type { PriceBasis, PriceBreak, PriceCandidate, PriceLevel } from '@seamwright/pricing/domain';
import type { Tx } from '@seamwright/shared/server';
import { addDays, type PlantDate } from '@seamwright/shared/util';

/** A price that ended so long before the delivery day is no longer worth telling as "not in force". */
const TOLD_DAYS = 60;

export interface CandidatesWanted {
  readonly customerId: string;
  readonly specificationIds: readonly string[];
  /** The earliest delivery day asked about. */
  readonly firstDay: PlantDate;
}

/** Every price line that may speak for the customer, by specification, in one query. */
export async function candidatesFor(tx: Tx, wanted: CandidatesWanted): Promise<Map<string, PriceCandidate[]>> {
  const { customerId, specificationIds, firstDay } = wanted;
  const bySpecification = new Map<string, PriceCandidate[]>();
  if (specificationIds.length === 0) return bySpecification;
  const rows = await tx
    .selectFrom('priceLines as l')
    .innerJoin('priceLists as list', 'list.id', 'l.priceListId')
    .leftJoin('priceBreaks as b', 'b.priceLineId', 'l.id')
    .leftJoin('quoteLines as ql', 'ql.id', 'l.quoteLineId')
    .leftJoin('quotes as q', 'q.id', 'ql.quoteId')
    .select([
      'l.id',
      'l.specificationId',
      'l.choiceKey',
      'l.basis',
      'l.priceMinor',
      'list.level',
      'list.name as listName',
      'q.number as quoteNumber',
      'b.fromQuantity',
      'b.priceMinor as breakMinor',
      sql<string>`lower(l.valid)`.as('validFrom'),
      sql<string | null>`upper(l.valid)`.as('validUntil'),
    ])
    .where('l.specificationId', '=', sql<string>`any(${specificationIds}::uuid[])`)
    .where((where) =>
      where.or([
        where('list.level', '=', 'base'),
        where('list.customerId', '=', customerId),
        where(
          'list.groupId',
          '=',
          where.selectFrom('customers').select('groupId').where('customers.id', '=', customerId),
        ),
      ]),
    )
    .where(sql<boolean>`(upper_inf(l.valid) or upper(l.valid) > ${addDays(firstDay, -TOLD_DAYS)}::date)`)
    .orderBy('l.id')
    .orderBy('b.fromQuantity')
    .execute();

  // Breaks come as rows of their own line, one after the other.
  let breaks: PriceBreak[] = [];
  let lineId = '';
  for (const row of rows) {
    if (row.id !== lineId) {
      lineId = row.id;
      breaks = [];
      const { id, level, basis, specificationId, fromQuantity: _from, breakMinor: _minor, ...line } = row;
      const candidate: PriceCandidate = {
        ...line,
        lineId: id,
        level: level as PriceLevel,
        basis: basis as PriceBasis,
        breaks,
      };
      const known = bySpecification.get(specificationId);
      if (known) known.push(candidate);
      else bySpecification.set(specificationId, [candidate]);
    }
    if (row.fromQuantity !== null && row.breakMinor !== null)
      breaks.push({ fromQuantity: row.fromQuantity, priceMinor: row.breakMinor });
  }
  return bySpecification;
}
