import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Icon } from '@seamwright/shared/ui';

/** A value that somebody else saved in the meantime. */
export interface NewerValue {
  readonly label: string;
  readonly value: string;
}

/**
 * Says that somebody else saved first, and what is there now. What was typed stays in the form until one chooses: take
 * the newer values, or keep one's own and save again.
 */
@Component({
  selector: 'sw-newer-state',
  imports: [Icon, MatButton],
  templateUrl: './newer-state.html',
  styleUrl: './newer-state.scss',
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewerState {
  readonly values = input.required<readonly NewerValue[]>();
  readonly take = output();
  readonly keep = output();
}
