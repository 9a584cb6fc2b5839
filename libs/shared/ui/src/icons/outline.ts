import { computed, Directive, input } from '@angular/core';

/** The drawing of an icon: the outline that `shape` gives, in the colour of the text around it. */
export const OUTLINE_TEMPLATE = `
  <svg [attr.width]="size()" [attr.height]="size()" viewBox="0 -960 960 960" fill="currentColor" focusable="false">
    <path [attr.d]="shape()" />
  </svg>
`;

export const OUTLINE_STYLES = `
  :host {
    display: inline-flex;
    flex: none;
    vertical-align: -0.2em;
  }
`;

/** What an icon is, whichever outlines it knows. It is hidden from screen readers: the words beside it tell. */
@Directive({ host: { 'aria-hidden': 'true' } })
export abstract class Outline<Name extends string> {
  /** Which icon. */
  readonly name = input.required<Name>();
  /** Edge in CSS pixels. */
  readonly size = input(20);

  protected readonly shape = computed(() => this.shapes[this.name()]);
  protected abstract readonly shapes: Readonly<Record<Name, string>>;
}
