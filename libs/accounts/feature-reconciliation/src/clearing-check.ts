import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import { instantWords } from '@seamwright/accounts/ui';
import { Chip, MoneyPipe } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';

/** Whether the clearing account, what the processor told, and what it says it holds are the same now. */
@Component({
  selector: 'sw-clearing-check',
  imports: [Chip, MoneyPipe],
  templateUrl: './clearing-check.html',
  styleUrl: './clearing-check.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ClearingCheck {
  readonly clearing = input.required<ReconciliationWire['clearing']>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  /** What the three are apart, the largest less the smallest. */
  protected readonly apartMinor = computed(() => {
    const { ledgerMinor, toldMinor, processorMinor } = this.clearing();
    const all = processorMinor === null ? [ledgerMinor, toldMinor] : [ledgerMinor, toldMinor, processorMinor];
    return Math.max(...all) - Math.min(...all);
  });
  protected readonly readAt = computed(() => {
    const { readAt } = this.clearing();
    return readAt === null ? '' : instantWords(readAt, this.locale);
  });
}
