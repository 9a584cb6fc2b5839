// The table stands apart from `shared/ui`, so that pages without one don't load it.
export { DataTable } from '../../src/data-table/data-table';
export { DataTableHarness } from '../../src/data-table/data-table.harness';
export { TableCell } from '../../src/data-table/table-cell';
export type { CellValue, ColumnKind, TableColumn, TableSort } from '../../src/data-table/table-column';
