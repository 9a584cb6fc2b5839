import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** Says what would be here, and offers the next act (projected). */
@Component({
  selector: 'sw-empty',
  template: `
    <p class="heading">{{ heading() }}</p>
    @if (text(); as words) {
      <p class="text">{{ words }}</p>
    }
    <div class="sw-acts"><ng-content /></div>
  `,
  styleUrl: './empty.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Empty {
  readonly heading = input.required<string>();
  readonly text = input('');
}
