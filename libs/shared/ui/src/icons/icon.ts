import { ChangeDetectionStrategy, Component } from '@angular/core';
import { iconShapes, type IconName } from './icon-shapes';
import { Outline, OUTLINE_STYLES, OUTLINE_TEMPLATE } from './outline';

/** An outline icon in the colour of the text around it. It is hidden from screen readers: the words beside it tell. */
@Component({
  selector: 'sw-icon',
  template: OUTLINE_TEMPLATE,
  styles: OUTLINE_STYLES,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Icon extends Outline<IconName> {
  protected override readonly shapes = iconShapes;
}
