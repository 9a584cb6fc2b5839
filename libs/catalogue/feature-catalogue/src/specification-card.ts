import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { SpecificationCard } from '@seamwright/catalogue/contracts';
import { boneStateName, SpecThumb, weightText } from '@seamwright/catalogue/ui';

/** A specification in the list: its picture, name, code and the numbers that tell it from its neighbours. */
@Component({
  selector: 'sw-specification-card',
  imports: [RouterLink, SpecThumb],
  templateUrl: './specification-card.html',
  styleUrl: './specification-card.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationCardLink {
  readonly card = input.required<SpecificationCard>();

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
  protected readonly bone = computed(() => boneStateName(this.card().boneState));
}
