import { ChangeDetectionStrategy, Component, inject, output, signal } from '@angular/core';
import { MOST_STATEMENT_BYTES, type BankStatement } from '@seamwright/accounts/contracts';
import { BankStatements } from '@seamwright/accounts/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import type { Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { DatePipe, ErrorState, Loading, MoneyPipe } from '@seamwright/shared/ui';
import { FileDrop } from '@seamwright/shared/ui/forms';
import { DataTable, type TableColumn } from '@seamwright/shared/ui/table';
import { newId } from '@seamwright/shared/util';
import { statementFaults, type StatementFaultRow } from './statement-faults';

/** Takes a bank statement: sent with its progress, then taken whole, or refused with every fault by line and column. */
@Component({
  selector: 'sw-statement-import',
  imports: [DataTable, DatePipe, ErrorState, FileDrop, Loading, MoneyPipe],
  templateUrl: './statement-import.html',
  styleUrl: './statement-import.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StatementImport {
  readonly taken = output<BankStatement>();

  private readonly statements = inject(BankStatements);
  protected readonly limits = { endings: ['.csv'], maxBytes: MOST_STATEMENT_BYTES };
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly percent = signal<number | null>(null);
  protected readonly statement = signal<BankStatement | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly faults = signal<readonly StatementFaultRow[]>([]);
  protected readonly twice = signal('');
  protected readonly idOf = ({ id }: StatementFaultRow): string => id;
  protected readonly columns: readonly TableColumn<StatementFaultRow>[] = [
    { key: 'line', label: $localize`:@@statement.fault.line:Line`, kind: 'count', sortable: true },
    { key: 'column', label: $localize`:@@statement.fault.column:Column`, kind: 'text', sortable: true },
    { key: 'message', label: $localize`:@@statement.fault.message:What is wrong`, kind: 'text' },
  ];

  protected send(file: File): void {
    this.percent.set(0);
    this.statement.set(null);
    this.problem.set(null);
    this.faults.set([]);
    this.twice.set('');
    this.statements.take(file, newId()).subscribe({
      next: ({ percent, answer }) => {
        this.percent.set(answer ? null : percent);
        if (!answer) return;
        this.statement.set(answer);
        this.taken.emit(answer);
      },
      error: (error: unknown) => this.refused(asProblem(error)),
    });
  }

  private refused(problem: Problem): void {
    this.percent.set(null);
    if (problem.code === 'statement-taken-already') {
      this.twice.set(problem.detail);
      return;
    }
    const faults = statementFaults(problem.errors);
    this.faults.set(faults);
    // The faults stand in their own table.
    this.problem.set(faults.length > 0 ? { ...problem, errors: [] } : problem);
  }
}
