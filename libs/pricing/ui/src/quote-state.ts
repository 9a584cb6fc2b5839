import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { QuoteState } from '@seamwright/pricing/domain';
import { Chip, type ChipTone } from '@seamwright/shared/ui';
import { quoteStateWord } from './price-words';

const TONES: Readonly<Record<QuoteState, ChipTone>> = {
  draft: 'plain',
  sent: 'info',
  accepted: 'ok',
  declined: 'plain',
  expired: 'eye',
};

/** Where a quote is in its life, in a word. */
@Component({
  selector: 'sw-quote-state',
  imports: [Chip],
  template: `<sw-chip [tone]="tone()">{{ word() }}</sw-chip>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuoteStateChip {
  readonly state = input.required<QuoteState>();

  protected readonly tone = computed(() => TONES[this.state()]);
  protected readonly word = computed(() => quoteStateWord(this.state()));
}
