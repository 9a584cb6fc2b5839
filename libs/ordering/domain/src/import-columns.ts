/** The columns of a workbook of orders, in their order on the sheet. */
export const IMPORT_COLUMNS = [
  'customer',
  'site',
  'day',
  'code',
  'choices',
  'quantity',
  'unit',
  'whenShort',
  'note',
] as const;
export type ImportColumn = (typeof IMPORT_COLUMNS)[number];

/** One row of the sheet as text; an empty cell is an empty text. */
export interface ImportRow extends Readonly<Record<ImportColumn, string>> {
  /** The sheet's own row number. */
  readonly row: number;
}

/** What is wrong with a cell. `column` is the sheet's letter. */
export interface ImportFault {
  readonly row: number;
  readonly column: string;
  readonly code: string;
  readonly params: Readonly<Record<string, string | number>>;
}

/** The letter over a column: customer A … note I. */
export const columnLetter = (column: ImportColumn): string =>
  String.fromCharCode('A'.charCodeAt(0) + IMPORT_COLUMNS.indexOf(column));

export const faultAt = (
  row: number,
  column: ImportColumn,
  code: string,
  params: ImportFault['params'] = {},
): ImportFault => ({ row, column: columnLetter(column), code, params });
