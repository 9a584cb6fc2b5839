import type { Row, Worksheet } from 'exceljs';
import { cellText, firstSheet, MOST_ROWS } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import {
  columnLetter,
  TEST_COLUMNS,
  TEST_HEADS,
  type OutputCell,
  type ReadTests,
  type TestColumn,
  type TestFault,
  type TestSheetRow,
} from './test-columns';

/** Outputs of all subjects in one workbook. */
const MOST_OUTPUTS = 200;

const plain = (text: string): string => text.trim().toLowerCase();

/**
 * Reads the first sheet of a workbook of tests: one test in a row, one output in each column after the fixed ones.
 * Refuses `workbook-unreadable`, `workbook-swollen`, `workbook-columns` (column, head), `workbook-empty` or
 * `workbook-too-many-rows` (most).
 */
export async function readTestWorkbook(bytes: Buffer): Promise<ReadTests> {
  const sheet = await firstSheet(bytes);
  const heads = outputHeads(sheet);
  const rows: TestSheetRow[] = [];
  const faults: TestFault[] = [];
  let count = 0;
  sheet.eachRow((row, number) => {
    if (number === 1) return;
    const read = readRow(row, number, heads);
    if (read === null) return;
    count += 1;
    if (count > MOST_ROWS) throw new RefusalError({ code: 'workbook-too-many-rows', params: { most: MOST_ROWS } });
    if (Array.isArray(read)) faults.push(...read);
    else rows.push(read);
  });
  if (count === 0) throw new RefusalError({ code: 'workbook-empty', params: {} });
  return { rows, faults };
}

/** Checks the fixed heads and gives the names over the columns after them. */
function outputHeads(sheet: Worksheet): ReadonlyMap<number, string> {
  const first = sheet.getRow(1);
  const wrong = (column: number, head: string) =>
    new RefusalError({ code: 'workbook-columns', params: { column: columnLetter(column), head } });
  TEST_COLUMNS.forEach((column, at) => {
    const head = cellText(first.getCell(at + 1));
    if (!head.ok || plain(head.value) !== plain(TEST_HEADS[column])) throw wrong(at + 1, TEST_HEADS[column]);
  });
  const heads = new Map<number, string>();
  const last = Math.min(first.cellCount, TEST_COLUMNS.length + MOST_OUTPUTS);
  for (let column = TEST_COLUMNS.length + 1; column <= last; column++) {
    const head = cellText(first.getCell(column));
    if (head.ok && head.value !== '') heads.set(column, head.value);
  }
  if (heads.size === 0) throw wrong(TEST_COLUMNS.length + 1, $localize`the name of an output`);
  return heads;
}

/** The row, its faults, or null where nothing stands in it. */
function readRow(row: Row, number: number, heads: ReadonlyMap<number, string>): TestSheetRow | TestFault[] | null {
  const faults: TestFault[] = [];
  const textAt = (column: number): string => {
    const text = cellText(row.getCell(column));
    if (text.ok) return text.value;
    faults.push({ row: number, column: columnLetter(column), ...text.refusal });
    return '';
  };
  const texts = Object.fromEntries(TEST_COLUMNS.map((column, at) => [column, textAt(at + 1)])) as Record<
    TestColumn,
    string
  >;
  const outputs: OutputCell[] = [...heads].flatMap(([column, name]) => {
    const text = textAt(column);
    return text === '' ? [] : [{ column, name, text }];
  });
  if (faults.length > 0) return faults;
  const isEmpty = outputs.length === 0 && TEST_COLUMNS.every((column) => texts[column] === '');
  return isEmpty ? null : { row: number, ...texts, outputs };
}
