import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Icon } from '../icons/icon';
import type { ProblemText } from './problem-text';

/** What a status is called where people read it; the details follow under it. */
const HEADINGS: Readonly<Record<number, string>> = {
  403: $localize`:@@ui.error.notAllowed:This is not open to you`,
  404: $localize`:@@ui.error.notFound:This is not here`,
  409: $localize`:@@ui.error.conflict:This can't be done now`,
  412: $localize`:@@ui.error.changed:This was changed meanwhile`,
  422: $localize`:@@ui.error.refused:Something has to be put right`,
  429: $localize`:@@ui.error.tooOften:Too many tries`,
  500: $localize`:@@ui.error.ours:Something went wrong at our end`,
};

/** Says what happened, what was kept, and what to do: try again, or the acts that are projected. */
@Component({
  selector: 'sw-error',
  imports: [Icon, MatButton],
  templateUrl: './error.html',
  styleUrl: './error.scss',
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ErrorState {
  readonly problem = input.required<ProblemText>();
  /** What the person need not do again: "Your lines are kept on this device." */
  readonly kept = input('');
  /** Whether trying the same again can help. */
  readonly retryable = input(true);
  readonly retry = output();

  protected readonly heading = computed(() => {
    const { status, title } = this.problem();
    return HEADINGS[status ?? 0] ?? title;
  });
  /** The fields' own words, unless they say no more than the detail. */
  protected readonly errors = computed(() => {
    const { detail, errors } = this.problem();
    const more = errors?.filter(({ message }) => message !== detail) ?? [];
    return more.length === 0 ? null : more;
  });
}
