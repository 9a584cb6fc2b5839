import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { InvoiceStanding } from '@seamwright/accounts/domain';
import { Chip } from '@seamwright/shared/ui';
import { standingWords } from './invoice-words';

/** How an invoice stands. */
@Component({
  selector: 'sw-invoice-standing',
  imports: [Chip],
  template: `<sw-chip [tone]="words().tone">{{ words().word }}</sw-chip>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvoiceStandingChip {
  readonly standing = input.required<InvoiceStanding>();

  protected readonly words = computed(() => standingWords(this.standing()));
}
