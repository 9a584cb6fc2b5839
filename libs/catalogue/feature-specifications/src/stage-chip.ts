import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { stageOf, type Standing, type VersionState } from '@seamwright/catalogue/domain';
import { stageName } from '@seamwright/catalogue/ui';
import { Chip, type ChipTone } from '@seamwright/shared/ui';

/** Where a version stands, in a word. */
@Component({
  selector: 'sw-stage-chip',
  imports: [Chip],
  template: `<sw-chip [tone]="tone()">{{ name() }}</sw-chip>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StageChip {
  readonly version = input.required<{ readonly state: VersionState; readonly standing: Standing | null }>();

  private readonly stage = computed(() => stageOf(this.version()));
  protected readonly name = computed(() => stageName(this.stage()));
  protected readonly tone = computed<ChipTone>(() => {
    switch (this.stage()) {
      case 'current':
        return 'ok';
      case 'in-review':
        return 'eye';
      case 'withdrawn':
        return 'bad';
      default:
        return 'plain';
    }
  });
}
