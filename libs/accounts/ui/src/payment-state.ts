import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { PaymentState } from '@seamwright/accounts/domain';
import { Chip } from '@seamwright/shared/ui';
import { paymentStateWords } from './payment-words';

/** How a card payment stands. */
@Component({
  selector: 'sw-payment-state',
  imports: [Chip],
  template: `<sw-chip [tone]="words().tone">{{ words().word }}</sw-chip>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PaymentStateChip {
  readonly state = input.required<PaymentState>();

  protected readonly words = computed(() => paymentStateWords(this.state()));
}
