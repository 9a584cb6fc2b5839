import { createHash } from 'node:crypto';
import { getOrder, listOrders, placeOrder, takeOrders, uploadOrders } from '@seamwright/ordering/contracts';
import { newId } from '@seamwright/shared/util';
import type { BenchCase } from '../bench';
import * as rows from './rows';
import { importRows, importWorkbook, THREE_LINES, type ThreadDays } from './scenario';
import { known, type Stage } from './stage';

const PAGE = 50;

/** Placing orders, one at a time and from a spreadsheet, and reading them. */
export async function orderCases(stage: Stage, days: ThreadDays, siteId: string): Promise<BenchCase[]> {
  const { api, plain, as, now } = stage;
  const buyer = () => as('lucian').token;
  const customerId = known(as('lucian').customerId, 'customer');
  const body = { siteId, deliveryDay: days.placing, settlement: 'account' as const, lines: [...THREE_LINES] };
  const place = () => api.call(buyer(), placeOrder, { body });
  const placed = await place();
  const template = await rows.orderRows(plain, [placed.id]);

  /** One order as its screen shows it. */
  const readOne = async (orderId: unknown): Promise<void> => {
    await rows.readOrders(plain, 'o.id = $1', [orderId]);
    await rows.readLines(plain, [orderId]);
    await rows.readPacks(plain, [orderId]);
    await rows.readPayments(plain, [orderId]);
    await rows.readSites(plain, [customerId]);
    await rows.readClosures(plain);
    await rows.readChanges(plain, orderId);
  };
  /** What has to be known before orders can be stored. */
  const readAhead = async (customerIds: readonly unknown[], codes: readonly string[], day: string): Promise<void> => {
    await plain.query('select * from cutting_days where delivery_day = $1 for share', [day]);
    await rows.readSites(plain, customerIds);
    await rows.readClosures(plain);
    const versions = await rows.readVersionsByCode(plain, codes);
    await rows.readPrices(plain, customerIds, rows.idsIn(versions, 'specification_id'));
  };

  return [
    {
      name: placeOrder.id,
      size: `${THREE_LINES.length} lines`,
      target: 3,
      ours: place,
      floor: () =>
        plain.inTransaction(() =>
          rows.keepKey(plain, now, async () => {
            await readAhead(
              [customerId],
              THREE_LINES.map(({ code }) => code),
              days.placing,
            );
            const copy = rows.copyOfOrders(template);
            await rows.insertOrders(plain, copy);
            const orderId = copy.orders[0]?.['id'];
            await readOne(orderId);
            return orderId;
          }),
        ),
    },
    {
      name: listOrders.id,
      size: `${PAGE} orders`,
      target: 3,
      ours: () => api.call(buyer(), listOrders, { query: { limit: PAGE } }),
      floor: () =>
        plain.inTransaction(async () => {
          const found = await rows.readOrders(
            plain,
            'o.customer_id = $1 order by o.placed_at desc, o.id desc limit $2',
            [customerId, PAGE + 1],
          );
          const ids = rows.idsIn(found);
          await rows.readLines(plain, ids);
          await rows.readPacks(plain, ids);
          await rows.readPayments(plain, ids);
        }),
    },
    {
      name: getOrder.id,
      size: `${THREE_LINES.length} lines`,
      target: 3,
      ours: () => api.call(buyer(), getOrder, { params: { orderId: placed.id } }),
      floor: () => plain.inTransaction(() => readOne(placed.id)),
    },
    ...(await importCases(stage, days, readAhead)),
  ];
}

type ReadAhead = (customerIds: readonly unknown[], codes: readonly string[], day: string) => Promise<void>;

async function importCases(stage: Stage, days: ThreadDays, readAhead: ReadAhead): Promise<BenchCase[]> {
  const { api, plain, as, now } = stage;
  const rep = () => as('ruben').token;
  const file = { name: 'orders.xlsx', bytes: await importWorkbook(days.importing) };
  const wanted = importRows(days.importing);
  const codes = [...new Set(wanted.map((row) => String(row[3])))];
  const names = [...new Set(wanted.map((row) => String(row[0])))];
  const upload = () => api.call(rep(), uploadOrders, { file });
  const take = (importId: string) =>
    api.call(rep(), takeOrders, { params: { importId }, body: { how: 'all-or-none' as const } });

  const previewed = await upload();
  const [fault] = previewed.faults;
  if (fault) throw new Error(`Row ${fault.row} of the bench's own workbook is refused: ${fault.message}`);
  const [kept] = await plain.rowsToCopy('order_imports', 'id', [previewed.id], []);
  const { placed } = await take(previewed.id);
  const template = await rows.orderRows(
    plain,
    placed.map(({ id }) => id),
  );
  /** Imports that were previewed, by turn; each is taken in the same turn of the case that follows. */
  const ours = new Map<number, string>();
  const floors = new Map<number, string>();

  const readAll = async (): Promise<void> => {
    const customers = await plain.query('select * from customers where name = any ($1)', [names]);
    await readAhead(rows.idsIn(customers), codes, days.importing);
  };
  const readBack = (importId: string) => plain.query('select * from order_imports where id = $1', [importId]);

  return [
    {
      name: uploadOrders.id,
      size: `${wanted.length} rows`,
      target: 5,
      ours: async (turn) => ours.set(turn, (await upload()).id),
      floor: (turn) =>
        plain.inTransaction(() =>
          rows.keepKey(plain, now, async () => {
            await readAll();
            const id = newId<'OrderImport'>();
            const hash = createHash('sha256').update(file.bytes).digest('hex');
            await plain.insert('order_imports', [{ ...kept, id, file_hash: hash }]);
            await readBack(id);
            floors.set(turn, id);
            return id;
          }),
        ),
    },
    {
      name: takeOrders.id,
      size: `${placed.length} orders, ${template.lines.length} lines`,
      target: 3,
      ours: (turn) => take(known(ours.get(turn), 'import to take')),
      floor: (turn) =>
        plain.inTransaction(() =>
          rows.keepKey(plain, now, async () => {
            const importId = known(floors.get(turn), 'import to take');
            await plain.query('select * from order_imports where id = $1 for update', [importId]);
            await readAll();
            const copy = rows.copyOfOrders(template);
            await rows.insertOrders(plain, copy);
            await plain.query(
              `update order_imports set taken = 'all-or-none', taken_at = $2, order_ids = $3, read_rows = $4,
                 row_version = row_version + 1 where id = $1`,
              [importId, now, rows.idsIn(copy.orders), JSON.stringify(kept?.['read_rows'])],
            );
            await readBack(importId);
            const orders = await rows.readOrders(plain, 'o.id = any ($1)', [rows.idsIn(copy.orders)]);
            await rows.readLines(plain, rows.idsIn(orders));
            return importId;
          }),
        ),
    },
  ];
}
