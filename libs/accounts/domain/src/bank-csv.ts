import {
  isPlantDate,
  minorUnits,
  parseMoney,
  type CurrencyCode,
  type MinorUnits,
  type PlantDate,
  type Refusal,
} from '@seamwright/shared/util';
import { readCsv, type CsvRow } from './csv-text';

/** One booking of a bank statement; below zero when money left the bank. */
export interface StatementLine {
  /** The line of the file that it stands on. */
  readonly lineNumber: number;
  readonly bookedOn: PlantDate;
  readonly amountMinor: MinorUnits;
  readonly text: string;
  readonly reference: string | null;
}

/** What is wrong, and where: the file's line and the column's head, both null when it is the file as a whole. */
export interface StatementFault {
  readonly row: number | null;
  readonly column: string | null;
  readonly refusal: Refusal;
}

export interface Statement {
  readonly lines: readonly StatementLine[];
  readonly faults: readonly StatementFault[];
}

export const MOST_STATEMENT_LINES = 10_000;
const MOST_TEXT = 500;

const COLUMNS = ['date', 'description', 'reference', 'amount', 'debit', 'credit'] as const;
type Column = (typeof COLUMNS)[number];
type Columns = ReadonlyMap<Column, number>;

const HEADS: Readonly<Record<Column, string>> = {
  date: 'Date',
  description: 'Description',
  reference: 'Reference',
  amount: 'Amount',
  debit: 'Debit',
  credit: 'Credit',
};

const refusal = (code: string, params: Refusal['params'] = {}): Refusal => ({ code, params });
const ofFile = (code: string, params: Refusal['params'] = {}): Statement => ({
  lines: [],
  faults: [{ row: null, column: null, refusal: refusal(code, params) }],
});

/**
 * Reads a bank statement of separated values with the columns Date, Description, Reference (may be missing) and either
 * Amount (below zero when money left) or Debit and Credit. Every fault is told with its line and column.
 */
export function parseBankCsv(text: string, currency: CurrencyCode): Statement {
  const rows = readCsv(text);
  if (!rows) return ofFile('statement-unreadable');
  const [head, ...body] = rows;
  if (!head) return ofFile('statement-empty');
  const columns = columnsOf(head);
  const missing = missingColumn(columns);
  if (missing) return ofFile('statement-column-missing', { column: missing });
  if (body.length === 0) return ofFile('statement-empty');
  if (body.length > MOST_STATEMENT_LINES) return ofFile('statement-too-long', { most: MOST_STATEMENT_LINES });
  const read = body.map((row) => readLine(row, columns, currency));
  return { lines: read.flatMap(({ line }) => (line ? [line] : [])), faults: read.flatMap(({ faults }) => faults) };
}

function columnsOf({ cells }: CsvRow): Columns {
  const found = new Map<Column, number>();
  cells.forEach((cell, at) => {
    const column = COLUMNS.find((name) => name === cell.toLowerCase());
    if (column && !found.has(column)) found.set(column, at);
  });
  return found;
}

function missingColumn(columns: Columns): string | null {
  if (!columns.has('date')) return HEADS.date;
  if (!columns.has('description')) return HEADS.description;
  if (columns.has('amount')) return null;
  if (!columns.has('debit') && !columns.has('credit')) return HEADS.amount;
  return columns.has('debit') ? (columns.has('credit') ? null : HEADS.credit) : HEADS.debit;
}

function readLine(
  row: CsvRow,
  columns: Columns,
  currency: CurrencyCode,
): { line: StatementLine | null; faults: StatementFault[] } {
  const faults: StatementFault[] = [];
  const cell = (column: Column): string => row.cells[columns.get(column) ?? -1] ?? '';
  const fault = (column: Column, found: Refusal): null => {
    faults.push({ row: row.line, column: HEADS[column], refusal: found });
    return null;
  };
  const bookedOn = readDay(cell('date')) ?? fault('date', refusal('statement-date', { text: cell('date') }));
  const text = cell('description');
  if (text.length > MOST_TEXT) fault('description', refusal('statement-text-long', { most: MOST_TEXT }));
  const amountMinor = readAmount(cell, columns, currency, fault);
  if (bookedOn === null || amountMinor === null || faults.length > 0) return { line: null, faults };
  const reference = cell('reference').slice(0, MOST_TEXT) || null;
  return { line: { lineNumber: row.line, bookedOn, amountMinor, text, reference }, faults };
}

function readAmount(
  cell: (column: Column) => string,
  columns: Columns,
  currency: CurrencyCode,
  fault: (column: Column, found: Refusal) => null,
): MinorUnits | null {
  const money = (column: Column): MinorUnits | null => {
    const read = parseMoney(accountingSign(cell(column)), currency);
    if (!read.ok) return fault(column, refusal('statement-amount', { text: cell(column) }));
    return read.value === 0 ? fault(column, refusal('statement-amount-zero')) : read.value;
  };
  if (columns.has('amount')) return money('amount');
  const [debit, credit] = [cell('debit'), cell('credit')];
  if (debit !== '' && credit !== '') return fault('debit', refusal('statement-both-sides'));
  if (debit === '' && credit === '') return fault('credit', refusal('statement-no-amount'));
  const amount = money(debit === '' ? 'credit' : 'debit');
  // Banks write what left with or without a minus in its own column.
  return amount === null || debit === '' ? amount : minorUnits(-Math.abs(amount));
}

/** "(12.50)" is how some banks write what left; "+12.50" what came. */
function accountingSign(text: string): string {
  const inside = /^\((.*)\)$/.exec(text);
  return inside ? `-${inside[1] ?? ''}` : text.replace(/^\+\s*/, '');
}

const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

/** 2026-12-03, 3/12/2026, 03.12.2026, 03-12-2026 or 3 Dec 2026: the day before the month. */
function readDay(text: string): PlantDate | null {
  const numbers = /^(\d{1,2})[/.-](\d{1,2})[/.-](\d{4})$/.exec(text);
  const words = /^(\d{1,2})[ -]([a-z]{3})[a-z]*[ -](\d{4})$/i.exec(text);
  const month = words ? MONTHS.indexOf((words[2] ?? '').toLowerCase()) + 1 : Number(numbers?.[2]);
  const [, day, , year] = words ?? numbers ?? [];
  const iso = year ? `${year}-${String(month).padStart(2, '0')}-${(day ?? '').padStart(2, '0')}` : text;
  return isPlantDate(iso) ? iso : null;
}
