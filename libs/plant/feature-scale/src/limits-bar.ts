import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Weighing } from './weighing';

/**
 * The pack's limits as a band with the net weight on it. The band takes the middle of the bar; what lies far outside
 * stops at its ends. The words tell the same.
 */
@Component({
  selector: 'sw-limits-bar',
  template: `
    <div class="bar" aria-hidden="true">
      <span class="band"></span>
      <span class="nominal" [style.inset-inline-start.%]="at(weighing().nominalGrams)"></span>
      @if (weighing().netGrams !== null) {
        <span
          class="net"
          [attr.data-verdict]="weighing().verdict"
          [style.inset-inline-start.%]="at(weighing().netGrams ?? 0)"
        ></span>
      }
    </div>
    <div class="numbers" aria-hidden="true">
      <span [style.inset-inline-start.%]="20">{{ weighing().limits.minGrams }}</span>
      <span class="soft" [style.inset-inline-start.%]="at(weighing().nominalGrams)">{{ weighing().nominalGrams }}</span>
      <span [style.inset-inline-start.%]="80">{{ weighing().limits.maxGrams }} g</span>
    </div>
    <p role="status" [attr.data-verdict]="weighing().verdict">{{ words() }}</p>
  `,
  styleUrl: './limits-bar.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LimitsBar {
  readonly weighing = input.required<Weighing>();

  protected readonly words = computed(() => {
    const { verdict, offGrams, limits } = this.weighing();
    switch (verdict) {
      case 'none':
        return $localize`:@@scale.limits.none:From ${limits.minGrams}:min: to ${limits.maxGrams}:max: g`;
      case 'within':
        return $localize`:@@scale.limits.within:Within its limits`;
      case 'light':
        return $localize`:@@scale.limits.light:Too light by ${offGrams}:grams: g: weigh again, or say why`;
      case 'heavy':
        return $localize`:@@scale.limits.heavy:Too heavy by ${offGrams}:grams: g: weigh again, or say why`;
    }
  });

  /** Per cent along the bar: the limits stand at 20 and 80. */
  protected at(weight: number): number {
    const { minGrams, maxGrams } = this.weighing().limits;
    const span = Math.max(1, maxGrams - minGrams);
    return Math.min(100, Math.max(0, 20 + (60 * (weight - minGrams)) / span));
  }
}
