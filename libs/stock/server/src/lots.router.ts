import * as z from 'zod';
import { plantDay } from '@seamwright/shared/contracts';
import {
  implement,
  implementOnce,
  inTransaction,
  pageFrom,
  readCursor,
  type Implementation,
} from '@seamwright/shared/server';
import { grams, type PlantDate } from '@seamwright/shared/util';
import * as lots from '@seamwright/stock/contracts';
import type { Lot } from '@seamwright/stock/domain';
import { listLots, lotById, lotCursor, lotPrimals } from './lots.repository';
import { moveLotOnce } from './move-lot';
import { receiveLot } from './receive-lot';

const present = (lot: Lot): lots.LotWire => ({ ...lot, origin: { ...lot.origin } });

/** What the stock storey is told by the composition root. */
export interface StockParts {
  /** The plant's time zone, an IANA name. */
  readonly timeZone: string;
}

/** Where a page of lots ends: the use-by day, `infinity` without one, and the code. */
const lotPlace = z.tuple([z.union([plantDay, z.literal('infinity')]), z.string()]);

export const stockImplementations = ({ timeZone }: StockParts): Implementation[] => [
  implement(lots.listLots, ({ database, caller }, { query: { cursor, limit, state, nodeId } }) =>
    inTransaction(database, caller, async (tx) => {
      const [useBy, code] = cursor ? readCursor(cursor, lotPlace) : [];
      const after = useBy !== undefined && code !== undefined ? { useBy, code } : undefined;
      return pageFrom(await listLots(tx, { state, nodeId, after, limit }), limit, lotCursor, present);
    }),
  ),
  implement(lots.getLot, ({ database, caller }, { params }) =>
    inTransaction(database, caller, async (tx) => present(await lotById(tx, params.id))),
  ),
  implementOnce(lots.receiveLot, {
    make: (tx, { now }, { body }) =>
      receiveLot(tx, {
        now,
        timeZone,
        lot: {
          ...body,
          killDate: body.killDate as PlantDate,
          receivedOn: body.receivedOn as PlantDate,
          useBy: body.useBy as PlantDate | null,
          receivedGrams: grams(body.receivedGrams),
        },
      }),
    present: async (tx, _, id) => present(await lotById(tx, id)),
  }),
  implement(lots.holdLot, ({ database, caller, now, ifMatch }, { params, body }) =>
    inTransaction(database, caller, async (tx) =>
      present(await moveLotOnce(tx, { now, id: params.id, ifMatch, move: 'hold', reason: body.reason })),
    ),
  ),
  implement(lots.releaseLot, ({ database, caller, now, ifMatch }, { params }) =>
    inTransaction(database, caller, async (tx) =>
      present(await moveLotOnce(tx, { now, id: params.id, ifMatch, move: 'release', reason: null })),
    ),
  ),
  implement(lots.listLotNodes, ({ database, caller }) =>
    inTransaction(database, caller, async (tx) => ({
      items: (await lotPrimals(tx)).map(({ id, name, species }) => ({ id, name, species })),
    })),
  ),
];
