import { day } from './day-text';
import type { MessageTable } from './message-table';

/** Refusals of pricing, put into words. */
export const pricingMessages = {
  'price-on-request': () => $localize`There is no price in force for this on that day. Ask your rep for one.`,
  'price-case-only': () => $localize`This price is for whole cases: order by the case.`,
  'price-day-past': () => $localize`That delivery day is past. Choose a day from today on.`,
  'price-customer-missing': () => $localize`Say which customer the prices are for.`,
  'specification-not-offered': () => $localize`This specification is not offered any more, or its code is not known.`,
  'price-breaks-not-rising': () => $localize`Quantities must rise from break to break.`,
  'price-from-past': () => $localize`A price can be changed from today on, not for days that are past.`,
  'price-line-ended': (p) => $localize`This price ends before ${day(p['day'])}:day:, so it can't change from then on.`,
  'price-line-agreed': () => $localize`This price was agreed by a quote. To change it, send the customer a new quote.`,
  'quote-prices-backwards': () => $localize`The last day of the prices must not be before the first.`,
  'quote-answer-past': () => $localize`The last day for an answer is past. Choose one from today on.`,
  'quote-answer-after-prices': () => $localize`The answer must come while the prices still hold.`,
  'quote-line-twice': () => $localize`This specification is already quoted with the same choices.`,
  'quote-not-sent': () => $localize`This quote has not been sent yet.`,
  'quote-answered': (p) =>
    p['state'] === 'accepted'
      ? $localize`This quote has already been accepted.`
      : $localize`This quote has already been declined.`,
  'quote-expired': (p) =>
    $localize`This quote could be answered until ${day(p['day'])}:day:. Ask your rep for a new one.`,
  'plate-nothing-left': () => $localize`Cooking loss and waste leave nothing to serve.`,
  'plate-food-cost': () => $localize`Say which share of the menu price the meat may cost.`,
} satisfies MessageTable;
