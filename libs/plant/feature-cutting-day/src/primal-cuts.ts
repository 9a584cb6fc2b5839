import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CuttingListWire } from '@seamwright/plant/contracts';
import { minutesOf } from '@seamwright/plant/domain';
import { Card, KgPipe } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { casesWords } from './day-words';

type PrimalCutsWire = CuttingListWire['primals'][number];
type Row = PrimalCutsWire['rows'][number];

/** The cuts of one primal with their sums. */
@Component({
  selector: 'sw-primal-cuts',
  imports: [Card, DataTable, KgPipe, TableCell],
  template: `
    <sw-card [heading]="primal().primal.name" [flush]="true">
      <span swBeside class="sw-muted">{{ primal().totals.outGrams | swKg }}</span>
      <sw-data-table
        [label]="primal().primal.name"
        [columns]="columns"
        [rows]="primal().rows"
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
export class PrimalCuts {
  readonly primal = input.required<PrimalCutsWire>();

  protected readonly columns: readonly TableColumn<Row>[] = [
    { key: 'cut', label: $localize`:@@cuttingDay.cut:Cut`, kind: 'template' },
    { key: 'pieces', label: $localize`:@@cuttingDay.pieces:Pieces`, kind: 'count' },
    { key: 'cases', label: $localize`:@@cuttingDay.ordered:Ordered as`, kind: 'text', align: 'end', value: casesWords },
    { key: 'outGrams', label: $localize`:@@cuttingDay.out:Expected out, kg`, kind: 'kg' },
    { key: 'inGrams', label: $localize`:@@cuttingDay.in:Primal in, kg`, kind: 'kg' },
    {
      key: 'minutes',
      label: $localize`:@@cuttingDay.minutes:Minutes`,
      kind: 'count',
      value: ({ seconds }) => minutesOf(seconds),
    },
  ];
  protected readonly rowId = ({ cut }: Row): string => `${cut.versionId}|${cut.choiceKey}`;
  protected readonly totals = computed(() => {
    const { pieces, outGrams, inGrams, seconds } = this.primal().totals;
    return { pieces, outGrams, inGrams, minutes: minutesOf(seconds) };
  });
}
