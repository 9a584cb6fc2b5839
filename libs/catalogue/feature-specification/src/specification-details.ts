import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import { boneStateName, packTypeName, pieceName, temperatureName } from '@seamwright/catalogue/ui';

const AGEING = {
  'dry-aged': $localize`:@@catalogue.ageing.dry:dry-aged`,
  'wet-aged': $localize`:@@catalogue.ageing.wet:wet-aged`,
  hung: $localize`:@@catalogue.ageing.hung:hung`,
};

/** The rest of what was agreed: where it is cut, what is taken off, pack, storage, allergens, numbers. */
@Component({
  selector: 'sw-specification-details',
  templateUrl: './specification-details.html',
  styleUrl: './specification-details.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationDetails {
  readonly specification = input.required<PublicSpecification>();

  protected readonly bone = computed(() => boneStateName(this.specification().boneState));
  protected readonly removed = computed(() => this.specification().removed.join(', '));
  protected readonly pack = computed(() => {
    const { packType, piecesPerPack, packsPerCase, pieceKind } = this.specification();
    const pieces = `${piecesPerPack} ${pieceName(pieceKind, piecesPerPack)}`;
    return $localize`:@@catalogue.details.packText:${pieces}:pieces: in a ${packTypeName(packType)}:pack:, ${packsPerCase}:packs: to a case`;
  });
  protected readonly storage = computed(() => {
    const { temperatureState, storageMinC, storageMaxC } = this.specification();
    const state = temperatureName(temperatureState);
    return $localize`:@@catalogue.details.storageText:${state}:state:, keep at ${storageMinC}:least: to ${storageMaxC}:most: °C`;
  });
  protected readonly allergens = computed(
    () => this.specification().allergens.join(', ') || $localize`:@@catalogue.details.none:none declared`,
  );
  protected readonly mayContain = computed(() => this.specification().mayContain.join(', '));
  protected readonly ageing = computed(() => {
    const ageing = this.specification().ageing;
    return ageing
      ? $localize`:@@catalogue.details.ageingText:${AGEING[ageing.kind]}:kind:, ${ageing.minDays}:least: to ${ageing.maxDays}:most: days from kill`
      : '';
  });
}
