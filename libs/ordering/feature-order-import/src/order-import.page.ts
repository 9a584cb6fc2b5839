import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { ImportFaultWire, OrderImportWire } from '@seamwright/ordering/contracts';
import { OrderImports } from '@seamwright/ordering/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { MOST_IMPORT_BYTES, type Problem } from '@seamwright/shared/contracts';
import { asProblem, saveFile } from '@seamwright/shared/data-access';
import { Card, Chip, DatePipe, ErrorState, Kg, Loading, Money, PageHead } from '@seamwright/shared/ui';
import { Choice, FileDrop, type ChoiceOption } from '@seamwright/shared/ui/forms';
import { DataTable, type TableColumn } from '@seamwright/shared/ui/table';
import { newId } from '@seamwright/shared/util';

type How = 'good-rows' | 'all-or-none';

/** Orders from a workbook: sent, looked at with every bad cell named, then taken once. */
@Component({
  selector: 'sw-order-import-page',
  imports: [
    Card,
    Chip,
    Choice,
    DataTable,
    DatePipe,
    ErrorState,
    FileDrop,
    Kg,
    Loading,
    MatButton,
    Money,
    PageHead,
    RouterLink,
  ],
  templateUrl: './order-import.page.html',
  styleUrl: './order-import.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderImportPage {
  private readonly imports = inject(OrderImports);

  protected readonly preview = signal<OrderImportWire | null>(null);
  /** How much of the file is sent, in per cent; at 100 it is being read. Null when nothing is under way. */
  protected readonly sent = signal<number | null>(null);
  protected readonly taking = signal(false);
  protected readonly fileError = signal('');
  protected readonly problem = signal<Problem | null>(null);
  protected readonly chosenHow = signal<How | null>(null);
  protected readonly limits = { endings: ['.xlsx'], maxBytes: MOST_IMPORT_BYTES };
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly faultsHeading = $localize`:@@orderImport.faults:Cells with faults`;
  protected readonly leftOutHeading = $localize`:@@orderImport.leftOut:What was left out`;
  protected readonly crumbs = [{ label: $localize`:@@orderImport.crumb:Orders`, path: '/orders' }];
  /** A sheet without faults is taken whole; otherwise the person says what becomes of it. */
  protected readonly how = computed<How | null>(
    () => this.chosenHow() ?? (this.preview()?.faults.length === 0 ? 'all-or-none' : null),
  );
  protected readonly goodLines = computed(() =>
    (this.preview()?.orders ?? []).reduce((sum, { lines }) => sum + lines.length, 0),
  );
  protected readonly mayTake = computed(() => {
    const [preview, how] = [this.preview(), this.how()];
    if (!preview || preview.taken || preview.orders.length === 0 || how === null || this.taking()) return false;
    return how === 'good-rows' || preview.faults.length === 0;
  });
  protected readonly hows = computed<readonly ChoiceOption[]>(() => [
    {
      value: 'good-rows',
      label: $localize`:@@orderImport.how.good:The good rows`,
      note: $localize`:@@orderImport.how.good.note:good rows: ${this.goodLines()}:rows:; the others are left out`,
    },
    {
      value: 'all-or-none',
      label: $localize`:@@orderImport.how.all:All or none`,
      ...(this.preview()?.faults.length
        ? { refused: $localize`:@@orderImport.how.all.refused:mend the faults first` }
        : { note: $localize`:@@orderImport.how.all.note:every row of the sheet` }),
    },
  ]);
  protected readonly faultColumns: readonly TableColumn<ImportFaultWire>[] = [
    { key: 'row', label: $localize`:@@orderImport.fault.row:Row`, kind: 'count', sortable: true },
    { key: 'column', label: $localize`:@@orderImport.fault.column:Column`, kind: 'code', sortable: true },
    { key: 'message', label: $localize`:@@orderImport.fault.message:What is wrong`, kind: 'text' },
  ];
  protected readonly faultId = ({ row, column, code }: ImportFaultWire): string => `${column}${row} ${code}`;

  /** One key for one taking, so that pressing again after a lost answer takes it once. */
  private takingKey = newId();

  protected template(): void {
    this.imports.template().subscribe({
      next: saveFile,
      error: (error: unknown) => this.problem.set(asProblem(error)),
    });
  }

  protected send(file: File): void {
    this.sent.set(0);
    this.fileError.set('');
    this.problem.set(null);
    this.preview.set(null);
    this.chosenHow.set(null);
    this.imports.upload(file, newId()).subscribe({
      next: ({ percent, answer }) => {
        this.sent.set(answer ? null : percent);
        if (!answer) return;
        this.preview.set(answer);
        this.takingKey = newId();
      },
      error: (error: unknown) => {
        this.sent.set(null);
        this.fileError.set(asProblem(error).detail);
      },
    });
  }

  protected choose(how: string | null): void {
    if (how === 'good-rows' || how === 'all-or-none') {
      this.chosenHow.set(how);
      this.takingKey = newId();
    }
  }

  protected take(): void {
    const [preview, how] = [this.preview(), this.how()];
    if (!preview || how === null || !this.mayTake()) return;
    this.taking.set(true);
    this.problem.set(null);
    this.imports.take(preview.id, how, this.takingKey).subscribe({
      next: (taken) => {
        this.taking.set(false);
        this.preview.set(taken);
      },
      error: (error: unknown) => {
        this.taking.set(false);
        this.problem.set(asProblem(error));
      },
    });
  }

  protected startAgain(): void {
    this.preview.set(null);
    this.problem.set(null);
  }
}
