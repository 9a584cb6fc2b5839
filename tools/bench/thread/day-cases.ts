import { placeOrder } from '@seamwright/ordering/contracts';
import { closeCuttingDay, getCuttingDay, getCuttingList, getPullList, getWorkbook } from '@seamwright/plant/contracts';
import { newId, type PlantDate } from '@seamwright/shared/util';
import type { BenchCase } from '../bench';
import type { Row } from './plain';
import * as rows from './rows';
import { THREE_LINES, type ThreadDays } from './scenario';
import { known, type Stage } from './stage';

const ORDERS_A_DAY = 6;

/** Closing days, and the papers of a day that is on the floor. */
export async function dayCases(stage: Stage, days: ThreadDays, siteId: string): Promise<BenchCase[]> {
  return [await closingCase(stage, days, siteId), ...(await paperCases(stage, days.floor))];
}

/** Every second day is closed by us, the others by the floor. */
async function closingCase(stage: Stage, { closing }: ThreadDays, siteId: string): Promise<BenchCase> {
  const { api, plain, as, now } = stage;
  for (const deliveryDay of closing)
    for (let count = 0; count < ORDERS_A_DAY; count++)
      await api.call(as('lucian').token, placeOrder, {
        body: { siteId, deliveryDay, settlement: 'account', lines: [...THREE_LINES] },
      });
  const dayOf = (turn: number, side: 0 | 1): PlantDate => known(closing[2 * turn + side], 'day to close');
  const versions = new Map<PlantDate, number>();
  for (const deliveryDay of closing) {
    const { rowVersion } = await api.call(as('petra').token, getCuttingDay, { params: { deliveryDay } });
    versions.set(deliveryDay, rowVersion);
  }
  const planner = () => as('petra');

  return {
    name: closeCuttingDay.id,
    size: `${ORDERS_A_DAY} orders`,
    target: 3,
    ours: (turn) => {
      const deliveryDay = dayOf(turn, 0);
      const ifMatch = known(versions.get(deliveryDay), 'version of the day');
      return api.call(planner().token, closeCuttingDay, { params: { deliveryDay }, ifMatch });
    },
    floor: (turn) =>
      plain.inTransaction(async () => {
        const deliveryDay = dayOf(turn, 1);
        const { personId } = planner();
        const [day] = await plain.query('select * from cutting_days where delivery_day = $1 for update', [deliveryDay]);
        await plain.query(
          `update cutting_days set state = 'closed', closed_at = $2, closed_by = $3, row_version = row_version + 1
           where id = $1`,
          [day?.['id'], now, personId],
        );
        const released = await plain.query(
          `update orders set released_at = $2, row_version = row_version + 1
           where delivery_day = $1 and cancelled_at is null and released_at is null and cardinality(waiting_for) = 0
           returning id, customer_id`,
          [deliveryDay, now],
        );
        await plain.insert(
          'order_changes',
          released.map(({ id, customer_id }) => ({
            id: newId(),
            order_id: id,
            customer_id,
            what: 'released',
            at: now,
            person_id: personId,
            detail: {},
          })),
        );
        const event = (type: string, { id, customer_id }: Row) => ({
          type,
          subject_id: id,
          customer_id,
          payload: {},
          at: now,
        });
        await plain.insert('outbox_events', [
          ...released.map((order) => event('order-changed', order)),
          event('cutting-day-changed', { id: day?.['id'], customer_id: null }),
        ]);
        await readCountedDay(stage, deliveryDay);
      }),
  };
}

const readCountedDay = ({ plain }: Stage, deliveryDay: PlantDate) =>
  plain.query(
    `select d.*, count(o.id), count(o.packed_at),
       (select count(*) from order_lines l join orders x on x.id = l.order_id where x.delivery_day = d.delivery_day)
     from cutting_days d left join orders o on o.delivery_day = d.delivery_day and o.cancelled_at is null
     where d.delivery_day = $1 group by d.id`,
    [deliveryDay],
  );

async function paperCases(stage: Stage, deliveryDay: PlantDate): Promise<BenchCase[]> {
  const { api, plain, as } = stage;
  const token = () => as('petra').token;
  const params = { deliveryDay };
  const { totals } = await api.call(token(), getCuttingList, { params });
  const { orders, lines } = await api.call(token(), getCuttingDay, { params });
  const size = `${orders} orders, ${lines} lines`;
  if (totals.pieces === 0) throw new Error('Nothing is cut on the bench’s day');

  const readDay = async (): Promise<Row[]> => {
    await readCountedDay(stage, deliveryDay);
    const ofDay = await rows.readOrders(plain, 'o.delivery_day = $1 and o.cancelled_at is null order by o.number', [
      deliveryDay,
    ]);
    const linesOfDay = await rows.readLines(plain, rows.idsIn(ofDay));
    await rows.readCutTree(plain);
    return rows.readVersions(plain, rows.idsIn(linesOfDay, 'version_id'));
  };
  const readLots = (versions: readonly Row[]) =>
    plain.query(
      `select lots.*, n.name, lots.received_grams - coalesce((
         select sum(p.input_grams) from packs p where p.lot_id = lots.id and p.voided_at is null), 0) as remaining
       from lots join cut_nodes n on n.id = lots.node_id
       where lots.node_id = any ($1) and lots.state = 'released'`,
      [rows.idsIn(versions, 'source_node_id')],
    );
  const readBoth = async (): Promise<void> => {
    await readLots(await readDay());
  };

  return [
    {
      name: getCuttingList.id,
      size,
      target: 3,
      ours: () => api.call(token(), getCuttingList, { params }),
      floor: () => plain.inTransaction(readDay),
    },
    {
      name: getPullList.id,
      size,
      target: 3,
      ours: () => api.call(token(), getPullList, { params }),
      floor: () => plain.inTransaction(readBoth),
    },
    {
      name: getWorkbook.id,
      size,
      target: 5,
      ours: () => api.download(token(), getWorkbook, { params }),
      floor: () => plain.inTransaction(readBoth),
    },
  ];
}
