import type { DrawnNumbers, ViewName } from '@seamwright/catalogue/domain';
import { finishName } from '../catalogue-words';
import { weightText } from '../weight-words';

const VIEWS: Readonly<Record<ViewName, string>> = {
  section: $localize`:@@catalogue.view.section:section`,
  plan: $localize`:@@catalogue.view.plan:from above`,
  side: $localize`:@@catalogue.view.side:from the side`,
  thickness: $localize`:@@catalogue.view.thickness:thickness`,
  end: $localize`:@@catalogue.view.end:from the end`,
  cubes: $localize`:@@catalogue.view.cubes:one edge`,
};

export const viewName = (view: ViewName): string => VIEWS[view];

/** "scale 1 : 2". */
export function scaleText(scale: number): string {
  const reduction = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 2 }).format(1 / scale);
  return $localize`:@@catalogue.drawing.scale:scale 1 : ${reduction}:reduction:`;
}

/** Everything the drawing shows, in a sentence, for whoever can't see it. */
export function drawingText(numbers: DrawnNumbers): string {
  const { lengthMm, widthMm, heightMm, fatCoverMm, boneState, finish, minGrams, nominalGrams, maxGrams } = numbers;
  const size = $localize`:@@catalogue.drawing.size:${lengthMm}:length: mm long, ${widthMm}:width: mm wide, ${heightMm}:height: mm thick`;
  const fat =
    fatCoverMm > 0
      ? $localize`:@@catalogue.drawing.fatText:fat cover ${fatCoverMm}:mm: mm at most`
      : $localize`:@@catalogue.drawing.noFat:no fat cover`;
  const bone =
    boneState === 'bone-in'
      ? $localize`:@@catalogue.drawing.boneIn:bone left in`
      : $localize`:@@catalogue.drawing.boneOut:boneless`;
  const weight = $localize`:@@catalogue.drawing.weightText:weighs ${weightText(nominalGrams)}:nominal:, from ${weightText(minGrams)}:least: to ${weightText(maxGrams)}:most:`;
  return $localize`:@@catalogue.drawing.text:Drawing to scale: ${size}:size:; ${fat}:fat:; ${bone}:bone:; ${finishName(finish)}:finish:; ${weight}:weight:.`;
}
