import { deflateRawSync } from 'node:zlib';
import { Workbook, type CellValue } from 'exceljs';
import {
  getImportTemplate,
  getOrderImport,
  listOrders,
  takeOrders,
  uploadOrders,
} from '@seamwright/ordering/contracts';
import { openOrderingHouse, type OrderingHouse } from '@seamwright/ordering/server/testing';
import { MOST_IMPORT_BYTES } from '@seamwright/shared/contracts';
import type { Caller } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
afterAll(() => house.close());
beforeEach(() => house.closedDays.clear());

const HEADS = ['Customer', 'Site', 'Delivery day', 'Code', 'Choices', 'Quantity', 'Unit', 'When short', 'Note'];
const GOOD: readonly CellValue[][] = [
  ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 'BF-901', 'trim=3', 10, 'pieces', 'ask me', 'for the wedding'],
  ['Quayside Canteen', '', new Date('2026-12-02'), 'LM-204', '', '12.5', 'kg', '', ''],
  ['the heron  rooms', 'Heron kitchen', '2/12/2026', 'LM-204', '', 2, 'case', '', ''],
  ['The Heron Rooms', 'Heron kitchen', '2026-12-03', 'BF-901', '', 1, 'case', '', ''],
];

async function workbook(rows: readonly (readonly CellValue[])[], heads: readonly string[] = HEADS): Promise<Buffer> {
  const book = new Workbook();
  const sheet = book.addWorksheet('Orders');
  sheet.addRow([...heads]);
  rows.forEach((row) => sheet.addRow([...row]));
  return Buffer.from(await book.xlsx.writeBuffer());
}

/** A ZIP file whose parts are given already packed. */
function zip(parts: readonly { name: string; packed: Buffer; declaredBytes: number }[]): Buffer {
  const locals: Buffer[] = [];
  const heads: Buffer[] = [];
  let offset = 0;
  for (const { name, packed, declaredBytes } of parts) {
    const local = Buffer.alloc(30);
    local.writeUInt32LE(0x04034b50, 0);
    local.writeUInt16LE(8, 8);
    local.writeUInt32LE(packed.length, 18);
    local.writeUInt32LE(declaredBytes, 22);
    local.writeUInt16LE(name.length, 26);
    const head = Buffer.alloc(46);
    head.writeUInt32LE(0x02014b50, 0);
    head.writeUInt16LE(8, 10);
    head.writeUInt32LE(packed.length, 20);
    head.writeUInt32LE(declaredBytes, 24);
    head.writeUInt16LE(name.length, 28);
    head.writeUInt32LE(offset, 42);
    locals.push(local, Buffer.from(name), packed);
    heads.push(head, Buffer.from(name));
    offset += 30 + name.length + packed.length;
  }
  const directory = Buffer.concat(heads);
  const end = Buffer.alloc(22);
  end.writeUInt32LE(0x06054b50, 0);
  end.writeUInt16LE(parts.length, 8);
  end.writeUInt16LE(parts.length, 10);
  end.writeUInt32LE(directory.length, 12);
  end.writeUInt32LE(offset, 16);
  return Buffer.concat([...locals, directory, end]);
}

const upload = (bytes: Buffer, caller: Caller = house.rep, idempotencyKey: string = newId()) =>
  house.call(caller, uploadOrders, { file: { bytes, name: 'orders.xlsx' }, idempotencyKey });
const take = (importId: string, how: 'good-rows' | 'all-or-none', idempotencyKey: string = newId()) =>
  house.call(house.rep, takeOrders, { params: { importId }, body: { how }, idempotencyKey });
const countOrders = async () => (await house.call(house.rep, listOrders, { query: { limit: 200 } })).body.items.length;

describe('a workbook of orders', () => {
  it('is shown first, one order for each customer and day, and places nothing', async () => {
    const before = await countOrders();
    const { status, body } = await upload(await workbook(GOOD));
    expect(status).toBe(201);
    expect(body.faults).toEqual([]);
    expect(
      body.orders.map(({ customer, site, deliveryDay, lines }) => [customer, site, deliveryDay, lines.length]),
    ).toEqual([
      ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 2],
      ['Quayside Canteen', 'Canteen', '2026-12-02', 1],
      ['The Heron Rooms', 'Heron kitchen', '2026-12-03', 1],
    ]);
    // 12.5 kg of 1.8 kg shoulders is 7 pieces (12.6 kg).
    expect(body.orders[1]?.lines[0]).toMatchObject({ row: 3, code: 'LM-204', pieces: 7, estimateGrams: 12_600 });
    expect(await countOrders()).toBe(before);
  });

  it('is taken once, through the same use case as a buyer’s order', async () => {
    const { body } = await upload(await workbook(GOOD));
    const before = await countOrders();
    const key = newId();
    const [one, other] = await Promise.all([take(body.id, 'all-or-none', key), take(body.id, 'all-or-none', key)]);
    expect([one.status, other.status]).toEqual([200, 200]);
    expect(one.body.placed).toHaveLength(3);
    expect(other.body.placed).toEqual(one.body.placed);
    expect(await countOrders()).toBe(before + 3);
    const again = await take(body.id, 'good-rows');
    expect([again.status, again.problem.code]).toEqual([409, 'import-taken-already']);
    const list = await house.call(house.heron.buyer, listOrders, { query: { deliveryDay: '2026-12-03' } });
    expect(list.body.items[0]).toMatchObject({ source: 'import', settlement: 'account', stage: 'confirmed' });
  });

  it('is taken once by two people who press at the same time', async () => {
    const { body } = await upload(await workbook(GOOD));
    const before = await countOrders();
    const answers = await Promise.all([take(body.id, 'good-rows'), take(body.id, 'good-rows')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await countOrders()).toBe(before + 3);
  });

  it('says when the very same file was taken before', async () => {
    const bytes = await workbook([GOOD[0] ?? []]);
    const first = await upload(bytes);
    expect(first.body.sameFileTakenAt).toBeNull();
    await take(first.body.id, 'good-rows');
    expect((await upload(bytes)).body.sameFileTakenAt).toBe('2026-12-01T12:00:00.000Z');
  });

  it('reports bad cells by row and column, and takes the good rows or nothing', async () => {
    const { body } = await upload(
      await workbook([
        GOOD[0] ?? [],
        ['Nobody & Sons', '', '2026-12-02', 'BF-901', '', 1, 'piece', '', ''],
        ['The Heron Rooms', 'Boathouse', '2026-12-04', 'BF-901', '', 1, 'piece', '', ''],
        ['The Heron Rooms', '', '2026-12-03', 'BF-901', '', 1, 'piece', '', ''],
        ['Quayside Canteen', '', '2026-11-30', 'BF-901', '', 1, 'piece', '', ''],
        ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 'XX-1', '', 1, 'piece', '', ''],
        ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 'BF-999', '', 1, 'piece', '', ''],
        ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 'BF-901', 'trim=99', 1, 'piece', '', ''],
        ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 'BF-901', 'trim', -2, 'dozen', 'whatever', ''],
        [
          'The Heron Rooms',
          'Heron kitchen',
          '2026-12-02',
          'BF-901',
          '',
          { formula: '1+1', result: 2 },
          'piece',
          '',
          '',
        ],
        ['', '', 'soon', '', '', 1.5, 'case', '', ''],
        ['The Heron Rooms', 'Annexe', '2026-12-02', 'BF-901', '', 1, 'piece', '', ''],
        ['The Heron Rooms', 'Heron kitchen', '2026-12-02', 'BF-901', '', 99999, 'case', '', ''],
      ]),
    );
    expect(body.faults.map(({ row, column, code }) => `${column}${row} ${code}`)).toEqual([
      'A3 customer-unknown',
      'B4 site-unknown',
      'B5 site-needed',
      'C6 day-past',
      'D7 specification-not-offered',
      'D8 price-on-request',
      'E9 choice-value-unknown',
      'E10 choices-unreadable',
      'G10 unit-unknown',
      'H10 when-short-unknown',
      'F11 cell-formula',
      'A12 cell-empty',
      'C12 date-unreadable',
      'D12 cell-empty',
      'F12 quantity-not-whole',
      'B13 another-site-that-day',
      'F14 line-too-heavy',
    ]);
    expect(body.faults.every(({ message }) => !message.startsWith('Something went wrong'))).toBe(true);
    const before = await countOrders();
    const none = await take(body.id, 'all-or-none');
    expect([none.status, none.problem.code]).toEqual([409, 'import-has-faults']);
    expect(await countOrders()).toBe(before);
    const good = await take(body.id, 'good-rows');
    expect(good.body.placed.map(({ customer }) => customer)).toEqual(['The Heron Rooms']);
    expect(good.body.faults).toHaveLength(17);
    expect(await countOrders()).toBe(before + 1);
  });

  it('is looked at again when it is taken: a day closed meanwhile takes nothing', async () => {
    const { body } = await upload(await workbook(GOOD.slice(1, 2)));
    house.closedDays.add('2026-12-02');
    const taken = await take(body.id, 'good-rows');
    expect([taken.status, taken.problem.code]).toEqual([409, 'import-nothing-good']);
  });

  it('is read once for the same key', async () => {
    const bytes = await workbook(GOOD);
    const key = newId();
    const [first, second] = [await upload(bytes, house.rep, key), await upload(bytes, house.rep, key)];
    expect(second.body.id).toBe(first.body.id);
  });
});

describe('a file that is refused', () => {
  const refused = async (bytes: Buffer) => {
    const { status, problem } = await upload(bytes);
    return [status, problem.code];
  };

  it('is no workbook', async () => {
    expect(await refused(Buffer.from('customer;site\nThe Heron Rooms;'))).toEqual([422, 'workbook-unreadable']);
    expect(await refused(Buffer.alloc(0))).toEqual([422, 'workbook-unreadable']);
    const whole = await workbook(GOOD);
    expect(await refused(whole.subarray(0, whole.length - 200))).toEqual([422, 'workbook-unreadable']);
    expect(await refused(zip([{ name: 'readme.txt', packed: deflateRawSync('hello'), declaredBytes: 5 }]))).toEqual([
      422,
      'workbook-unreadable',
    ]);
    const hollow = zip([{ name: 'xl/workbook.xml', packed: deflateRawSync('<not-a-workbook'), declaredBytes: 15 }]);
    expect(await refused(hollow)).toEqual([422, 'workbook-unreadable']);
  });

  it('unpacks to far more than it says', async () => {
    const packed = deflateRawSync(Buffer.alloc(40 * 1_048_576));
    const bomb = zip([
      { name: 'xl/workbook.xml', packed: deflateRawSync('<workbook/>'), declaredBytes: 11 },
      { name: 'xl/worksheets/sheet1.xml', packed, declaredBytes: 100 },
    ]);
    expect(bomb.length).toBeLessThan(100_000);
    expect(await refused(bomb)).toEqual([422, 'workbook-swollen']);
  });

  it('is too large, has too many rows, other columns, or no row', async () => {
    expect(await refused(Buffer.alloc(MOST_IMPORT_BYTES + 1))).toEqual([413, 'too-large']);
    const row = GOOD[3] ?? [];
    expect(await refused(await workbook(Array.from({ length: 5001 }, () => row)))).toEqual([
      422,
      'workbook-too-many-rows',
    ]);
    expect(await refused(await workbook(GOOD, ['Buyer', ...HEADS.slice(1)]))).toEqual([422, 'workbook-columns']);
    expect(await refused(await workbook([]))).toEqual([422, 'workbook-empty']);
  });

  it('comes from a buyer', async () => {
    expect((await upload(await workbook(GOOD), house.heron.buyer)).status).toBe(403);
  });
});

describe('who sees a workbook', () => {
  it('is whoever sent it, for staff who are kept to some customers', async () => {
    const { body } = await upload(await workbook(GOOD));
    const kept: Caller = { kind: 'staff', personId: newId(), roles: ['rep'], customers: [house.heron.id] };
    expect((await house.call(kept, getOrderImport, { params: { importId: body.id } })).status).toBe(404);
    expect((await house.call(house.admin, getOrderImport, { params: { importId: body.id } })).status).toBe(200);
  });
});

describe('the template', () => {
  it('can be read back as it is, without a row', async () => {
    const { bytes, headers } = await house.call(house.rep, getImportTemplate, {});
    expect(headers['content-disposition']).toContain('orders-template.xlsx');
    const back = await upload(bytes);
    expect(back.problem.code).toBe('workbook-empty');
  });
});
