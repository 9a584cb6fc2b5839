import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';

/** One step of the way to a page; the last one has no path. */
export interface Crumb {
  readonly label: string;
  readonly path?: string;
}

/**
 * The top of a page: where it stands, its first heading, a sentence under it, a chip beside it (`swBeside`) and its
 * acts (`swActs`). Every page has exactly one, so that focus can go to its heading after a navigation.
 */
@Component({
  selector: 'sw-page-head',
  imports: [RouterLink],
  templateUrl: './page-head.html',
  styleUrl: './page-head.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PageHead {
  readonly heading = input.required<string>();
  readonly sub = input('');
  readonly crumbs = input<readonly Crumb[]>([]);
}
