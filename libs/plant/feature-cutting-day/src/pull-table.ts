import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import { primalName } from '@seamwright/catalogue/domain';
import type { CuttingListWire, PullListWire } from '@seamwright/plant/contracts';
import { Card, Chip, DatePipe, KgPipe, Why, type WhyPart } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { formatKgWithUnit, grams } from '@seamwright/shared/util';

type Row = PullListWire['rows'][number];

/** What to fetch of each primal, from which lots, and what is missing. */
@Component({
  selector: 'sw-pull-table',
  imports: [Card, Chip, DataTable, DatePipe, KgPipe, TableCell, Why],
  templateUrl: './pull-table.html',
  styles: `
    :host {
      display: grid;
      gap: 24px;
    }

    .name {
      display: block;
    }

    ul {
      display: grid;
      gap: 4px;
      padding: 0;
      list-style: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PullTable {
  readonly pull = input.required<PullListWire>();
  /** Tells why so much is needed. */
  readonly cutting = input.required<CuttingListWire>();
  private readonly locale = inject(LOCALE_ID);

  protected readonly columns: readonly TableColumn<Row>[] = [
    { key: 'primal', label: $localize`:@@cuttingDay.primal:Primal`, kind: 'template' },
    { key: 'lots', label: $localize`:@@cuttingDay.lots:Lots`, kind: 'template' },
    { key: 'pieces', label: $localize`:@@cuttingDay.pieces:Pieces`, kind: 'count' },
    { key: 'pulledGrams', label: $localize`:@@cuttingDay.weightIn:In, kg`, kind: 'kg' },
    { key: 'neededGrams', label: $localize`:@@cuttingDay.needed:Needed, kg`, kind: 'kg' },
    { key: 'outGrams', label: $localize`:@@cuttingDay.outForOrders:Out, kg`, kind: 'kg' },
    { key: 'leftOverGrams', label: $localize`:@@cuttingDay.leftOver:Left, kg`, kind: 'kg' },
  ];
  protected readonly primalName = primalName;
  protected readonly rowId = ({ primal }: Row): string => primal.id;
  protected readonly shorts = computed(() => this.pull().rows.filter(({ shortGrams }) => shortGrams > 0));
  protected readonly totals = computed(() => {
    const { pieces, pulledGrams, neededGrams, outGrams, leftOverGrams } = this.pull().totals;
    return { pieces, pulledGrams, neededGrams, outGrams, leftOverGrams };
  });

  private readonly reasons = computed(
    () => new Map(this.pull().rows.map((row) => [row.primal.id, this.partsOf(row)] as const)),
  );
  protected whyOf({ primal }: Row): readonly WhyPart[] {
    return this.reasons().get(primal.id) ?? [];
  }

  private partsOf({ primal, neededGrams }: Row): WhyPart[] {
    const cuts = this.cutting().primals.find((each) => each.primal.id === primal.id)?.rows ?? [];
    return [
      ...cuts.map(({ cut, outGrams, inGrams }) => ({
        label: `${cut.name}, ${cut.summary}`,
        value: this.kg(inGrams),
        note: $localize`:@@cuttingDay.whyCut:for ${this.kg(outGrams)}:out: out, by its yield`,
      })),
      { label: $localize`:@@cuttingDay.whyNeeded:Needed`, value: this.kg(neededGrams), total: true },
    ];
  }

  private readonly kg = (weight: number): string => formatKgWithUnit(grams(weight), this.locale);
}
