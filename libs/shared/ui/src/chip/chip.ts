import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Icon } from '../icons/icon';
import type { IconName } from '../icons/icon-shapes';

/** How a state is meant: all is well, needs an eye, information, wrong, or nothing special. */
export type ChipTone = 'ok' | 'eye' | 'info' | 'bad' | 'plain';

/** A short state in words on a tinted ground. The words carry the meaning; the tone only helps to find it. */
@Component({
  selector: 'sw-chip',
  imports: [Icon],
  template: `
    @if (icon(); as name) {
      <sw-icon [name]="name" [size]="16" />
    }
    <span><ng-content /></span>
  `,
  styleUrl: './chip.scss',
  host: { '[attr.data-tone]': 'tone()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Chip {
  readonly tone = input<ChipTone>('plain');
  readonly icon = input<IconName>();
}
