import { Workbook } from 'exceljs';
import { IMPORT_COLUMNS, WHEN_SHORT, type ImportColumn } from '@seamwright/ordering/domain';
import { MOST_ROWS, type FileAnswer } from '@seamwright/shared/server';
import { IMPORT_HEADS } from './read-order-workbook';

const WIDTHS: Readonly<Record<ImportColumn, number>> = {
  customer: 28,
  site: 22,
  day: 14,
  code: 12,
  choices: 28,
  quantity: 10,
  unit: 8,
  whenShort: 20,
  note: 36,
};

const explained = (): Readonly<Record<ImportColumn, string>> => ({
  customer: $localize`The customer's name, as the desk writes it.`,
  site: $localize`The name of the site. May be left empty when the customer has one site only.`,
  day: $localize`The delivery day, as a date or as 2026-12-03.`,
  code: $localize`The code of the specification.`,
  choices: $localize`What is chosen, as trim=6; portion=280. What is left out stays as usual.`,
  quantity: $localize`Whole pieces or cases, or kilograms.`,
  unit: $localize`piece, case or kg. With kg, the whole number of pieces nearest to it is sent.`,
  whenShort: $localize`What to do when it falls short. Left empty: send-what-there-is.`,
  note: $localize`A note for the cutting room.`,
});

/** An empty workbook of orders: the head that can be read, lists to pick from, and a sheet that explains the columns. */
export async function importTemplate(): Promise<FileAnswer> {
  const workbook = new Workbook();
  const sheet = workbook.addWorksheet($localize`Orders`, { views: [{ state: 'frozen', ySplit: 1 }] });
  sheet.columns = IMPORT_COLUMNS.map((column) => ({
    header: IMPORT_HEADS[column],
    key: column,
    width: WIDTHS[column],
    ...(column === 'day' ? { style: { numFmt: 'yyyy-mm-dd' } } : {}),
  }));
  sheet.getRow(1).font = { bold: true };
  for (let row = 2; row <= 200; row++) {
    sheet.getCell(row, IMPORT_COLUMNS.indexOf('unit') + 1).dataValidation = listOf(['piece', 'case', 'kg']);
    sheet.getCell(row, IMPORT_COLUMNS.indexOf('whenShort') + 1).dataValidation = listOf(WHEN_SHORT);
  }
  const notes = workbook.addWorksheet($localize`Columns`);
  notes.columns = [{ width: 16 }, { width: 80 }];
  const words = explained();
  for (const column of IMPORT_COLUMNS) notes.addRow([IMPORT_HEADS[column], words[column]]);
  notes.addRow(['', $localize`At most ${MOST_ROWS}:rows: rows. One order is made for each customer and delivery day.`]);
  return { fileName: $localize`orders-template.xlsx`, bytes: Buffer.from(await workbook.xlsx.writeBuffer()) };
}

const listOf = (values: readonly string[]) => ({
  type: 'list' as const,
  allowBlank: true,
  formulae: [`"${values.join(',')}"`],
});
