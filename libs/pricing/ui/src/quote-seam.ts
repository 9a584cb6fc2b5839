import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID } from '@angular/core';
import type { QuoteState } from '@seamwright/pricing/domain';
import { SeamLine, type SeamStage } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';
import { quoteStateWord } from './price-words';

/** What the seam tells of a quote. Instants are ISO 8601, days YYYY-MM-DD. */
export interface QuoteLife {
  readonly state: QuoteState;
  readonly createdAt: string;
  readonly sentAt: string | null;
  readonly decidedAt: string | null;
  readonly answerBy: string;
}

/** A quote's stages as knots: written, sent, and how it ended or until when it can be answered. */
export function quoteStages(quote: QuoteLife, locale: string): SeamStage[] {
  const { state, createdAt, sentAt, decidedAt, answerBy } = quote;
  const day = (instant: string | null): string =>
    instant === null
      ? ''
      : new Intl.DateTimeFormat(locale, { day: 'numeric', month: 'short' }).format(new Date(instant));
  const lastDay = isPlantDate(answerBy) ? formatPlantDate(answerBy, 'short', locale) : answerBy;
  return [
    {
      label: $localize`:@@pricing.seam.written:Written`,
      note: day(createdAt),
      state: state === 'draft' ? 'now' : 'passed',
    },
    {
      label: quoteStateWord('sent'),
      note: day(sentAt),
      state: state === 'draft' ? 'ahead' : state === 'sent' ? 'now' : 'passed',
    },
    decidedAt === null
      ? {
          label: $localize`:@@pricing.seam.answer:Answer`,
          note: $localize`:@@pricing.seam.until:by ${lastDay}:day:`,
          state: 'ahead',
        }
      : { label: quoteStateWord(state), note: day(decidedAt), state: 'passed' },
  ];
}

/** Where a quote stands between being written and its end. */
@Component({
  selector: 'sw-quote-seam',
  imports: [SeamLine],
  template: `<sw-seam-line [stages]="stages()" [label]="label" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class QuoteSeam {
  readonly quote = input.required<QuoteLife>();

  private readonly locale = inject(LOCALE_ID);
  protected readonly stages = computed(() => quoteStages(this.quote(), this.locale));
  protected readonly label = $localize`:@@pricing.seam.label:Stages of the quote`;
}
