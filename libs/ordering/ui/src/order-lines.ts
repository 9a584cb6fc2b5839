import { ChangeDetectionStrategy, Component, inject, input, LOCALE_ID } from '@angular/core';
import type { WhenShort } from '@seamwright/ordering/domain';
import type { LineAmounts, PriceAnswer } from '@seamwright/pricing/domain';
import { PriceWhy, basisWord } from '@seamwright/pricing/ui';
import { Chip, Ladder, Money, type LadderStep } from '@seamwright/shared/ui';
import type { CurrencyCode } from '@seamwright/shared/util';
import { quantityWords, whenShortWord, type ShownQuantity } from './order-words';

/** A placed line as it is shown: weights in whole grams, amounts in whole minor units. */
export interface ShownOrderLine {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly version: number;
  readonly summary: string;
  readonly quantity: ShownQuantity;
  readonly pieces: number;
  readonly minGrams: number;
  readonly estimateGrams: number;
  readonly maxGrams: number;
  readonly basis: PriceAnswer['basis'];
  readonly priceMinor: number;
  readonly priceWhy: PriceAnswer;
  readonly amounts: Readonly<Record<keyof LineAmounts, number>>;
  readonly whenShort: WhenShort;
  readonly note: string;
  readonly shortPieces: number;
  readonly shortReason: string | null;
  readonly packedPieces: number;
  readonly packedGrams: number;
  readonly packedMinor: number | null;
}

/** The lines of an order: what was ordered at which price, what it was expected to weigh, and what was packed. */
@Component({
  selector: 'sw-order-lines',
  imports: [Chip, Ladder, Money, PriceWhy],
  templateUrl: './order-lines.html',
  styleUrl: './order-lines.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderLines {
  readonly lines = input.required<readonly ShownOrderLine[]>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly perOf = (line: ShownOrderLine): string => basisWord(line.basis);
  protected readonly shortWordOf = (line: ShownOrderLine): string => whenShortWord(line.whenShort);

  protected quantityOf({ quantity, pieces }: ShownOrderLine): string {
    return quantityWords(quantity, pieces, this.locale);
  }

  protected packedOf({ packedPieces, packedGrams, packedMinor }: ShownOrderLine): LadderStep | null {
    return packedPieces > 0 ? { grams: packedGrams, minor: packedMinor } : null;
  }
}
