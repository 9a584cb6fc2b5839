import type { PlantDate } from '@seamwright/shared/util';
import { cardFee, type FeeSchedule } from './card-fee';
import { bearsReference, MOST_DAYS_APART, namesPayout, type BankLineToMatch, type PayoutMatch } from './match-payouts';
import { transactionKind, type Payout, type ProcessorTransaction } from './processor-money';
import { workingDaysBetween } from './working-days';

export const EXCEPTION_KINDS = [
  'missing-here',
  'missing-there',
  'amount-differs',
  'duplicate',
  'fee-differs',
  'late',
] as const;
export type ExceptionKind = (typeof EXCEPTION_KINDS)[number];

export const EXCEPTION_CAUSES = [
  'not-told-yet',
  'taken-outside-the-desk',
  'charged-twice',
  'captured-differently',
  'tariff-changed',
  'parts-missing',
  'bank-booked-differently',
  'bank-booked-twice',
  'payout-unknown',
  'statement-missing',
] as const;
export type ExceptionCause = (typeof EXCEPTION_CAUSES)[number];

export const EXCEPTION_ACTS = ['ask-processor', 'import-statement', 'look-at-payment', 'look-at-ledger'] as const;
export type ExceptionAct = (typeof EXCEPTION_ACTS)[number];

/** The four comparisons: payment ↔ charge, tariff ↔ fee, parts ↔ payout, payout ↔ bank line. */
export const LEGS = ['charges', 'fees', 'payouts', 'bank'] as const;
export type Leg = (typeof LEGS)[number];

export interface ReconciliationException {
  readonly leg: Leg;
  readonly kind: ExceptionKind;
  /** How much the other side has more (less, below zero) than ours because of it. Minor units. */
  readonly differenceMinor: number;
  readonly cause: ExceptionCause;
  readonly act: ExceptionAct;
  readonly paymentId: string | null;
  readonly chargeId: string | null;
  readonly payoutId: string | null;
  readonly bankLineId: string | null;
}

/**
 * One comparison, in minor units: `oursMinor` + the differences of its exceptions − `waitingMinor` = `theirsMinor`.
 * Waiting is what the other side is not due to have yet.
 */
export interface LegResult {
  readonly leg: Leg;
  readonly oursMinor: number;
  readonly theirsMinor: number;
  readonly matchedMinor: number;
  readonly waitingMinor: number;
  readonly exceptions: readonly ReconciliationException[];
}

export interface PaymentToReconcile {
  readonly id: string;
  readonly chargeId: string | null;
  readonly capturedMinor: number;
}

/** Everything is of one currency. */
export interface ReconciliationInput {
  /** Payments that we hold to be captured. */
  readonly payments: readonly PaymentToReconcile[];
  /** What the processor took from cards. */
  readonly charges: readonly ProcessorTransaction[];
  readonly payouts: readonly Payout[];
  /** The parts of those payouts. */
  readonly parts: readonly ProcessorTransaction[];
  readonly bankLines: readonly BankLineToMatch[];
  readonly matches: readonly PayoutMatch[];
  /** The processor's tariff; null when it is not known. */
  readonly tariff: FeeSchedule | null;
  readonly today: PlantDate;
}

const sum = <T>(items: readonly T[], of: (item: T) => number): number =>
  items.reduce((total, item) => total + of(item), 0);

const nothing = { paymentId: null, chargeId: null, payoutId: null, bankLineId: null } as const;

/** Compares our books with the processor's and the bank's; every penny is matched, waited for, or in an exception. */
export function reconcile(input: ReconciliationInput): LegResult[] {
  return [compareCharges(input), compareFees(input), comparePayouts(input), compareBank(input)];
}

const takenOnly = (charges: readonly ProcessorTransaction[]): ProcessorTransaction[] =>
  charges.filter(({ type }) => transactionKind(type) === 'captured');

function compareCharges({ payments, charges }: ReconciliationInput): LegResult {
  const taken = takenOnly(charges);
  const exceptions: ReconciliationException[] = [];
  const note = (found: Omit<ReconciliationException, 'leg' | 'payoutId' | 'bankLineId'>) =>
    exceptions.push({ ...nothing, leg: 'charges', ...found });
  const seen = new Set<string>();
  const ours = new Map(payments.flatMap((payment) => (payment.chargeId ? [[payment.chargeId, payment] as const] : [])));
  let matchedMinor = 0;
  for (const { chargeId, amountMinor } of taken) {
    const payment = chargeId ? ours.get(chargeId) : undefined;
    const at = { paymentId: payment?.id ?? null, chargeId };
    if (!payment) {
      const cause = 'taken-outside-the-desk';
      note({ ...at, kind: 'missing-here', differenceMinor: amountMinor, cause, act: 'look-at-ledger' });
    } else if (seen.has(payment.id)) {
      note({ ...at, kind: 'duplicate', differenceMinor: amountMinor, cause: 'charged-twice', act: 'look-at-payment' });
    } else {
      seen.add(payment.id);
      const differenceMinor = amountMinor - payment.capturedMinor;
      matchedMinor += differenceMinor === 0 ? amountMinor : payment.capturedMinor;
      if (differenceMinor !== 0)
        note({ ...at, kind: 'amount-differs', differenceMinor, cause: 'captured-differently', act: 'look-at-payment' });
    }
  }
  for (const { id, chargeId, capturedMinor } of payments)
    if (!seen.has(id))
      note({
        paymentId: id,
        chargeId,
        kind: 'missing-there',
        differenceMinor: 0 - capturedMinor,
        cause: 'not-told-yet',
        act: 'ask-processor',
      });
  return {
    leg: 'charges',
    oursMinor: sum(payments, ({ capturedMinor }) => capturedMinor),
    theirsMinor: sum(taken, ({ amountMinor }) => amountMinor),
    matchedMinor,
    waitingMinor: 0,
    exceptions,
  };
}

function compareFees({ charges, payments, tariff }: ReconciliationInput): LegResult {
  const taken = takenOnly(charges);
  const ours = new Map(payments.map(({ chargeId, id }) => [chargeId, id]));
  const expected = ({ amountMinor, feeMinor }: ProcessorTransaction): number =>
    tariff ? cardFee(amountMinor, tariff) : feeMinor;
  const exceptions = taken
    .filter((charge) => charge.feeMinor !== expected(charge))
    .map((charge): ReconciliationException => {
      const { chargeId, feeMinor } = charge;
      const paymentId = ours.get(chargeId) ?? null;
      const differenceMinor = feeMinor - expected(charge);
      const what = { kind: 'fee-differs', cause: 'tariff-changed', act: 'look-at-ledger' } as const;
      return { ...nothing, leg: 'fees', ...what, paymentId, chargeId, differenceMinor };
    });
  const asExpected = taken.filter((charge) => charge.feeMinor === expected(charge));
  return {
    leg: 'fees',
    oursMinor: sum(taken, expected),
    theirsMinor: sum(taken, ({ feeMinor }) => feeMinor),
    matchedMinor: sum(asExpected, ({ feeMinor }) => feeMinor),
    waitingMinor: 0,
    exceptions,
  };
}

function comparePayouts({ payouts, parts }: ReconciliationInput): LegResult {
  const netOf = ({ id }: Payout): number =>
    sum(
      parts.filter(({ payoutId }) => payoutId === id),
      ({ netMinor }) => netMinor,
    );
  const exceptions = payouts
    .filter((payout) => netOf(payout) !== payout.amountMinor)
    .map((payout): ReconciliationException => {
      const differenceMinor = payout.amountMinor - netOf(payout);
      const what = { kind: 'amount-differs', cause: 'parts-missing', act: 'ask-processor' } as const;
      return { ...nothing, leg: 'payouts', ...what, payoutId: payout.id, differenceMinor };
    });
  return {
    leg: 'payouts',
    oursMinor: sum(payouts, netOf),
    theirsMinor: sum(payouts, ({ amountMinor }) => amountMinor),
    matchedMinor: sum(
      payouts.filter((payout) => netOf(payout) === payout.amountMinor),
      ({ amountMinor }) => amountMinor,
    ),
    waitingMinor: 0,
    exceptions,
  };
}

function compareBank({ payouts, bankLines, matches, today }: ReconciliationInput): LegResult {
  const sent = payouts.filter(({ state }) => state !== 'failed' && state !== 'canceled');
  const lines = new Map(bankLines.map((line) => [line.id, line]));
  const matchOf = new Map(matches.filter(({ bankLineId }) => lines.has(bankLineId)).map((m) => [m.payoutId, m]));
  const exceptions: ReconciliationException[] = [];
  const note = (found: Omit<ReconciliationException, 'leg' | 'paymentId' | 'chargeId'>) =>
    exceptions.push({ ...nothing, leg: 'bank', ...found });
  let matchedMinor = 0;
  let waitingMinor = 0;
  let theirsMinor = 0;
  for (const payout of sent) {
    const match = matchOf.get(payout.id);
    const line = match && lines.get(match.bankLineId);
    const payoutId = payout.id;
    if (line) {
      theirsMinor += line.amountMinor;
      const differenceMinor = line.amountMinor - payout.amountMinor;
      matchedMinor += payout.amountMinor;
      const what = { kind: 'amount-differs', cause: 'bank-booked-differently', act: 'look-at-ledger' } as const;
      if (differenceMinor !== 0) note({ ...what, differenceMinor, payoutId, bankLineId: line.id });
    } else if (isLate(payout, today)) {
      const what = { kind: 'late', cause: 'statement-missing', act: 'import-statement' } as const;
      note({ ...what, differenceMinor: 0 - payout.amountMinor, payoutId, bankLineId: null });
    } else {
      waitingMinor += payout.amountMinor;
    }
  }
  const used = new Set([...matchOf.values()].map(({ bankLineId }) => bankLineId));
  for (const line of bankLines) {
    if (used.has(line.id) || !namesPayout(line)) continue;
    const known = sent.find(({ id }) => bearsReference(line, id));
    theirsMinor += line.amountMinor;
    const what = known
      ? ({ kind: 'duplicate', cause: 'bank-booked-twice', act: 'look-at-ledger' } as const)
      : ({ kind: 'missing-here', cause: 'payout-unknown', act: 'ask-processor' } as const);
    note({ ...what, differenceMinor: line.amountMinor, payoutId: known?.id ?? null, bankLineId: line.id });
  }
  return {
    leg: 'bank',
    oursMinor: sum(sent, ({ amountMinor }) => amountMinor),
    theirsMinor,
    matchedMinor,
    waitingMinor,
    exceptions,
  };
}

const isLate = ({ arrivalOn }: Payout, today: PlantDate): boolean =>
  today > arrivalOn && workingDaysBetween(arrivalOn as PlantDate, today) > MOST_DAYS_APART;
