import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The first stop of the Tab key: past the bar, to the page. */
@Component({
  selector: 'sw-skip-link',
  template: `<a [href]="'#' + target().id" (click)="skip($event)" i18n="@@ui.shell.skip">Skip to the page</a>`,
  styles: `
    a {
      position: fixed;
      inset: 8px auto auto 8px;
      z-index: 20;
      padding: 10px 16px;
      border-radius: var(--sw-radius);
      background: var(--sw-spruce);
      color: var(--sw-on-spruce);
      font-weight: 600;
    }

    a:not(:focus) {
      clip-path: inset(50%);
      pointer-events: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SkipLink {
  /** Where to go; it must take focus (`tabindex="-1"`). */
  readonly target = input.required<HTMLElement>();

  // A plain jump would leave the page: its address is relative to the application's base, not to this route.
  protected skip(event: Event): void {
    event.preventDefault();
    this.target().focus();
    this.target().scrollIntoView();
  }
}
