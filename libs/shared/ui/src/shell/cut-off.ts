import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { FrameIcon } from '../icons/frame-icon';
import { DatePipe } from '../numbers/date.pipe';
import { timeLeft } from './time-left';

/** The next delivery day and the time left to order for it, always in the buyers' bar. */
@Component({
  selector: 'sw-cut-off',
  imports: [DatePipe, FrameIcon],
  template: `
    <sw-icon name="clock" />
    <span class="words">
      <b>{{ day() | swDate }}</b>
      @if (minutesLeft() > 0) {
        <span class="more" i18n="@@ui.cutOff.orderWithin">delivery · order within</span>
        <span>{{ left() }}</span>
      } @else {
        <span i18n="@@ui.cutOff.closed">is closed</span>
      }
    </span>
  `,
  styleUrl: './cut-off.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CutOff {
  /** The delivery day, YYYY-MM-DD. */
  readonly day = input.required<string>();
  /** Whole minutes to the cut-off; nought or less when it has passed. */
  readonly minutesLeft = input.required<number>();

  protected readonly left = computed(() => timeLeft(this.minutesLeft()));
}
