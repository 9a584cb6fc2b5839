import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import { primalName, speciesName } from '@seamwright/catalogue/domain';
import type { CuttingListWire } from '@seamwright/plant/contracts';
import { minutesOf } from '@seamwright/plant/domain';
import { formatKg, grams } from '@seamwright/shared/util';
import { cuttingGroups } from './cutting-groups';
import { casesWords } from './day-words';

/** What is cut, by species and primal, with the sums of each. */
@Component({
  selector: 'sw-cutting-table',
  imports: [NgTemplateOutlet],
  templateUrl: './cutting-table.html',
  styleUrl: './cutting-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CuttingTable {
  readonly list = input.required<CuttingListWire>();
  private readonly locale = inject(LOCALE_ID);

  protected readonly groups = computed(() => cuttingGroups(this.list().primals));
  protected readonly heading = $localize`:@@cuttingDay.tab.cutting:Cutting list`;
  /** What stands before a number where rows are cards. */
  protected readonly labels = {
    pieces: $localize`:@@cuttingDay.pieces:Pieces`,
    ordered: $localize`:@@cuttingDay.ordered:Ordered as`,
    out: $localize`:@@cuttingDay.out:Expected out, kg`,
    in: $localize`:@@cuttingDay.in:Primal in, kg`,
    minutes: $localize`:@@cuttingDay.minutes:Minutes`,
  };
  protected readonly speciesName = speciesName;
  protected readonly primalName = primalName;
  protected readonly casesWords = casesWords;
  protected readonly minutesOf = minutesOf;
  protected readonly kg = (weight: number): string => formatKg(grams(weight), this.locale);
}
