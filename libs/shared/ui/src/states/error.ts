import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Icon } from '../icons/icon';
import type { ProblemText } from './problem-text';

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
}
