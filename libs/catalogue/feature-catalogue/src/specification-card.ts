import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SpecificationCard } from '@seamwright/catalogue/contracts';
import { boneStateName, pieceName, SpecThumb, weightText } from '@seamwright/catalogue/ui';
import { Money } from '@seamwright/shared/ui';
import type { CardPrice } from './card-prices';

/** A specification in the list: its picture, name, code, the numbers that tell it from its neighbours, and its price. */
@Component({
  selector: 'sw-specification-card',
  imports: [Money, RouterLink, SpecThumb],
  templateUrl: './specification-card.html',
  styleUrl: './specification-card.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationCardLink {
  readonly card = input.required<SpecificationCard>();
  /** The buyer's own price; null when there is none, undefined while it is not known. */
  readonly price = input<CardPrice | null>();

  protected readonly numbers = computed(() => {
    const card = this.card();
    const weights = {
      nominalGrams: card.pieceNominalGrams,
      minGrams: card.pieceMinGrams,
      maxGrams: card.pieceMaxGrams,
    };
    return { ...card, ...weights, kind: card.drawingKind };
  });
  protected readonly weight = computed(() => weightText(this.card().pieceNominalGrams));
  protected readonly piece = computed(() => pieceName(this.card().pieceKind, 1));
  protected readonly bone = computed(() => boneStateName(this.card().boneState));
}
