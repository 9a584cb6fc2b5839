import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The calm frame of the pages before the sign-in: one narrow board, a seam along its edge, one thing to do. */
@Component({
  selector: 'sw-entrance',
  template: `
    <div class="board sw-stack">
      <div>
        <h1 tabindex="-1">{{ heading() }}</h1>
        @if (sub(); as words) {
          <p class="sw-muted">{{ words }}</p>
        }
      </div>
      <ng-content />
    </div>
  `,
  styleUrl: './entrance.scss',
  host: { class: 'sw-page' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Entrance {
  readonly heading = input.required<string>();
  readonly sub = input('');
}
