import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { DatePipe } from '@seamwright/shared/ui';

/** What a quote says beside its prices. Days are YYYY-MM-DD. */
export interface ShownQuoteFacts {
  readonly pricesFrom: string;
  readonly pricesUntil: string;
  readonly answerBy: string;
  readonly writtenBy: string;
  readonly decidedBy: string | null;
  readonly notes: string;
}

/** A quote's days, who wrote and answered it, and its notes. */
@Component({
  selector: 'sw-quote-facts',
  imports: [DatePipe],
  template: `
    <dl>
      <div>
        <dt i18n="@@pricing.facts.prices">Prices hold for deliveries</dt>
        <dd>{{ facts().pricesFrom | swDate }} – {{ facts().pricesUntil | swDate }}</dd>
      </div>
      <div>
        <dt i18n="@@pricing.facts.answerBy">Answer by</dt>
        <dd>{{ facts().answerBy | swDate }}</dd>
      </div>
      <div>
        <dt i18n="@@pricing.facts.writtenBy">Written by</dt>
        <dd>{{ facts().writtenBy }}</dd>
      </div>
      @if (facts().decidedBy; as name) {
        <div>
          <dt i18n="@@pricing.facts.decidedBy">Answered by</dt>
          <dd>{{ name }}</dd>
        </div>
      }
    </dl>
    @if (facts().notes; as notes) {
      <p class="notes">{{ notes }}</p>
    }
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(180px, 1fr));
      gap: 16px 24px;
    }

    dt {
      color: var(--sw-ink-2);
      font-size: var(--sw-text-small);
      line-height: 20px;
    }

    dd {
      font-weight: 600;
    }

    .notes {
      max-inline-size: 66ch;
      margin-block-start: 16px;
      white-space: pre-line;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuoteFacts {
  readonly facts = input.required<ShownQuoteFacts>();
}
