import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CurrencyCode } from '@seamwright/shared/util';
import { Kg } from '../numbers/kg';
import { Money } from '../numbers/money';

/** A weight in whole grams with what it costs in whole minor units; no amount where the price isn't shown. */
export interface LadderStep {
  readonly grams: number;
  readonly minor: number | null;
}

/** Where the outer knots stand, in per cent of the width: the middles of three equal columns. */
const FIRST = 100 / 6;
const LAST = 100 - FIRST;

/**
 * What a line will weigh and cost at least, most likely and at most; after packing, the real value on the same ladder.
 * The knots stand where the weights lie; everything is said in words and figures too.
 */
@Component({
  selector: 'sw-ladder',
  imports: [Kg, Money],
  templateUrl: './ladder.html',
  styleUrl: './ladder.scss',
  host: { role: 'group', '[attr.aria-label]': 'label()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Ladder {
  readonly atLeast = input.required<LadderStep>();
  readonly mostLikely = input.required<LadderStep>();
  readonly atMost = input.required<LadderStep>();
  /** What was really packed. */
  readonly real = input<LadderStep | null>(null);
  readonly currency = input.required<CurrencyCode>();
  readonly label = input($localize`:@@ui.ladder.label:Weight and price`);

  protected readonly exact = computed(() => this.atLeast().grams === this.atMost().grams);
  protected readonly first = FIRST;
  protected readonly last = LAST;
  protected readonly likelyAt = computed(() => this.positionOf(this.mostLikely().grams));
  protected readonly likelyShift = computed(() => between(-6, this.likelyAt() - 50, 6));
  protected readonly realAt = computed(() => between(2, this.positionOf(this.real()?.grams ?? 0), 98));
  protected readonly realTextAt = computed(() => between(24, this.realAt(), 76));
  protected readonly realIsOutside = computed(() => {
    const real = this.real();
    return real !== null && (real.grams < this.atLeast().grams || real.grams > this.atMost().grams);
  });

  private positionOf(grams: number): number {
    const span = this.atMost().grams - this.atLeast().grams;
    const share =
      span === 0 ? 0.5 + Math.sign(grams - this.atLeast().grams) / 2 : (grams - this.atLeast().grams) / span;
    return FIRST + share * (LAST - FIRST);
  }
}

function between(least: number, value: number, most: number): number {
  return Math.min(most, Math.max(least, value));
}
