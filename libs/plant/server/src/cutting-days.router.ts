import * as z from 'zod';
import { plantDay } from '@seamwright/shared/contracts';
import * as days from '@seamwright/plant/contracts';
import {
  implement,
  inTransaction,
  pageFrom,
  readCursor,
  type Implementation,
  type RequestContext,
  type Tx,
} from '@seamwright/shared/server';
import { plantDate, unwrap, type PlantDate } from '@seamwright/shared/util';
import { countedDay, latestDays, type CountedDay } from './cutting-days.repository';
import { cuttingWorkbook } from './cutting-workbook';
import { closeDay, finishDay, releaseDay } from './move-cutting-day';
import { readCuttingList, readPapers, readPullList } from './read-lists';

const iso = (at: Date | null): string | null => at?.toISOString() ?? null;

/** What the plant storey is told by the composition root. */
export interface PlantParts {
  /** The plant's time zone, an IANA name. */
  readonly timeZone: string;
}

const present = (day: CountedDay, { timeZone }: PlantParts): days.CuttingDayWire => ({
  ...day,
  timeZone,
  closedAt: iso(day.closedAt),
  releasedAt: iso(day.releasedAt),
  finishedAt: iso(day.finishedAt),
});

interface OfDay {
  readonly params: { readonly deliveryDay: string };
}
const dayIn = ({ params }: OfDay): PlantDate => unwrap(plantDate(params.deliveryDay));

/** A guarded move of a day, answered by the day as it is afterwards. */
const moved =
  (move: typeof closeDay, parts: PlantParts) =>
  ({ database, caller, now, ifMatch }: RequestContext, input: OfDay) =>
    inTransaction(database, caller, async (tx) => {
      const deliveryDay = dayIn(input);
      await move(tx, { now, caller, deliveryDay, ifMatch });
      return present(await countedDay(tx, deliveryDay), parts);
    });

const reading =
  <T>(read: (tx: Tx, deliveryDay: PlantDate) => Promise<T>) =>
  ({ database, caller }: RequestContext, input: OfDay) =>
    inTransaction(database, caller, (tx) => read(tx, dayIn(input)));

export const cuttingDayImplementations = (parts: PlantParts): Implementation[] => [
  implement(days.listCuttingDays, ({ database, caller }, { query: { cursor, limit, state } }) =>
    inTransaction(database, caller, async (tx) => {
      const before = cursor ? readCursor(cursor, z.tuple([plantDay]))[0] : undefined;
      return pageFrom(
        await latestDays(tx, { limit, before, state }),
        limit,
        (day) => [day.deliveryDay],
        (day) => present(day, parts),
      );
    }),
  ),
  implement(
    days.getCuttingDay,
    reading(async (tx, day) => present(await countedDay(tx, day), parts)),
  ),
  implement(days.closeCuttingDay, moved(closeDay, parts)),
  implement(days.releaseCuttingDay, moved(releaseDay, parts)),
  implement(days.finishCuttingDay, moved(finishDay, parts)),
  implement(days.getCuttingList, reading(readCuttingList)),
  implement(days.getPullList, reading(readPullList)),
  implement(days.getWorkbook, async (context, input) => {
    const papers = await reading(readPapers)(context, input);
    return { fileName: `cutting-${papers.day.deliveryDay}.xlsx`, bytes: await cuttingWorkbook(papers) };
  }),
];
