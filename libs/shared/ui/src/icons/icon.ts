import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { iconShapes, type IconName } from './icon-shapes';

/** An outline icon in the colour of the text around it. It is hidden from screen readers: the words beside it tell. */
@Component({
  selector: 'sw-icon',
  template: `
    <svg [attr.width]="size()" [attr.height]="size()" viewBox="0 -960 960 960" fill="currentColor" focusable="false">
      <path [attr.d]="shape()" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
      flex: none;
      vertical-align: -0.2em;
    }
  `,
  host: { 'aria-hidden': 'true' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Icon {
  /** Which icon. */
  readonly name = input.required<IconName>();
  /** Edge in CSS pixels. */
  readonly size = input(20);

  protected readonly shape = computed(() => iconShapes[this.name()]);
}
