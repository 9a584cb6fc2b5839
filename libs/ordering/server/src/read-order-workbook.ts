import type { Worksheet } from 'exceljs';
import {
  columnLetter,
  faultAt,
  IMPORT_COLUMNS,
  nameKey,
  type ImportColumn,
  type ImportFault,
  type ImportRow,
} from '@seamwright/ordering/domain';
import { cellText, firstSheet, MOST_ROWS } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';

export const IMPORT_HEADS: Readonly<Record<ImportColumn, string>> = {
  customer: 'Customer',
  site: 'Site',
  day: 'Delivery day',
  code: 'Code',
  choices: 'Choices',
  quantity: 'Quantity',
  unit: 'Unit',
  whenShort: 'When short',
  note: 'Note',
};

export interface ReadWorkbook {
  /** The rows that could be read, in the order of the sheet. */
  readonly rows: readonly ImportRow[];
  /** Cells that could not; their rows are left out. */
  readonly faults: readonly ImportFault[];
}

/**
 * Reads the first sheet of a workbook of orders. Refuses `workbook-unreadable`, `workbook-swollen`, `workbook-columns`
 * (column, head), `workbook-empty` or `workbook-too-many-rows` (most).
 */
export async function readOrderWorkbook(bytes: Buffer): Promise<ReadWorkbook> {
  const sheet = await firstSheet(bytes);
  checkHeads(sheet);
  const rows: ImportRow[] = [];
  const faults: ImportFault[] = [];
  let count = 0;
  sheet.eachRow((row, number) => {
    if (number === 1) return;
    const texts = IMPORT_COLUMNS.map((_column, at) => cellText(row.getCell(at + 1)));
    if (texts.every((text) => text.ok && text.value === '')) return;
    count += 1;
    if (count > MOST_ROWS) throw new RefusalError({ code: 'workbook-too-many-rows', params: { most: MOST_ROWS } });
    const wrong = texts.flatMap((text, at) =>
      text.ok ? [] : [faultAt(number, IMPORT_COLUMNS[at] ?? 'note', text.refusal.code, text.refusal.params)],
    );
    if (wrong.length > 0) faults.push(...wrong);
    else
      rows.push(
        rowOf(
          number,
          texts.map((text) => (text.ok ? text.value : '')),
        ),
      );
  });
  if (count === 0) throw new RefusalError({ code: 'workbook-empty', params: {} });
  return { rows, faults };
}

function checkHeads(sheet: Worksheet): void {
  IMPORT_COLUMNS.forEach((column, at) => {
    const head = cellText(sheet.getRow(1).getCell(at + 1));
    if (!head.ok || nameKey(head.value) !== nameKey(IMPORT_HEADS[column]))
      throw new RefusalError({
        code: 'workbook-columns',
        params: { column: columnLetter(column), head: IMPORT_HEADS[column] },
      });
  });
}

function rowOf(row: number, texts: readonly string[]): ImportRow {
  const [
    customer = '',
    site = '',
    day = '',
    code = '',
    choices = '',
    quantity = '',
    unit = '',
    whenShort = '',
    note = '',
  ] = texts;
  return { row, customer, site, day, code, choices, quantity, unit, whenShort, note };
}
