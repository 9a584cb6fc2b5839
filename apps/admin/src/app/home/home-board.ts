import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { Remote } from '@seamwright/shared/data-access';
import { Card, Chip, ErrorState, Icon, Loading } from '@seamwright/shared/ui';
import { MOST_TASKS, type Task } from './task';

/** A board of the first page: what waits, each a link to where it is done. */
@Component({
  selector: 'sw-home-board',
  imports: [Card, Chip, ErrorState, Icon, Loading, RouterLink],
  templateUrl: './home-board.html',
  styleUrl: './home-board.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HomeBoard {
  readonly heading = input.required<string>();
  /** How the question stands whose answer the tasks come from. */
  readonly remote = input.required<Remote<unknown>>();
  readonly tasks = input.required<readonly Task[] | null>();
  /** What is said when nothing waits. */
  readonly none = input.required<string>();
  /** Where all of them are. */
  readonly all = input.required<readonly string[]>();
  readonly query = input<Readonly<Record<string, string>>>({});
  readonly allLabel = input.required<string>();
  /** Whether the tasks are counted at the head; not where each is a count itself. */
  readonly counted = input(true);
  readonly retry = output();

  protected readonly shown = computed(() => this.tasks()?.slice(0, MOST_TASKS) ?? []);
  protected readonly more = computed(() => Math.max(0, (this.tasks()?.length ?? 0) - MOST_TASKS));
}
