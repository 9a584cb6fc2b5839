import type { Workbook, Worksheet } from 'exceljs';

/** How a column is written; weights are given in whole grams and stand in kilograms, so that they can be added up. */
export type CellKind = 'text' | 'kg' | 'count' | 'date';

export interface SheetColumn {
  readonly head: string;
  readonly kind: CellKind;
  readonly width: number;
}

export type CellInput = string | number | null;

export interface SheetRow {
  readonly cells: readonly CellInput[];
  /** Sums and headings stand out. */
  readonly strong?: boolean;
}

export interface SheetContent {
  readonly name: string;
  readonly title: string;
  readonly columns: readonly SheetColumn[];
  readonly rows: readonly SheetRow[];
  /** Said under the table. */
  readonly notes?: readonly string[];
}

const FORMATS: Readonly<Record<CellKind, string>> = {
  text: '@',
  kg: '#,##0.000 "kg"',
  count: '#,##0',
  date: 'ddd d mmm yyyy',
};
const FORMULA_START = /^[=+\-@\t\r]/;

/** Text that a spreadsheet would take for a formula gets an apostrophe before it. */
export const safeText = (text: string): string => (FORMULA_START.test(text) ? `'${text}` : text);

function cellValue(kind: CellKind, value: CellInput): string | number | Date | null {
  if (value === null) return null;
  if (typeof value === 'number') return kind === 'kg' ? value / 1_000 : value;
  return kind === 'date' ? new Date(`${value}T00:00:00Z`) : safeText(value);
}

/** Adds a sheet with a title, a head that stays in sight and on every printed page, and rows in real number formats. */
export function addSheet(workbook: Workbook, { name, title, columns, rows, notes = [] }: SheetContent): Worksheet {
  const sheet = workbook.addWorksheet(name, {
    views: [{ state: 'frozen', ySplit: 2 }],
    pageSetup: {
      paperSize: 9, // A4
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      printTitlesRow: '1:2',
      margins: { left: 0.4, right: 0.4, top: 0.5, bottom: 0.6, header: 0.3, footer: 0.3 },
    },
    headerFooter: { oddFooter: '&L&A&RPage &P of &N' },
  });
  sheet.columns = columns.map(({ kind, width }) => ({ width, style: { numFmt: FORMATS[kind] } }));
  sheet.addRow([safeText(title)]).font = { bold: true, size: 14 };
  const head = sheet.addRow(columns.map((column) => column.head));
  head.font = { bold: true };
  head.alignment = { wrapText: true, vertical: 'bottom' };
  head.border = { bottom: { style: 'thin' } };
  for (const { cells, strong } of rows) {
    const row = sheet.addRow(columns.map(({ kind }, index) => cellValue(kind, cells[index] ?? null)));
    if (strong) row.font = { bold: true };
  }
  columns.forEach(({ kind }, index) => {
    sheet.getColumn(index + 1).alignment = { horizontal: kind === 'text' ? 'left' : 'right', vertical: 'top' };
  });
  if (notes.length > 0) sheet.addRow([]);
  for (const note of notes) sheet.addRow([safeText(note)]);
  return sheet;
}
