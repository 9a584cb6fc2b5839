import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import { Disclosure } from './disclosure';
import { Mark } from './mark';
import { MenuItem } from './menu-item';
import type { NavLink } from './nav-link';

/** From which width on the links stand in the bar; below it they are all in the menu. */
export type BarFrom = 'tablet' | 'desk' | 'wide' | 'never';

/** The bar of both applications: the mark, the navigation or its menu, and what the application puts at the far end. */
@Component({
  selector: 'sw-top-bar',
  imports: [Disclosure, Mark, MenuItem, RouterLink, RouterLinkActive],
  templateUrl: './top-bar.html',
  styleUrl: './top-bar.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TopBar {
  readonly links = input.required<readonly NavLink[]>();
  readonly linksFrom = input<BarFrom>('tablet');

  protected readonly hasLinks = computed(() => this.links().length > 0);
}
