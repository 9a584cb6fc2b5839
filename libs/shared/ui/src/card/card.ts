import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** A board that holds one thing, with an optional heading and a word or act beside it (`swBeside`). */
@Component({
  selector: 'sw-card',
  template: `
    @if (heading(); as text) {
      <div class="head">
        <h2>{{ text }}</h2>
        <ng-content select="[swBeside]" />
      </div>
    }
    <ng-content />
  `,
  styleUrl: './card.scss',
  host: { '[class.flush]': 'flush()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Card {
  readonly heading = input('');
  /** No padding around the content: for a table or drawing that reaches the edges. */
  readonly flush = input(false);
}
