import type { ExceptionCause, ExceptionKind, Leg } from '@seamwright/accounts/domain';
import type { ChipTone, IconName } from '@seamwright/shared/ui';

interface KindWords {
  readonly tone: ChipTone;
  readonly icon: IconName;
  readonly word: string;
}

const KINDS: Readonly<Record<ExceptionKind, KindWords>> = {
  'missing-here': { tone: 'eye', icon: 'search', word: $localize`:@@accounts.kind.missingHere:Missing here` },
  'missing-there': { tone: 'eye', icon: 'search', word: $localize`:@@accounts.kind.missingThere:Missing there` },
  'amount-differs': { tone: 'bad', icon: 'bad', word: $localize`:@@accounts.kind.amountDiffers:Amount differs` },
  duplicate: { tone: 'bad', icon: 'file', word: $localize`:@@accounts.kind.duplicate:Twice` },
  'fee-differs': { tone: 'eye', icon: 'warning', word: $localize`:@@accounts.kind.feeDiffers:Fee differs` },
  late: { tone: 'eye', icon: 'clock', word: $localize`:@@accounts.kind.late:Late` },
};

/** What is wrong between two sides. */
export const exceptionWords = (kind: ExceptionKind): KindWords => KINDS[kind];

const CAUSES: Readonly<Record<ExceptionCause, string>> = {
  'not-told-yet': $localize`:@@accounts.cause.notToldYet:The processor has not told of it yet. It tells within the hour; it can be asked now.`,
  'taken-outside-the-desk': $localize`:@@accounts.cause.outside:It was taken at the processor, without an order here.`,
  'charged-twice': $localize`:@@accounts.cause.twice:The processor took the same payment a second time.`,
  'captured-differently': $localize`:@@accounts.cause.captured:The processor took another amount than the invoice asked for.`,
  'tariff-changed': $localize`:@@accounts.cause.tariff:The processor's tariff is not the one that is set, or this card costs more.`,
  'parts-missing': $localize`:@@accounts.cause.parts:Not all movements of this payout have been told yet.`,
  'bank-booked-differently': $localize`:@@accounts.cause.bankDiffers:The bank kept a charge, or booked another amount. The reference matches.`,
  'bank-booked-twice': $localize`:@@accounts.cause.bankTwice:The bank booked this payout a second time.`,
  'payout-unknown': $localize`:@@accounts.cause.unknown:The bank line names a payout that the processor has not told of.`,
  'statement-missing': $localize`:@@accounts.cause.statement:The bank statement of these days is not here yet, or the payout never came.`,
};

/** Why it is likely so. */
export const causeWords = (cause: ExceptionCause): string => CAUSES[cause];

const LEG_WORDS: Readonly<Record<Leg, string>> = {
  charges: $localize`:@@accounts.leg.charges:Payments and charges`,
  fees: $localize`:@@accounts.leg.fees:Tariff and fees`,
  payouts: $localize`:@@accounts.leg.payouts:Movements and payouts`,
  bank: $localize`:@@accounts.leg.bank:Payouts and bank`,
};

/** What is compared with what. */
export const legWords = (leg: Leg): string => LEG_WORDS[leg];
