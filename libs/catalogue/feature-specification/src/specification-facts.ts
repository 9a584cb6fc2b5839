import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import type { ResolvedOffer } from '@seamwright/catalogue/domain';
import { pieceName, weightText } from '@seamwright/catalogue/ui';

/** The numbers that an argument would be about, as chosen. */
@Component({
  selector: 'sw-specification-facts',
  template: `
    <dl>
      <div>
        <dt>{{ pieceWord() }}</dt>
        <dd>
          <b>{{ weight() }}</b> <span class="sw-unit range">{{ weightRange() }}</span>
        </dd>
      </div>
      <div>
        <dt i18n="@@catalogue.facts.thickness">Thickness</dt>
        <dd>
          <b>{{ resolved().dims.heightMm }}</b>
          <span class="sw-unit" i18n="@@catalogue.facts.tolerance">mm ± {{ specification().toleranceMm }}</span>
        </dd>
      </div>
      <div>
        <dt i18n="@@catalogue.facts.fat">Fat cover, at most</dt>
        <dd>
          <b>{{ resolved().fatCoverMm }}</b> <span class="sw-unit">mm</span>
        </dd>
      </div>
      <div>
        <dt i18n="@@catalogue.facts.life">Life at delivery, at least</dt>
        <dd>
          <b>{{ specification().minLifeAtDeliveryDays }}</b>
          <span class="sw-unit" i18n="@@catalogue.facts.days">days</span>
        </dd>
      </div>
    </dl>
  `,
  styleUrl: './specification-facts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationFacts {
  readonly specification = input.required<PublicSpecification>();
  readonly resolved = input.required<ResolvedOffer>();

  protected readonly pieceWord = computed(() => {
    const word = pieceName(this.specification().pieceKind, 1);
    return $localize`:@@catalogue.facts.piece:Weight of a ${word}:piece:`;
  });
  protected readonly weight = computed(() => weightText(this.resolved().piece.nominalGrams));
  protected readonly weightRange = computed(() => {
    const { minGrams, maxGrams } = this.resolved().piece;
    return $localize`:@@catalogue.facts.range:${weightText(minGrams)}:least: to ${weightText(maxGrams)}:most:`;
  });
}
