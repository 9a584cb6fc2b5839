import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';

/** A change of an order: when, what, by whom. */
export interface ShownChange {
  readonly at: string;
  readonly what: 'placed' | 'confirmed' | 'released' | 'short' | 'packed' | 'cancelled';
  readonly by: string | null;
  readonly detail: Readonly<Record<string, string | number>>;
}

/** A change in words. */
export function changeWords({ what, detail }: ShownChange): string {
  switch (what) {
    case 'placed':
      return $localize`:@@order.change.placed:Placed`;
    case 'confirmed':
      return $localize`:@@order.change.confirmed:Confirmed`;
    case 'released':
      return $localize`:@@order.change.released:Released to the cutting room`;
    case 'packed':
      return $localize`:@@order.change.packed:Packing finished`;
    case 'short':
      return detail['pieces'] === 0
        ? $localize`:@@order.change.notShort:${detail['name'] ?? ''}:line: is not short after all`
        : $localize`:@@order.change.short:${detail['pieces'] ?? 0}:pieces: of ${detail['name'] ?? ''}:line: short: ${detail['reason'] ?? ''}:reason:`;
    case 'cancelled':
      return detail['reason']
        ? $localize`:@@order.change.cancelledBecause:Cancelled: ${detail['reason']}:reason:`
        : $localize`:@@order.change.cancelled:Cancelled`;
  }
}

/** Everything that happened to an order, oldest first. */
@Component({
  selector: 'sw-order-history',
  template: `
    <ol>
      @for (change of shown(); track $index) {
        <li>
          <time [attr.datetime]="change.at">{{ change.time }}</time>
          <p>
            {{ change.words }}
            @if (change.by; as name) {
              <span class="sw-muted sw-small">{{ name }}</span>
            }
          </p>
        </li>
      }
    </ol>
  `,
  styles: `
    ol {
      padding: 0;
      list-style: none;
    }

    li {
      display: grid;
      grid-template-columns: 7.5em minmax(0, 1fr);
      gap: 0 12px;
      align-items: baseline;
      padding-block: 6px;
    }

    time {
      color: var(--sw-ink-2);
      font-size: var(--sw-text-small);
    }

    span {
      display: block;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OrderHistory {
  readonly changes = input.required<readonly ShownChange[]>();

  private readonly locale = inject(LOCALE_ID);
  private readonly format = new Intl.DateTimeFormat(this.locale, {
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
    timeZone: 'Europe/London',
  });
  protected readonly shown = computed(() =>
    this.changes().map((change) => ({
      ...change,
      time: this.format.format(new Date(change.at)),
      words: changeWords(change),
    })),
  );
}
