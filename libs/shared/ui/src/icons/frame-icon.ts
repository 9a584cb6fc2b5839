import { ChangeDetectionStrategy, Component } from '@angular/core';
import { frameIconShapes, type FrameIconName } from './frame-icon-shapes';
import { Outline, OUTLINE_STYLES, OUTLINE_TEMPLATE } from './outline';

/** An icon in the frame of an application, which loads no more outlines than it shows. Pages use `Icon`. */
@Component({
  selector: 'sw-icon',
  template: OUTLINE_TEMPLATE,
  styles: OUTLINE_STYLES,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FrameIcon extends Outline<FrameIconName> {
  protected override readonly shapes = frameIconShapes;
}
