import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { StaffSpecification } from '@seamwright/catalogue/contracts';
import { outputKindName, stationName } from '@seamwright/catalogue/ui';
import { Card } from '@seamwright/shared/ui';
import { DataTable, type TableColumn } from '@seamwright/shared/ui/table';

interface OutputRow {
  readonly name: string;
  readonly kind: string;
  readonly yieldPpm: number;
  readonly valueMinorPerKg: number | null;
}

type Station = StaffSpecification['stations'][number];

/** What the primal becomes, with the loss that closes the sum, and the work it takes. */
@Component({
  selector: 'sw-record-outputs',
  imports: [Card, DataTable],
  template: `
    <sw-card [heading]="heading()" [flush]="true">
      <sw-data-table
        [label]="heading()"
        [columns]="outputColumns"
        [rows]="outputs()"
        [rowId]="nameOf"
        [totals]="totals"
      />
    </sw-card>
    <sw-card heading="Work" i18n-heading="@@catalogue.outputs.work" [flush]="true">
      <sw-data-table
        label="Work"
        i18n-label="@@catalogue.outputs.workTable"
        [columns]="stationColumns"
        [rows]="specification().stations"
        [rowId]="stationOf"
      />
    </sw-card>
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 24px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RecordOutputs {
  readonly specification = input.required<StaffSpecification>();

  protected readonly heading = computed(
    () => $localize`:@@catalogue.outputs.heading:From ${this.specification().sourceName}:primal:`,
  );
  protected readonly outputs = computed<OutputRow[]>(() => {
    const { name, yieldPpm, otherOutputs } = this.specification();
    const others = otherOutputs.map((output) => ({ ...output, kind: outputKindName(output.kind) }));
    const loss = 1_000_000 - others.reduce((sum, output) => sum + output.yieldPpm, yieldPpm);
    const lost = { name: $localize`:@@catalogue.outputs.loss:Cutting loss`, kind: '', valueMinorPerKg: null };
    const cut = { name, kind: $localize`:@@catalogue.outputs.cut:This cut`, yieldPpm, valueMinorPerKg: null };
    return [cut, ...others, { ...lost, yieldPpm: loss }];
  });
  protected readonly totals = { name: $localize`:@@catalogue.outputs.total:Primal`, yieldPpm: 1_000_000 };
  protected readonly outputColumns: readonly TableColumn<OutputRow>[] = [
    { key: 'name', label: $localize`:@@catalogue.outputs.name:Output`, kind: 'text' },
    { key: 'kind', label: $localize`:@@catalogue.outputs.kind:Kind`, kind: 'text' },
    { key: 'yieldPpm', label: $localize`:@@catalogue.outputs.yield:Yield`, kind: 'percent' },
    { key: 'valueMinorPerKg', label: $localize`:@@catalogue.outputs.value:Value per kg`, kind: 'money' },
  ];
  protected readonly stationColumns: readonly TableColumn<Station>[] = [
    {
      key: 'station',
      label: $localize`:@@catalogue.work.station:Station`,
      kind: 'text',
      value: ({ station }) => stationName(station),
    },
    { key: 'setUpSeconds', label: $localize`:@@catalogue.work.setUp:Set-up, s`, kind: 'count' },
    { key: 'secondsPerKg', label: $localize`:@@catalogue.work.perKg:Per kg in, s`, kind: 'count' },
    { key: 'secondsPerPiece', label: $localize`:@@catalogue.work.perPiece:Per piece, s`, kind: 'count' },
  ];
  protected readonly nameOf = (row: OutputRow): string => row.name;
  protected readonly stationOf = (row: Station): string => row.station;
}
