import {
  getPriceList,
  listPriceLines,
  listPriceLists,
  setPriceLine,
  type PriceList,
  type PriceListLine,
} from '@seamwright/pricing/contracts';
import { implement, inTransaction, notFound, pageFrom, type Implementation } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { readLinePlace, readListPlace } from './cursor-values';
import {
  priceLinesOfList,
  priceListById,
  priceLists,
  type PriceLine,
  type PriceListHead,
} from './price-lists.repository';
import { setPrice } from './set-price-line';

const presentList = ({ id, level, name, owner, currency, lineCount }: PriceListHead): PriceList => ({
  id,
  level,
  name,
  owner,
  currency,
  lineCount,
});

function presentLine(line: PriceLine): PriceListLine {
  const { priceListId: _list, level: _level, customerId: _customer, breaks, ...shown } = line;
  return { ...shown, breaks: [...breaks] };
}

export const priceListImplementations = (parts: { readonly timeZone: string }): Implementation[] => [
  implement(listPriceLists, ({ database, caller }, { query: { cursor, limit, level, q } }) =>
    inTransaction(database, caller, async (tx) => {
      const lists = await priceLists(tx, { level, q, after: readListPlace(cursor), limit });
      return pageFrom(lists, limit, (list) => [list.rank, list.owner ?? '', list.id], presentList);
    }),
  ),
  implement(getPriceList, ({ database, caller }, { params }) =>
    inTransaction(database, caller, async (tx) => {
      const list = await priceListById(tx, params.priceListId);
      if (!list) throw notFound();
      return presentList(list);
    }),
  ),
  implement(listPriceLines, ({ database, caller, now }, { params: { priceListId }, query }) =>
    inTransaction(database, caller, async (tx) => {
      const { cursor, limit, q, from = plantToday(now, parts.timeZone) } = query;
      if (!(await priceListById(tx, priceListId))) throw notFound();
      const lines = await priceLinesOfList(tx, { priceListId, q, from, after: readLinePlace(cursor), limit });
      return pageFrom(lines, limit, (line) => [line.code, line.validFrom, line.id], presentLine);
    }),
  ),
  implement(setPriceLine, async (context, input) => presentLine(await setPrice(context, parts, input))),
];
