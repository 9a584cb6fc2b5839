import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import type { NavLink } from './nav-link';
import { pageOpening } from './page-opening';
import { SkipLink } from './skip-link';
import { TopBar } from './top-bar';

/**
 * The buyers' frame: the bar with the next delivery day (`swCutOff`), the basket (`swBasket`) and the account
 * (`swAccount`), and the routed page below. On a phone the links are in the menu.
 */
@Component({
  selector: 'sw-storefront-shell',
  imports: [RouterOutlet, SkipLink, TopBar],
  template: `
    <sw-skip-link [target]="page" />
    <sw-top-bar [links]="links()" linksFrom="tablet">
      <ng-content select="[swCutOff]" />
      <ng-content select="[swBasket]" />
      <ng-content select="[swAccount]" />
    </sw-top-bar>
    <ng-content />
    <main #page id="page" tabindex="-1" [attr.aria-busy]="opening() ? 'true' : null"><router-outlet /></main>
  `,
  host: { class: 'sw-normal' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StorefrontShell {
  readonly links = input<readonly NavLink[]>([]);

  protected readonly opening = pageOpening();
}
