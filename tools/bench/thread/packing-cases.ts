import { placeOrder } from '@seamwright/ordering/contracts';
import {
  addPack,
  closeCuttingDay,
  finishOrder,
  getCuttingDay,
  listPackingOrders,
  releaseCuttingDay,
  type PackingOrderWire,
} from '@seamwright/plant/contracts';
import { newId, type PlantDate } from '@seamwright/shared/util';
import type { BenchCase } from '../bench';
import * as rows from './rows';
import { ONE_PIECE, THREE_LINES } from './scenario';
import { known, type Stage } from './stage';

const WHOLE_ORDERS = 8;

/** Fills a day with orders to be packed, two for each turn, and sends it to the floor. */
export async function fillFloor({ api, as }: Stage, deliveryDay: PlantDate, siteId: string, turns: number) {
  const place = (lines: typeof THREE_LINES | typeof ONE_PIECE) =>
    api.call(as('lucian').token, placeOrder, {
      body: { siteId, deliveryDay, settlement: 'account', lines: [...lines] },
    });
  for (let count = 0; count < WHOLE_ORDERS; count++) await place(THREE_LINES);
  const toPack: string[] = [];
  for (let count = 0; count < 2 * turns; count++) toPack.push((await place(ONE_PIECE)).id);
  for (const move of [closeCuttingDay, releaseCuttingDay]) {
    const { rowVersion } = await api.call(as('petra').token, getCuttingDay, { params: { deliveryDay } });
    await api.call(as('petra').token, move, { params: { deliveryDay }, ifMatch: rowVersion });
  }
  const { orders } = await api.call(as('femi').token, listPackingOrders, { query: { deliveryDay } });
  return toPack.map((id) =>
    known(
      orders.find((order) => order.id === id),
      'order on the floor',
    ),
  );
}

/** Weighing a pack, and finishing its order in the same turn of the case that follows. */
export function packingCases({ api, plain, as, now }: Stage, toPack: readonly PackingOrderWire[]): BenchCase[] {
  const packer = () => as('femi');
  const orderOf = (turn: number, side: 0 | 1): PackingOrderWire => known(toPack[2 * turn + side], 'order to pack');
  const weighing = ({ lines }: PackingOrderWire) => {
    const line = known(lines[0], 'line to pack');
    const lotId = known(line.lots[0], 'lot to cut').id;
    return { line, lotId, netGrams: line.piece.nominalGrams, tareGrams: line.tareGrams };
  };

  /** The order as it stands at the scale, and once more as the screen shows it. */
  const readAtScale = async (order: PackingOrderWire): Promise<rows.OrderRows['lines']> => {
    await plain.query('select * from cutting_days where delivery_day = $1 for share', [order.deliveryDay]);
    await plain.query('select id from orders where id = $1 for update', [order.id]);
    await rows.readOrders(plain, 'o.id = $1', [order.id]);
    const lines = await rows.readLines(plain, [order.id]);
    await rows.readPacks(plain, [order.id]);
    return lines;
  };
  const readBack = async (order: PackingOrderWire): Promise<void> => {
    await rows.readOrders(plain, 'o.id = $1', [order.id]);
    const lines = await rows.readLines(plain, [order.id]);
    await rows.readPacks(plain, [order.id]);
    const versions = await rows.readVersions(plain, rows.idsIn(lines, 'version_id'));
    await rows.readCutTree(plain);
    await plain.query(
      `select lots.*, lots.received_grams - coalesce((
         select sum(p.input_grams) from packs p where p.lot_id = lots.id and p.voided_at is null), 0) as remaining
       from lots where node_id = any ($1) and state = 'released'`,
      [rows.idsIn(versions, 'source_node_id')],
    );
  };
  const event = (type: string, order: PackingOrderWire) =>
    plain.insert('outbox_events', [
      { type, subject_id: order.id, customer_id: order.customer.id, payload: {}, at: now },
    ]);

  return [
    {
      name: addPack.id,
      size: '1 pack',
      target: 3,
      ours: (turn) => {
        const order = orderOf(turn, 0);
        const { line, lotId, netGrams, tareGrams } = weighing(order);
        const grossGrams = netGrams + tareGrams;
        return api.call(packer().token, addPack, {
          params: { orderId: order.id },
          body: { orderLineId: line.id, lotId, pieces: 1, grossGrams, tareGrams, reason: null },
        });
      },
      floor: (turn) =>
        plain.inTransaction(() =>
          rows.keepKey(plain, now, async () => {
            const order = orderOf(turn, 1);
            const { line, lotId, netGrams, tareGrams } = weighing(order);
            const [stored] = await readAtScale(order);
            await rows.readVersions(plain, [stored?.['version_id']]);
            await rows.readCutTree(plain);
            await plain.query('select * from lots where id = $1', [lotId]);
            await plain.insert('packs', [
              {
                id: newId(),
                customer_id: order.customer.id,
                order_id: order.id,
                order_line_id: line.id,
                version_id: stored?.['version_id'],
                lot_id: lotId,
                pieces: 1,
                net_grams: netGrams,
                tare_grams: tareGrams,
                input_grams: 2 * netGrams,
                out_of_limits: false,
                packed_at: now,
                packed_by: packer().personId,
              },
            ]);
            await event('pack-added', order);
            await readBack(order);
            return order.id;
          }),
        ),
    },
    {
      name: finishOrder.id,
      size: '1 order',
      target: 3,
      ours: (turn) => api.call(packer().token, finishOrder, { params: { orderId: orderOf(turn, 0).id } }),
      floor: (turn) =>
        plain.inTransaction(async () => {
          const order = orderOf(turn, 1);
          await readAtScale(order);
          await plain.query('update orders set packed_at = $2, row_version = row_version + 1 where id = $1', [
            order.id,
            now,
          ]);
          await plain.insert('order_changes', [
            {
              id: newId(),
              order_id: order.id,
              customer_id: order.customer.id,
              what: 'packed',
              at: now,
              person_id: packer().personId,
              detail: {},
            },
          ]);
          await event('order-packed', order);
          await readBack(order);
        }),
    },
  ];
}
