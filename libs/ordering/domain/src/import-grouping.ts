import { parsePlantDate, type PlantDate, type Quantity, type Result } from '@seamwright/shared/util';
import { parseChoices, parseQuantity, parseUnit, parseWhenShort } from './import-cells';
import { faultAt, type ImportColumn, type ImportFault, type ImportRow } from './import-columns';
import type { WhenShort } from './when-short';

export interface ImportedLine {
  readonly row: number;
  readonly code: string;
  readonly chosen: Readonly<Record<string, string>>;
  readonly quantity: Quantity;
  readonly whenShort: WhenShort;
  readonly note: string;
}

/** One order of a workbook: a customer and a delivery day, with the lines of all its rows. */
export interface ImportedOrder {
  /** As typed in the order's first row. */
  readonly customer: string;
  readonly site: string;
  readonly day: PlantDate;
  readonly lines: readonly ImportedLine[];
}

export interface GroupedImport {
  readonly orders: readonly ImportedOrder[];
  readonly faults: readonly ImportFault[];
}

/** The most lines that one order may have. */
export const MOST_LINES = 300;

/** A typed name as it is compared: capitals and doubled spaces don't count. */
export const nameKey = (text: string): string => text.trim().replace(/\s+/g, ' ').toLowerCase();

/**
 * Turns the rows of a sheet into orders: one for each customer and delivery day, lines in the order of the rows. A row
 * with a fault is left out whole, each of its faulty cells is named, and the other rows go on.
 */
export function groupRows(rows: readonly ImportRow[]): GroupedImport {
  const faults: ImportFault[] = [];
  const orders = new Map<string, ImportedOrder & { lines: ImportedLine[] }>();
  for (const row of rows) {
    const read = readRow(row);
    if (!read.line || !read.day) {
      faults.push(...read.faults);
      continue;
    }
    const key = `${nameKey(row.customer)}\n${read.day}`;
    const order = orders.get(key) ?? { customer: row.customer, site: row.site, day: read.day, lines: [] };
    const fault = doesNotFit(row, order);
    if (fault) {
      faults.push(fault);
      continue;
    }
    order.lines.push(read.line);
    orders.set(key, order);
  }
  return { orders: [...orders.values()], faults };
}

function doesNotFit(row: ImportRow, order: ImportedOrder): ImportFault | null {
  const first = order.lines[0];
  if (first && nameKey(row.site) !== nameKey(order.site))
    return faultAt(row.row, 'site', 'another-site-that-day', { row: first.row });
  return order.lines.length >= MOST_LINES ? faultAt(row.row, 'customer', 'too-many-lines', { most: MOST_LINES }) : null;
}

interface ReadRow {
  readonly line: ImportedLine | null;
  readonly day: PlantDate | null;
  readonly faults: readonly ImportFault[];
}

function readRow(row: ImportRow): ReadRow {
  const faults: ImportFault[] = [];
  const take = <T>(column: ImportColumn, result: Result<T>): T | null => {
    if (result.ok) return result.value;
    faults.push(faultAt(row.row, column, result.refusal.code, result.refusal.params));
    return null;
  };
  for (const column of ['customer', 'day', 'code', 'quantity', 'unit'] as const)
    if (row[column] === '') faults.push(faultAt(row.row, column, 'cell-empty'));
  if (row.note.length > 500) faults.push(faultAt(row.row, 'note', 'note-too-long', { most: 500 }));
  const day = row.day === '' ? null : take('day', parsePlantDate(row.day));
  const chosen = take('choices', parseChoices(row.choices));
  const unit = row.unit === '' ? null : take('unit', parseUnit(row.unit));
  const amount = row.quantity === '' || !unit ? null : take('quantity', parseQuantity(row.quantity, unit));
  const whenShort = take('whenShort', parseWhenShort(row.whenShort));
  if (faults.length > 0 || !day || !chosen || !amount || !whenShort) return { line: null, day, faults };
  return {
    line: { row: row.row, code: row.code.toUpperCase(), chosen, quantity: amount, whenShort, note: row.note },
    day,
    faults,
  };
}
