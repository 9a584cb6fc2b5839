import { newId } from '@seamwright/shared/util';
import type { Plain, Row } from './plain';

// The rows that several floors read, each in one statement.

/** `where` speaks of the order as `o`. */
export const readOrders = (plain: Plain, where: string, values: readonly unknown[]) =>
  plain.query(
    `select o.*, c.name as customer_name, s.name as site_name, p.name as placed_by_name
     from orders o join customers c on c.id = o.customer_id join sites s on s.id = o.site_id
     left join people p on p.id = o.placed_by
     where ${where}`,
    values,
  );

export const readLines = (plain: Plain, orderIds: readonly unknown[]) =>
  plain.query(
    `select l.*, v.name, v.version, s.code
     from order_lines l join specification_versions v on v.id = l.version_id
     join specifications s on s.id = l.specification_id
     where l.order_id = any ($1) order by l.order_id, l.position`,
    [orderIds],
  );

export const readPacks = (plain: Plain, orderIds: readonly unknown[]) =>
  plain.query(
    `select p.*, lots.code as lot_code from packs p left join lots on lots.id = p.lot_id
     where p.order_id = any ($1) and p.voided_at is null order by p.serial`,
    [orderIds],
  );

export const readPayments = (plain: Plain, orderIds: readonly unknown[]) =>
  plain.query('select * from payments where order_id = any ($1)', [orderIds]);

const VERSIONS = `select v.*, s.code, s.species, s.cut_node_id, st.standing
  from specification_versions v join specifications s on s.id = v.specification_id
  left join specification_standings st on st.version_id = v.id`;

export const readVersionsByCode = (plain: Plain, codes: readonly string[]) =>
  plain.query(`${VERSIONS} where s.code = any ($1) and st.standing = 'current'`, [codes]);

export const readVersions = (plain: Plain, versionIds: readonly unknown[]) =>
  plain.query(`${VERSIONS} where v.id = any ($1)`, [versionIds]);

export const readCutTree = (plain: Plain) => plain.query('select * from cut_nodes order by sort, name');

/** Every price that may speak for the customers. */
export const readPrices = (plain: Plain, customerIds: readonly unknown[], specificationIds: readonly unknown[]) =>
  plain.query(
    `select l.*, list.level, list.name as list_name, b.from_quantity, b.price_minor as break_minor, q.number
     from price_lines l join price_lists list on list.id = l.price_list_id
     left join price_breaks b on b.price_line_id = l.id
     left join quote_lines ql on ql.id = l.quote_line_id left join quotes q on q.id = ql.quote_id
     where l.specification_id = any ($2) and (list.level = 'base' or list.customer_id = any ($1)
       or list.group_id in (select group_id from customers where id = any ($1)))`,
    [customerIds, specificationIds],
  );

/** The sites of customers with the zones that they are delivered in. */
export const readSites = (plain: Plain, customerIds: readonly unknown[]) =>
  plain.query(
    `select s.*, c.name as customer_name, z.* from sites s join customers c on c.id = s.customer_id
     left join site_zones sz on sz.site_id = s.id left join delivery_zones z on z.id = sz.zone_id
     where s.customer_id = any ($1) order by s.name`,
    [customerIds],
  );

export const readClosures = (plain: Plain) =>
  plain.query(`select * from plant_closures where day >= '2026-10-01' order by day`);

export const readChanges = (plain: Plain, orderId: unknown) =>
  plain.query(
    `select c.*, p.name from order_changes c left join people p on p.id = c.person_id
     where c.order_id = $1 order by c.at, c.id`,
    [orderId],
  );

export const idsIn = (rows: readonly Row[], column = 'id'): unknown[] => [...new Set(rows.map((row) => row[column]))];

/** All that placing orders wrote. */
export interface OrderRows {
  readonly orders: readonly Row[];
  readonly lines: readonly Row[];
  readonly changes: readonly Row[];
  readonly events: readonly Row[];
}

export async function orderRows(plain: Plain, orderIds: readonly string[]): Promise<OrderRows> {
  return {
    orders: await plain.rowsToCopy('orders', 'id', orderIds, ['number']),
    lines: await plain.rowsToCopy('order_lines', 'order_id', orderIds, []),
    changes: await plain.rowsToCopy('order_changes', 'order_id', orderIds, []),
    events: await plain.rowsToCopy('outbox_events', 'subject_id', orderIds, ['id']),
  };
}

/** The same rows under new ids. */
export function copyOfOrders({ orders, lines, changes, events }: OrderRows): OrderRows {
  const ids = new Map(orders.map(({ id }) => [id, newId<'Order'>()]));
  return {
    orders: orders.map((order) => ({ ...order, id: ids.get(order['id']) })),
    lines: lines.map((line) => ({ ...line, id: newId(), order_id: ids.get(line['order_id']) })),
    changes: changes.map((change) => ({ ...change, id: newId(), order_id: ids.get(change['order_id']) })),
    events: events.map((event) => ({ ...event, subject_id: ids.get(event['subject_id']) })),
  };
}

export async function insertOrders(plain: Plain, rows: OrderRows): Promise<void> {
  await plain.insert('orders', rows.orders);
  await plain.insert('order_lines', rows.lines);
  await plain.insert('order_changes', rows.changes);
  await plain.insert('outbox_events', rows.events);
}

/** What keeps a deed from being done twice: one row that is written, and told afterwards what was made. */
export async function keepKey(plain: Plain, now: Date, make: () => Promise<unknown>): Promise<void> {
  const key = newId();
  await plain.query(`insert into idempotency_keys values ('bench', 'bench', $1, 'hash', null, $2)`, [key, now]);
  const id = await make();
  await plain.query(`update idempotency_keys set resource_id = $2 where endpoint = 'bench' and key = $1`, [key, id]);
}
