import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Icon } from '../icons/icon';
import type { FieldProblem } from '../states/problem-text';

/** What was refused and belongs to no single field, at the head of a form. What was typed stays. */
@Component({
  selector: 'sw-form-errors',
  imports: [Icon],
  template: `
    @if (problems().length > 0) {
      <sw-icon name="bad" />
      <ul>
        @for (problem of problems(); track $index) {
          <li>{{ problem.message }}</li>
        }
      </ul>
    }
  `,
  styles: `
    :host:empty {
      // Takes no room, not even the gap between its neighbours.
      position: absolute;
    }

    :host:not(:empty) {
      display: flex;
      gap: 12px;
      color: var(--sw-brick);
    }

    ul {
      margin: 0;
      padding: 0;
      list-style: none;
    }
  `,
  host: { role: 'alert' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FormErrors {
  readonly problems = input.required<readonly FieldProblem[]>();
}
