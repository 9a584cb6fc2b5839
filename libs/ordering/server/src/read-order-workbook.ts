import { Workbook, type Cell, type Worksheet } from 'exceljs';
import {
  columnLetter,
  faultAt,
  IMPORT_COLUMNS,
  nameKey,
  type ImportColumn,
  type ImportFault,
  type ImportRow,
} from '@seamwright/ordering/domain';
import { ok, refuse, RefusalError, type Result } from '@seamwright/shared/util';
import { guardWorkbook } from './workbook-guard';

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

export const MOST_ROWS = 5_000;
const MOST_LETTERS = 1_000;

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
  await guardWorkbook(bytes);
  const sheet = await firstSheet(bytes);
  checkHeads(sheet);
  const rows: ImportRow[] = [];
  const faults: ImportFault[] = [];
  let count = 0;
  sheet.eachRow((row, number) => {
    if (number === 1) return;
    const texts = IMPORT_COLUMNS.map((_column, at) => textOf(row.getCell(at + 1)));
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

async function firstSheet(bytes: Buffer): Promise<Worksheet> {
  const workbook = new Workbook();
  try {
    await workbook.xlsx.load(bytes as unknown as Parameters<typeof workbook.xlsx.load>[0]);
  } catch {
    throw new RefusalError({ code: 'workbook-unreadable', params: {} });
  }
  const [sheet] = workbook.worksheets;
  if (!sheet) throw new RefusalError({ code: 'workbook-empty', params: {} });
  return sheet;
}

function checkHeads(sheet: Worksheet): void {
  IMPORT_COLUMNS.forEach((column, at) => {
    const head = textOf(sheet.getRow(1).getCell(at + 1));
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

/** What a cell says, as text. Formulas are refused: what they say depends on who opens the workbook. */
function textOf(cell: Cell): Result<string> {
  const { value } = cell;
  if (value === null || value === undefined) return ok('');
  if (typeof value === 'string') return tidy(value);
  if (typeof value === 'number') return tidy(String(value));
  if (value instanceof Date)
    return Number.isNaN(value.getTime()) ? refuse('cell-unreadable') : ok(value.toISOString().slice(0, 10));
  if (typeof value !== 'object') return refuse('cell-unreadable');
  if ('formula' in value || 'sharedFormula' in value) return refuse('cell-formula');
  if ('richText' in value) return tidy(value.richText.map(({ text }) => text).join(''));
  if ('hyperlink' in value && typeof value.text === 'string') return tidy(value.text);
  return refuse('cell-unreadable');
}

function tidy(text: string): Result<string> {
  const tidied = text.replace(/[\p{Cc}\s]+/gu, ' ').trim();
  return tidied.length > MOST_LETTERS ? refuse('cell-too-long', { most: MOST_LETTERS }) : ok(tidied);
}
