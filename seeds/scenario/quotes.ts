/** A quote of the demo; days are counted from the day it is written on. All prices are invented. */
export interface DemoQuote {
  readonly customer: string;
  readonly writtenBy: string;
  readonly pricesForDays: number;
  readonly answerWithinDays: number;
  readonly notes: string;
  /** Pence per kg by specification code. */
  readonly prices: Readonly<Record<string, number>>;
  /** What became of it on the day it was written; one that is sent and not answered runs out. */
  readonly then: 'kept as a draft' | 'sent' | 'accepted';
}

/** Written on the first morning of the history. */
export const EARLY_QUOTES: readonly DemoQuote[] = [
  {
    customer: 'quillfeather',
    writtenBy: 'ruben',
    pricesForDays: 84,
    answerWithinDays: 7,
    notes: 'For the winter weddings: the same rack and rump each weekend.',
    prices: { 'LM-103': 2_390, 'LM-106': 1_620 },
    then: 'accepted',
  },
  {
    customer: 'eskmere',
    writtenBy: 'ruben',
    pricesForDays: 56,
    answerWithinDays: 10,
    notes: 'School terms only.',
    prices: { 'BF-209': 665, 'PK-303': 530 },
    then: 'sent',
  },
];

/** Written on the demo's own morning. */
export const TODAYS_QUOTES: readonly DemoQuote[] = [
  {
    customer: 'ladle',
    writtenBy: 'ruben',
    pricesForDays: 42,
    answerWithinDays: 9,
    notes: 'As we said on the telephone: rack for the December menu, fillet for New Year.',
    prices: { 'LM-103': 2_395, 'BF-203': 3_990 },
    then: 'sent',
  },
  {
    customer: 'ploughwright',
    writtenBy: 'ruben',
    pricesForDays: 28,
    answerWithinDays: 7,
    notes: '',
    prices: { 'LM-104': 1_060, 'PK-301': 600 },
    then: 'kept as a draft',
  },
];
