import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { UNIT_SPACE } from '@seamwright/shared/util';
import { KgPipe } from './kg.pipe';

/** A weight in kilograms with its unit in a lighter weight. */
@Component({
  selector: 'sw-kg',
  imports: [KgPipe],
  template: `<span [textContent]="grams() | swKg: 'bare'"></span><span class="sw-unit" [textContent]="unit()"></span>`,
  styleUrl: './number.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Kg {
  /** Whole grams; nothing is shown for null. */
  readonly grams = input.required<number | null>();

  protected readonly unit = computed(() => (this.grams() === null ? '' : `${UNIT_SPACE}kg`));
}
