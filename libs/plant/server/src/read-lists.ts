import { ordersOfDay } from '@seamwright/ordering/server';
import type { CuttingListWire, PullListWire } from '@seamwright/plant/contracts';
import {
  byCustomer,
  byPrimal,
  cautionsOf,
  cuttingList,
  cuttingTotals,
  pullList,
  pullTotals,
  stationLoads,
  type CuttingLine,
  type CuttingListRow,
} from '@seamwright/plant/domain';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import { lotsOf } from '@seamwright/stock/server';
import { countedDay, type CountedDay } from './cutting-days.repository';
import { cutsOfLines } from './cuts';

/** The rows of a day's cutting list: its orders that wait for nothing, without what was marked short. */
async function rowsOfDay(tx: Tx, deliveryDay: PlantDate): Promise<CuttingListRow[]> {
  const orders = (await ordersOfDay(tx, deliveryDay)).filter(({ waitingFor }) => waitingFor.length === 0);
  const cuts = await cutsOfLines(
    tx,
    orders.flatMap(({ lines }) => lines),
  );
  return cuttingList(
    orders.flatMap(({ number, customerId, customerName, lines }) =>
      lines.flatMap(({ id, pieces, shortPieces, quantity }): CuttingLine[] => {
        const cut = cuts.get(id)?.cut;
        if (!cut) return [];
        return [
          {
            cut,
            customer: { id: customerId, name: customerName },
            orderNumber: number,
            inCases: quantity.unit === 'case',
            pieces: pieces - shortPieces,
          },
        ];
      }),
    ),
  );
}

const cutWire = ({ versionId, choiceKey, code, name, summary }: CuttingListRow['cut']) => ({
  versionId,
  choiceKey,
  code,
  name,
  summary,
});

function presentCuttingList(deliveryDay: PlantDate, rows: readonly CuttingListRow[]): CuttingListWire {
  const stations = stationLoads(rows);
  return {
    deliveryDay,
    primals: byPrimal(rows).map(({ primal, rows: ofPrimal, totals }) => ({
      primal,
      rows: ofPrimal.map(({ cut, customers, stations: [...work], ...numbers }) => ({
        cut: cutWire(cut),
        ...numbers,
        stations: [...work],
        customers: customers.map((share) => ({ ...share, orderNumbers: [...share.orderNumbers] })),
      })),
      totals,
    })),
    totals: cuttingTotals(rows),
    stations,
    cautions: cautionsOf(stations),
    customers: byCustomer(rows).map(({ customer, cuts, totals }) => ({
      customer,
      cuts: cuts.map(({ cut, orderNumbers, ...quantity }) => ({
        cut: cutWire(cut),
        ...quantity,
        orderNumbers: [...orderNumbers],
      })),
      totals,
    })),
  };
}

async function presentPullList(tx: Tx, day: CountedDay, rows: readonly CuttingListRow[]): Promise<PullListWire> {
  const primalIds = rows.map(({ cut }) => cut.primal.id);
  const list = pullList(rows, await lotsOf(tx, primalIds, day), day);
  return {
    deliveryDay: day.deliveryDay,
    rows: list.map((row) => ({ ...row, pulls: [...row.pulls] })),
    totals: pullTotals(list),
  };
}

/** Throws `not-found` for a day that nothing was ever ordered for, as do the two below. */
export async function readCuttingList(tx: Tx, deliveryDay: PlantDate): Promise<CuttingListWire> {
  await countedDay(tx, deliveryDay);
  return presentCuttingList(deliveryDay, await rowsOfDay(tx, deliveryDay));
}

export async function readPullList(tx: Tx, deliveryDay: PlantDate): Promise<PullListWire> {
  const day = await countedDay(tx, deliveryDay);
  return presentPullList(tx, day, await rowsOfDay(tx, deliveryDay));
}

export interface DayPapers {
  readonly day: CountedDay;
  readonly cutting: CuttingListWire;
  readonly pull: PullListWire;
}

/** Both lists from one reading, for the workbook. */
export async function readPapers(tx: Tx, deliveryDay: PlantDate): Promise<DayPapers> {
  const day = await countedDay(tx, deliveryDay);
  const rows = await rowsOfDay(tx, deliveryDay);
  return { day, cutting: presentCuttingList(deliveryDay, rows), pull: await presentPullList(tx, day, rows) };
}
