/** What a column holds; it decides how values are written, that numbers stand at the right and codes never break. */
export type ColumnKind = 'text' | 'code' | 'money' | 'kg' | 'date' | 'count' | 'percent' | 'template';

export type CellValue = string | number | null | undefined;

/** A column of `sw-data-table`. Money is whole minor units, weight whole grams, a percentage over 1,000,000. */
export interface TableColumn<Row> {
  readonly key: string;
  readonly label: string;
  readonly kind: ColumnKind;
  /** The cell's value; by default the row's property of the column's key. Sorting goes by it too. */
  readonly value?: (row: Row) => CellValue;
  readonly align?: 'start' | 'end';
  readonly sortable?: boolean;
}

export interface TableSort {
  readonly key: string;
  readonly direction: 'ascending' | 'descending';
}

/** The value that a column shows of a row. */
export function cellValue<Row>(column: TableColumn<Row>, row: Row): CellValue {
  return column.value === undefined ? (row as Record<string, CellValue>)[column.key] : column.value(row);
}

/** The rows in the order asked; rows without a value come last either way. */
export function sortRows<Row>(
  rows: readonly Row[],
  columns: readonly TableColumn<Row>[],
  sort: TableSort | null,
  locale: string,
): readonly Row[] {
  const column = columns.find(({ key }) => key === sort?.key);
  if (sort === null || column === undefined) {
    return rows;
  }
  const collator = new Intl.Collator(locale, { numeric: true, sensitivity: 'base' });
  const sign = sort.direction === 'ascending' ? 1 : -1;
  return [...rows].sort((left, right) => {
    const [a, b] = [cellValue(column, left), cellValue(column, right)];
    if (a == null || b == null) {
      return Number(a == null) - Number(b == null);
    }
    return sign * (typeof a === 'number' && typeof b === 'number' ? a - b : collator.compare(String(a), String(b)));
  });
}
