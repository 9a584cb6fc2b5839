import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CuttingListWire } from '@seamwright/plant/contracts';
import { Card, KgPipe } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { casesWords } from './day-words';

type CustomerCutsWire = CuttingListWire['customers'][number];
type Row = CustomerCutsWire['cuts'][number];

/** What one customer gets, with the sums. */
@Component({
  selector: 'sw-customer-cuts',
  imports: [Card, DataTable, KgPipe, TableCell],
  template: `
    <sw-card [heading]="customer().customer.name" [flush]="true">
      <span swBeside class="sw-muted">{{ customer().totals.outGrams | swKg }}</span>
      <sw-data-table
        [label]="customer().customer.name"
        [columns]="columns"
        [rows]="customer().cuts"
        [rowId]="rowId"
        [totals]="totals()"
      >
        <ng-template swCell="cut" let-row>
          <b>{{ row.cut.name }}</b>
          <span class="sw-muted sw-small detail">{{ row.cut.code }} · {{ row.cut.summary }}</span>
        </ng-template>
      </sw-data-table>
    </sw-card>
  `,
  styles: `
    .detail {
      display: block;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomerCuts {
  readonly customer = input.required<CustomerCutsWire>();

  protected readonly columns: readonly TableColumn<Row>[] = [
    { key: 'cut', label: $localize`:@@cuttingDay.cut:Cut`, kind: 'template' },
    {
      key: 'orders',
      label: $localize`:@@cuttingDay.orders:Order`,
      kind: 'code',
      value: ({ orderNumbers }) => orderNumbers.join(', '),
    },
    { key: 'pieces', label: $localize`:@@cuttingDay.pieces:Pieces`, kind: 'count' },
    { key: 'cases', label: $localize`:@@cuttingDay.ordered:Ordered as`, kind: 'text', align: 'end', value: casesWords },
    { key: 'outGrams', label: $localize`:@@cuttingDay.out:Expected out, kg`, kind: 'kg' },
  ];
  protected readonly rowId = ({ cut }: Row): string => `${cut.versionId}|${cut.choiceKey}`;
  protected readonly totals = computed(() => {
    const { pieces, outGrams } = this.customer().totals;
    return { pieces, outGrams };
  });
}
