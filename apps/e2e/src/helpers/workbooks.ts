import { Workbook, type CellValue } from 'exceljs';
import { tidy } from './reading';

/** A file as the browser uploads it. */
export interface Upload {
  readonly name: string;
  readonly mimeType: string;
  readonly buffer: Buffer;
}

const WORKBOOK = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** The head of a workbook of orders, as the desk's template has it. */
const ORDER_HEADS = [
  'Customer',
  'Site',
  'Delivery day',
  'Code',
  'Choices',
  'Quantity',
  'Unit',
  'When short',
  'Note',
] as const;

export interface OrderRow {
  readonly customer: string;
  readonly site?: string;
  readonly day: string;
  readonly code: string;
  readonly choices?: string;
  readonly quantity: number;
  readonly unit: 'piece' | 'case' | 'kg';
}

/** A workbook of orders: the first row of orders is row 2. */
export async function ordersWorkbook(name: string, rows: readonly OrderRow[]): Promise<Upload> {
  const workbook = new Workbook();
  const sheet = workbook.addWorksheet('Orders');
  sheet.addRow([...ORDER_HEADS]);
  for (const { customer, site = '', day, code, choices = '', quantity, unit } of rows)
    sheet.addRow([customer, site, day, code, choices, quantity, unit, '', '']);
  return { name, mimeType: WORKBOOK, buffer: Buffer.from(await workbook.xlsx.writeBuffer()) };
}

/** The rows of a sheet as plain values; the row number is the place in the list plus 1. */
export async function sheetRows(path: string, sheetName: string): Promise<CellValue[][]> {
  const workbook = new Workbook();
  await workbook.xlsx.readFile(path);
  const sheet = workbook.getWorksheet(sheetName);
  if (!sheet) throw new Error(`The workbook has no sheet "${sheetName}"`);
  const rows: CellValue[][] = [];
  sheet.eachRow({ includeEmpty: true }, (row) => {
    rows.push(Array.from({ length: sheet.columnCount }, (_each, at) => row.getCell(at + 1).value));
  });
  return rows;
}

/** The one row of a sheet whose texts start as given. */
export function rowStarting(rows: readonly CellValue[][], ...texts: readonly string[]): CellValue[] {
  const found = rows.filter((row) => texts.every((text, at) => tidy(String(row[at] ?? '')) === text));
  if (found.length !== 1 || !found[0]) throw new Error(`${found.length} rows start with ${texts.join(' · ')}`);
  return found[0];
}
