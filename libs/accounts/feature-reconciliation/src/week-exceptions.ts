import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { Account, Leg } from '@seamwright/accounts/domain';
import { Chip, Empty } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import type { CurrencyCode } from '@seamwright/shared/util';
import type { ExceptionRow } from './exception-rows';

const ACCOUNT_OF_LEG: Readonly<Record<Leg, Account>> = {
  charges: 'card-adjustments',
  fees: 'card-fees',
  payouts: 'cash-in-transit',
  bank: 'bank-differences',
};

/** What is not explained yet, why it is likely so, and what can be done about it. */
@Component({
  selector: 'sw-week-exceptions',
  imports: [Chip, DataTable, Empty, MatButton, RouterLink, TableCell],
  templateUrl: './week-exceptions.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WeekExceptions {
  readonly rows = input.required<readonly ExceptionRow[]>();
  readonly currency = input.required<CurrencyCode>();
  readonly asking = input(false);
  readonly askProcessor = output();
  readonly importStatement = output();

  protected readonly idOf = ({ id }: ExceptionRow): string => id;
  protected readonly accountOf = ({ exception }: ExceptionRow): Account => ACCOUNT_OF_LEG[exception.leg];
  protected readonly columns: readonly TableColumn<ExceptionRow>[] = [
    { key: 'kind', label: $localize`:@@reconciliation.column.kind:Kind`, kind: 'template' },
    { key: 'what', label: $localize`:@@reconciliation.column.what:What`, kind: 'text' },
    {
      key: 'differenceMinor',
      label: $localize`:@@reconciliation.column.amount:Amount`,
      kind: 'money',
      sortable: true,
    },
    {
      key: 'days',
      label: $localize`:@@reconciliation.column.age:Age, days`,
      kind: 'count',
      sortable: true,
    },
    { key: 'cause', label: $localize`:@@reconciliation.column.cause:Likely cause`, kind: 'text' },
    { key: 'act', label: $localize`:@@reconciliation.column.act:What to do`, kind: 'template', align: 'end' },
  ];
}
