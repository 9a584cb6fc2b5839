import { Workbook, type CellValue, type Worksheet } from 'exceljs';
import { primalName } from '@seamwright/catalogue/domain';
import { getCuttingList, getPullList, getWorkbook } from '@seamwright/plant/contracts';
import { DELIVERY_DAY, openTestPlant, type TestPlant } from '../testing/src/index';
import { inTransaction, system } from '@seamwright/shared/server';
import { addSheet, safeText } from './sheet';

let plant: TestPlant;
let workbook: Workbook;
const params = { deliveryDay: DELIVERY_DAY };

beforeAll(async () => {
  plant = await openTestPlant();
  await inTransaction(plant.house.database, system('seed'), (tx) =>
    tx.updateTable('customers').set({ name: '=HYPERLINK("x")' }).where('id', '=', plant.market.hotelId).execute(),
  );
  await plant.place([
    { code: 'BF-901', count: 2, unit: 'case' },
    { code: 'LM-901', count: 3, chosen: { trim: '3' } },
  ]);
  await plant.place([{ code: 'BF-901', count: 155 }], { by: 'hotel' });
  const answer = await plant.house.call(plant.planner, getWorkbook, { params });
  expect(answer.headers['content-disposition']).toContain('cutting-2026-12-03.xlsx');
  workbook = new Workbook();
  await workbook.xlsx.load(answer.bytes as never);
});
afterAll(() => plant.house.close());

const sheet = (name: string): Worksheet => {
  const found = workbook.getWorksheet(name);
  if (!found) throw new Error(`There is no sheet ${name}`);
  return found;
};
/** Rows of a sheet under its head, as values. */
const rowsOf = (name: string): CellValue[][] => {
  const rows: CellValue[][] = [];
  sheet(name).eachRow((row, number) => {
    if (number > 2) rows.push((row.values as CellValue[]).slice(1));
  });
  return rows;
};
const totalOf = (name: string): CellValue[] => rowsOf(name).find(([first]) => first === 'Total') ?? [];

it('holds the three lists', () => {
  expect(workbook.worksheets.map(({ name }) => name)).toEqual(['Cutting list', 'By customer', 'Pull list']);
});

it('has totals that are numbers and equal the screen', async () => {
  const { body: cutting } = await plant.house.call(plant.planner, getCuttingList, { params });
  const { body: pull } = await plant.house.call(plant.planner, getPullList, { params });
  const { pieces, cases, loosePieces, outGrams, inGrams, seconds } = cutting.totals;
  const [minutes, kgOut] = [Math.ceil(seconds / 60), outGrams / 1000];
  expect(totalOf('Cutting list').slice(4)).toEqual([pieces, cases, loosePieces, kgOut, inGrams / 1000, minutes]);
  expect(totalOf('By customer').slice(5)).toEqual([pieces, cases, loosePieces, kgOut]);
  const t = pull.totals;
  expect(totalOf('Pull list').slice(3)).toEqual([
    t.pieces,
    t.pulledGrams / 1000,
    t.neededGrams / 1000,
    t.outGrams / 1000,
    t.leftOverGrams / 1000,
    t.shortGrams / 1000,
  ]);
  expect(pieces).toBe(182);
});

it('has a row for each row of the screen, with its numbers', async () => {
  const { body: cutting } = await plant.house.call(plant.planner, getCuttingList, { params });
  const rows = rowsOf('Cutting list');
  for (const { primal, rows: cuts, totals } of cutting.primals) {
    for (const { cut, pieces, outGrams } of cuts)
      expect(rows).toContainEqual(
        expect.arrayContaining([primalName(primal.species, primal.name), cut.code, cut.name, pieces, outGrams / 1000]),
      );
    expect(rows.find(([first]) => first === `${primalName(primal.species, primal.name)} in all`)?.[7]).toBe(
      totals.outGrams / 1000,
    );
  }
  expect(rows.flat().some((cell) => typeof cell === 'object' && cell !== null && 'formula' in cell)).toBe(false);
});

it('names lots with their use-by as dates, and what is short', () => {
  const rows = rowsOf('Pull list');
  const first = rows.find(([, lot]) => lot === 'B-1');
  expect(first?.[2]).toEqual(new Date('2026-12-05T00:00:00Z'));
  // 179 × 280 g over 0.784 is 63,929 g; the two lots hold 72,000 g, of which eleven pieces are enough.
  expect(rows.find(([name]) => name === 'Beef striploin in all')?.slice(3)).toEqual([11, 66, 63.929, 50.12, 2.071, 0]);
});

it('has real number formats', () => {
  const total = sheet('Cutting list').getColumn(8);
  expect(total.numFmt).toBe('#,##0.000 "kg"');
  sheet('Cutting list').eachRow((row, number) => {
    if (number > 2 && typeof row.getCell(8).value === 'number') expect(row.getCell(8).numFmt).toBe('#,##0.000 "kg"');
  });
  expect(sheet('Pull list').getColumn(3).numFmt).toBe('ddd d mmm yyyy');
});

it('keeps its heads in sight and prints on the width of a page with the heads repeated', () => {
  for (const { views, pageSetup } of workbook.worksheets) {
    expect(views[0]).toMatchObject({ state: 'frozen', ySplit: 2 });
    expect(pageSetup).toMatchObject({ orientation: 'landscape', fitToPage: true, fitToWidth: 1, fitToHeight: 0 });
    expect(pageSetup.printTitlesRow).toBe('1:2');
  }
});

it('carries the cautions of the work', () => {
  const texts = rowsOf('Cutting list').map(([first]) => String(first));
  expect(texts.some((text) => text.startsWith('Knives:'))).toBe(true);
  expect(texts.some((text) => text.startsWith('General guidance'))).toBe(true);
});

it('never lets text become a formula', () => {
  expect(rowsOf('By customer').map(([first]) => first)).toContain(`'=HYPERLINK("x")`);
  expect(['=1', '+1', '-1', '@x', '\tx', 'plain', ''].map(safeText)).toEqual([
    "'=1",
    "'+1",
    "'-1",
    "'@x",
    "'\tx",
    'plain',
    '',
  ]);
  const own = addSheet(new Workbook(), {
    name: 'x',
    title: '=1+1',
    columns: [{ head: 'a', kind: 'text', width: 5 }],
    rows: [{ cells: ['=2'] }],
    notes: ['@note'],
  });
  expect([1, 3, 5].map((row) => own.getRow(row).getCell(1).value)).toEqual(["'=1+1", "'=2", "'@note"]);
});

it('is refused to buyers and for a day without orders', async () => {
  expect((await plant.house.call(plant.market.pubBuyer, getWorkbook, { params })).status).toBe(403);
  const empty = await plant.house.call(plant.planner, getWorkbook, { params: { deliveryDay: '2027-02-01' } });
  expect(empty.problem).toMatchObject({ status: 404 });
});
