import { NgTemplateOutlet } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  contentChildren,
  inject,
  input,
  LOCALE_ID,
  model,
  output,
  ViewEncapsulation,
} from '@angular/core';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import type { CurrencyCode } from '@seamwright/shared/util';
import { Icon } from '../icons/icon';
import { Loading } from '../states/loading';
import { cellText } from './cell-text';
import { TableCell } from './table-cell';
import { type CellValue, cellValue, sortRows, type TableColumn, type TableSort } from './table-column';

/**
 * Rows in columns with sorting, a head that stays, totals and links; on a phone each row is a card. Totals are given,
 * not added up here. A `wide` table scrolls in its own box, which the keyboard can reach.
 */
@Component({
  selector: 'sw-data-table',
  imports: [Icon, Loading, MatTableModule, NgTemplateOutlet, RouterLink],
  templateUrl: './data-table.html',
  styleUrl: './data-table.scss',
  // Material makes the table's sections itself, out of reach of scoped styles; all rules begin with the element's name.
  encapsulation: ViewEncapsulation.None,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DataTable<Row> {
  /** What the table lists, for screen readers. */
  readonly label = input.required<string>();
  readonly columns = input.required<readonly TableColumn<Row>[]>();
  readonly rows = input.required<readonly Row[]>();
  /** What a row is known by, so that an unchanged row is not drawn again. */
  readonly rowId = input.required<(row: Row) => string | number>();
  readonly currency = input<CurrencyCode>('GBP');
  /** Sums by column key, in the column's unit; a text is shown as it is. */
  readonly totals = input<Readonly<Record<string, CellValue>> | null>(null);
  /** Where a row leads: its first cell becomes the link, and the whole row can be pressed. */
  readonly rowLink = input<((row: Row) => string | readonly (string | number)[]) | null>(null);
  readonly loading = input(false);
  /** Said when there are no rows and nothing is projected in `swEmpty`. */
  readonly emptyText = input($localize`:@@ui.table.empty:Nothing here yet.`);
  readonly wide = input(false);
  readonly sort = model<TableSort | null>(null);
  /** Whether the rows come sorted from elsewhere (the server) and `sort` only tells how. */
  readonly sortedElsewhere = input(false);
  readonly sorted = output<TableSort>();

  private readonly locale = inject(LOCALE_ID);
  private readonly cells = contentChildren(TableCell);
  private readonly templates = computed(() => new Map(this.cells().map((cell) => [cell.swCell(), cell.template])));

  protected readonly keys = computed(() => this.columns().map(({ key }) => key));
  protected readonly sortable = computed(() => this.columns().filter((column) => column.sortable));
  protected readonly shown = computed(() =>
    this.sortedElsewhere() ? this.rows() : sortRows(this.rows(), this.columns(), this.sort(), this.locale),
  );
  protected readonly track = (_: number, row: Row): string | number => this.rowId()(row);

  protected templateOf(column: TableColumn<Row>) {
    return this.templates().get(column.key) ?? null;
  }

  protected textOf(column: TableColumn<Row>, row: Row): string {
    return cellText(column.kind, cellValue(column, row), this.currency(), this.locale);
  }

  protected isBlank(column: TableColumn<Row>, row: Row): boolean {
    return this.templateOf(column) === null && this.textOf(column, row) === '';
  }

  protected totalOf(column: TableColumn<Row>): string {
    return cellText(column.kind, this.totals()?.[column.key], this.currency(), this.locale);
  }

  protected isWhole(column: TableColumn<Row>): boolean {
    return column.kind === 'code' || column.kind === 'date' || this.isNumber(column);
  }

  protected isNumber(column: TableColumn<Row>): boolean {
    return (column.align ?? (['money', 'kg', 'count', 'percent'].includes(column.kind) ? 'end' : 'start')) === 'end';
  }

  protected directionOf(key: string): TableSort['direction'] | null {
    const sort = this.sort();
    return sort?.key === key ? sort.direction : null;
  }

  protected sortBy(key: string): void {
    const sort: TableSort = { key, direction: this.directionOf(key) === 'ascending' ? 'descending' : 'ascending' };
    this.sort.set(sort);
    this.sorted.emit(sort);
  }
}
