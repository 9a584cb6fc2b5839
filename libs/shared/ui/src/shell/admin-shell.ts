import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import type { NavLink } from './nav-link';
import { pageOpening } from './page-opening';
import { SkipLink } from './skip-link';
import { type BarFrom, TopBar } from './top-bar';

/**
 * The desk's frame, compact: the bar with the links of the person's roles and the person's menu (`swPerson`). The links
 * go into the menu under 1024 px, and sooner when a person of many roles has many of them.
 */
@Component({
  selector: 'sw-admin-shell',
  imports: [RouterOutlet, SkipLink, TopBar],
  template: `
    <sw-skip-link [target]="page" />
    <sw-top-bar [links]="links()" [linksFrom]="linksFrom()">
      <ng-content select="[swPerson]" />
    </sw-top-bar>
    <ng-content />
    <main #page id="page" tabindex="-1" [attr.aria-busy]="opening() ? 'true' : null"><router-outlet /></main>
  `,
  host: { class: 'sw-compact' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AdminShell {
  readonly links = input<readonly NavLink[]>([]);

  protected readonly opening = pageOpening();

  protected readonly linksFrom = computed<BarFrom>(() => {
    const count = this.links().length;
    return count <= 6 ? 'desk' : count <= 10 ? 'wide' : 'never';
  });
}
