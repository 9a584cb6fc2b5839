import type { setPriceLine } from '@seamwright/pricing/contracts';
import { checkBreaks } from '@seamwright/pricing/domain';
import type { CheckedInput } from '@seamwright/shared/contracts';
import { inTransaction, notFound, stale, type Caller, type RequestContext } from '@seamwright/shared/server';
import { plantToday, refuse, RefusalError, unwrap } from '@seamwright/shared/util';
import { addPriceLines, changePriceLine, priceLineById, replaceBreaks, type PriceLine } from './price-lists.repository';

type Asked = CheckedInput<typeof setPriceLine>;

/**
 * Sets a line's price and breaks from a day on. A line that is in force before that day keeps its price until then; a
 * new line follows it. Agreed prices are changed by a new quote only.
 */
export async function setPrice(
  { caller, now, database, ifMatch }: RequestContext,
  { timeZone }: { readonly timeZone: string },
  { params, body }: Asked,
): Promise<PriceLine> {
  unwrap(checkBreaks(body.breaks));
  if (body.from < plantToday(now, timeZone)) unwrap(refuse('price-from-past', {}, '/from'));
  return inTransaction(database, caller, async (tx) => {
    const line = await priceLineById(tx, params.priceLineId);
    if (!line) throw notFound();
    mayWriteIn(line, caller);
    if (line.validUntil !== null && line.validUntil <= body.from)
      unwrap(refuse('price-line-ended', { day: line.validUntil }, '/from'));
    const read = { id: line.id, rowVersion: ifMatch };
    let id = line.id;
    if (body.from <= line.validFrom) {
      if (!(await changePriceLine(tx, read, { priceMinor: body.priceMinor }))) throw stale();
      await replaceBreaks(tx, id, body.breaks);
    } else {
      const until = { validFrom: line.validFrom, validUntil: body.from };
      if (!(await changePriceLine(tx, read, { valid: until }))) throw stale();
      const following = {
        ...line,
        priceMinor: body.priceMinor,
        breaks: body.breaks,
        validFrom: body.from,
      };
      [id = line.id] = await addPriceLines(tx, { id: line.priceListId, customerId: line.customerId }, [following]);
    }
    const set = await priceLineById(tx, id);
    if (!set) throw notFound();
    return set;
  });
}

/** Lists of everybody or of a group are for those who serve all customers. */
function mayWriteIn({ level, customerId }: PriceLine, caller: Caller): void {
  if (level === 'agreement') throw new RefusalError({ code: 'price-line-agreed', params: {} });
  if (customerId === null && caller.kind === 'staff' && caller.customers !== '*')
    throw new RefusalError({ code: 'not-allowed', params: {} });
}
