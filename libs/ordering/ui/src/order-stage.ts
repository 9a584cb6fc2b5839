import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { OrderStage } from '@seamwright/ordering/domain';
import { Chip, type ChipTone } from '@seamwright/shared/ui';
import { stageWord } from './order-words';

const TONES: Readonly<Record<OrderStage, ChipTone>> = {
  waiting: 'eye',
  confirmed: 'ok',
  released: 'info',
  'in-work': 'info',
  packed: 'ok',
  done: 'plain',
  cancelled: 'bad',
};

/** Where an order stands, in a word. */
@Component({
  selector: 'sw-order-stage',
  imports: [Chip],
  template: `<sw-chip [tone]="tone()">{{ word() }}</sw-chip>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderStageChip {
  readonly stage = input.required<OrderStage>();

  protected readonly tone = computed(() => TONES[this.stage()]);
  protected readonly word = computed(() => stageWord(this.stage()));
}
