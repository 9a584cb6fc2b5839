import { ChangeDetectionStrategy, Component, computed, DestroyRef, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, combineLatest, EMPTY, switchMap, timer } from 'rxjs';
import { DeliveryDays, minutesLeft, type DeliveryDaysNow } from '@seamwright/ordering/data-access';
import { CutOff } from '@seamwright/shared/ui/frame';

const TICK_MS = 15_000;
const ASK_AGAIN_MS = 15 * 60_000;

/** The next delivery day and the time left to order for it, for the buyers' bar. Shows nothing while it is not known. */
@Component({
  selector: 'sw-next-delivery',
  imports: [CutOff],
  template: `
    @if (next(); as shown) {
      <sw-cut-off [day]="shown.day" [minutesLeft]="shown.minutesLeft" />
    }
  `,
  styles: `
    :host {
      display: flex;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NextDelivery {
  /** The site asked about; without it, the buyer's usual one. */
  readonly siteId = input<string | null>(null);

  private readonly days = inject(DeliveryDays);
  private readonly now = signal(Date.now());
  private readonly answer = toSignal(
    combineLatest([toObservable(this.siteId), timer(0, ASK_AGAIN_MS)]).pipe(
      switchMap(([siteId]) =>
        // Without an answer the bar goes on with what it knows; pages say what is wrong.
        this.days.next(siteId === null ? { count: 3 } : { siteId, count: 3 }).pipe(catchError(() => EMPTY)),
      ),
    ),
  );
  /** The first day whose cut-off lies ahead, so that the bar moves on by itself when one passes. */
  protected readonly next = computed(() => {
    const answer = this.answer();
    return answer ? nextOpen(answer, this.now()) : null;
  });

  constructor() {
    const ticking = setInterval(() => this.now.set(Date.now()), TICK_MS);
    inject(DestroyRef).onDestroy(() => clearInterval(ticking));
  }
}

function nextOpen({ days, clockAheadMs }: DeliveryDaysNow, now: number): { day: string; minutesLeft: number } | null {
  for (const { day, cutOffAt, closed } of days) {
    const left = minutesLeft(cutOffAt, now, clockAheadMs);
    if (!closed && left >= 0) return { day, minutesLeft: left };
  }
  return null;
}
