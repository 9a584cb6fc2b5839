import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { StaffSpecification } from '@seamwright/catalogue/contracts';
import {
  boneStateName,
  finishName,
  packTypeName,
  pieceName,
  temperatureName,
  weightText,
} from '@seamwright/catalogue/ui';
import { Card } from '@seamwright/shared/ui';
import { UNIT_SPACE } from '@seamwright/shared/util';

/** All numbers and words of a version as its author wrote them, with its method and choices. */
@Component({
  selector: 'sw-record-numbers',
  imports: [Card],
  templateUrl: './record-numbers.html',
  styleUrl: './record-numbers.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RecordNumbers {
  readonly specification = input.required<StaffSpecification>();

  protected readonly facts = computed(() => {
    const spec = this.specification();
    const none = $localize`:@@catalogue.record.none:none`;
    const facts: [label: string, text: string][] = [
      [$localize`:@@catalogue.record.lines:Cutting lines`, spec.cuttingLines],
      [$localize`:@@catalogue.record.bone:Bone`, boneStateName(spec.boneState)],
      [$localize`:@@catalogue.record.fat:Fat cover, at most`, `${spec.fatCoverMm}${UNIT_SPACE}mm`],
      [$localize`:@@catalogue.record.removed:Taken off`, spec.removed.join(', ') || none],
      [$localize`:@@catalogue.record.finish:Finish`, finishName(spec.finish)],
      [
        $localize`:@@catalogue.record.size:Length × width × height`,
        `${spec.lengthMm} × ${spec.widthMm} × ${spec.heightMm}${UNIT_SPACE}mm ± ${spec.toleranceMm}`,
      ],
      [
        $localize`:@@catalogue.record.weight:Weight of a piece`,
        `${weightText(spec.pieceNominalGrams)} (${weightText(spec.pieceMinGrams)} – ${weightText(spec.pieceMaxGrams)})`,
      ],
      [
        $localize`:@@catalogue.record.pack:Pack`,
        `${spec.piecesPerPack} ${pieceName(spec.pieceKind, spec.piecesPerPack)} × ${spec.packsPerCase}, ${packTypeName(spec.packType)}`,
      ],
      [$localize`:@@catalogue.record.tare:Tare of a pack`, weightText(spec.tareGrams)],
      [
        $localize`:@@catalogue.record.storage:Storage`,
        `${temperatureName(spec.temperatureState)}, ${spec.storageMinC} – ${spec.storageMaxC}${UNIT_SPACE}°C`,
      ],
      [
        $localize`:@@catalogue.record.life:Life`,
        $localize`:@@catalogue.record.lifeText:${spec.shelfLifeDays}:days: days from cutting, ${spec.minLifeAtDeliveryDays}:left: left at delivery`,
      ],
      [$localize`:@@catalogue.record.allergens:Allergens`, spec.allergens.join(', ') || none],
      [$localize`:@@catalogue.record.unece:UNECE item`, this.unece(none)],
      ['GTIN', spec.gtin ?? none],
    ];
    return facts;
  });
  protected readonly choices = computed(() =>
    this.specification().choices.map(({ label, unit, values, defaultValue }) => ({
      label: unit ? `${label} (${unit})` : label,
      values: values.map((value) => (value.value === defaultValue ? `${value.label}*` : value.label)).join(', '),
    })),
  );

  private unece(none: string): string {
    const { uneceItem, uneceItemSeen } = this.specification();
    if (uneceItem === null) return none;
    return uneceItemSeen ? uneceItem : $localize`:@@catalogue.record.fromMemory:${uneceItem}:item:, from memory`;
  }
}
