import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { LineWeights, PieceKind } from '@seamwright/catalogue/domain';
import { pieceName, weightText } from '@seamwright/catalogue/ui';
import {
  ErrorState,
  Ladder,
  Loading,
  Money,
  Why,
  type LadderStep,
  type ProblemText,
  type WhyPart,
} from '@seamwright/shared/ui';
import { Choice, QuantityField, type ChoiceOption } from '@seamwright/shared/ui/forms';
import type { CurrencyCode } from '@seamwright/shared/util';

/** What is ordered by. */
export type OrderUnit = 'piece' | 'case' | 'kg';

/** The buyer's own price as the box shows it; money in whole minor units. */
export interface ShownPrice {
  readonly priceMinor: number;
  /** What it is for, in a word: "kg", "case". */
  readonly per: string;
  /** About what one piece comes to; null when the price is by the piece. */
  readonly pieceMinor: number | null;
  /** What the line comes to at its least, likely and most weight. */
  readonly minMinor: number;
  readonly estimateMinor: number;
  readonly maxMinor: number;
  readonly why: readonly WhyPart[];
}

/**
 * The side of a specification page where it is bought: price, the projected choices, how much, the weight and price
 * ladder, and the act. Without a price it still shows what the quantity will weigh; the act appears when `canAdd`.
 */
@Component({
  selector: 'sw-buy-box',
  imports: [Choice, ErrorState, Ladder, Loading, MatButton, Money, QuantityField, Why],
  templateUrl: './buy-box.html',
  styleUrl: './buy-box.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BuyBox {
  readonly name = input.required<string>();
  readonly pieceKind = input.required<PieceKind>();
  readonly piecesPerCase = input.required<number>();
  readonly currency = input.required<CurrencyCode>();
  readonly unit = input.required<OrderUnit>();
  /** Pieces or cases; for kilograms tenths of one (125 is 12.5 kg). Null while what is typed is no quantity. */
  readonly amount = input.required<number | null>();
  readonly weights = input.required<LineWeights | null>();
  readonly price = input<ShownPrice | null>(null);
  /** Under what heading the price stands: "Your price, Fri 4 Dec". */
  readonly priceHeading = input($localize`:@@catalogue.buy.price:Your price`);
  readonly loading = input(false);
  readonly problem = input<ProblemText | null>(null);
  readonly canAdd = input(false);

  readonly unitChange = output<OrderUnit>();
  readonly amountChange = output<number | null>();
  readonly add = output();
  readonly retry = output();

  protected readonly pieces = computed(() => pieceName(this.pieceKind(), 2));
  protected readonly onePiece = computed(() => pieceName(this.pieceKind(), 1));
  protected readonly units = computed<readonly ChoiceOption[]>(() => [
    { value: 'piece', label: this.pieces() },
    {
      value: 'case',
      label: $localize`:@@catalogue.buy.cases:cases`,
      note: `${this.piecesPerCase()} ${pieceName(this.pieceKind(), this.piecesPerCase())}`,
    },
    { value: 'kg', label: $localize`:@@catalogue.buy.kg:about kg` },
  ]);
  protected readonly unitWord = computed(() => {
    const one = this.amount() === 1;
    const words = {
      piece: one ? this.onePiece() : this.pieces(),
      case: one ? $localize`:@@catalogue.buy.case:case` : $localize`:@@catalogue.buy.cases:cases`,
      kg: 'kg',
    };
    return words[this.unit()];
  });
  protected readonly quantityLabel = computed(
    () => $localize`:@@catalogue.buy.quantity:Quantity of ${this.name()}:name:`,
  );
  protected readonly ladder = computed(() => {
    const [weights, price] = [this.weights(), this.price()];
    const step = (grams: number, minor: number | undefined): LadderStep => ({ grams, minor: minor ?? null });
    return (
      weights && {
        atLeast: step(weights.minGrams, price?.minMinor),
        mostLikely: step(weights.estimateGrams, price?.estimateMinor),
        atMost: step(weights.maxGrams, price?.maxMinor),
      }
    );
  });
  /** What the act at the foot of a small screen would put in: "24 steaks · 6.720 kg". */
  protected readonly orderWords = computed(() => {
    const weights = this.weights();
    if (!weights) return '';
    const pieces = `${weights.pieces} ${pieceName(this.pieceKind(), weights.pieces)}`;
    return `${pieces} · ${weightText(weights.estimateGrams)}`;
  });
  /** "About 12 kg" comes to whole pieces; the buyer sees how many. */
  protected readonly piecesOfKg = computed(() => {
    const weights = this.weights();
    return this.unit() === 'kg' && weights ? `${weights.pieces} ${pieceName(this.pieceKind(), weights.pieces)}` : '';
  });

  protected chooseUnit(unit: string | null): void {
    if (unit === 'piece' || unit === 'case' || unit === 'kg') this.unitChange.emit(unit);
  }
}
