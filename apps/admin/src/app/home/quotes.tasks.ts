import type { QuoteListItem } from '@seamwright/pricing/contracts';
import type { PlantDate } from '@seamwright/shared/util';
import { daysAhead, inWords } from './plant-day';
import type { Task } from './task';

const SOON_DAYS = 2;

/** Quotes that were sent and wait for an answer, those first whose time ends first. */
export const quoteTasks = (quotes: readonly QuoteListItem[], today: PlantDate, locale: string): Task[] =>
  [...quotes]
    .sort((a, b) => a.answerBy.localeCompare(b.answerBy) || a.number - b.number)
    .map(({ answerBy, customerName, id, lineCount, number, pricesFrom }) => {
      const ahead = daysAhead(answerBy, today);
      const prices =
        lineCount === 1
          ? $localize`:@@admin.home.quotePrice:1 price`
          : $localize`:@@admin.home.quotePrices:${lineCount}:count: prices`;
      return {
        id,
        figure: String(number),
        text: customerName,
        note: $localize`:@@admin.home.quoteFrom:${prices}:prices: from ${inWords(pricesFrom, locale)}:day:`,
        link: ['/quotes', id],
        mark:
          ahead < 0
            ? { tone: 'bad', word: $localize`:@@admin.home.quoteOver:Time is over` }
            : {
                tone: ahead <= SOON_DAYS ? 'eye' : 'plain',
                word:
                  ahead === 0
                    ? $localize`:@@admin.home.quoteToday:Ends today`
                    : $localize`:@@admin.home.quoteEnds:Ends ${inWords(answerBy, locale)}:day:`,
              },
      };
    });
