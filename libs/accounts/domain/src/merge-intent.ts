import { minorUnits, ok, refuse, type Result } from '@seamwright/shared/util';
import { paymentStates, type PaymentMove } from './payment.states';
import type { Payment } from './payment';

/** How the processor's side of a payment stands when it is read. */
export interface Intent {
  readonly id: string;
  readonly standing: 'open' | 'needs-action' | 'held' | 'captured' | 'declined' | 'canceled';
  readonly currency: string;
  readonly amountMinor: number;
  readonly capturedMinor: number;
  readonly chargeId: string | null;
  readonly holdEndsAt: Date | null;
  readonly declineCode: string | null;
  readonly actionUrl: string | null;
  /** Our own id of the payment, as it was sent along. */
  readonly paymentId: string | null;
}

/** What changes on our side. */
export type PaymentChange = Pick<
  Payment,
  | 'state'
  | 'capturedMinor'
  | 'processorIntentId'
  | 'processorChargeId'
  | 'holdEndsAt'
  | 'declineCode'
  | 'actionUrl'
  | 'capturedAt'
>;

const MOVES: Readonly<Record<Exclude<Intent['standing'], 'open'>, PaymentMove>> = {
  'needs-action': 'ask-holder',
  held: 'authorise',
  captured: 'take',
  declined: 'decline',
  canceled: 'let-go',
};

/**
 * Merges what the processor says into our payment. Repeats and old news give null: nothing changes. Refuses
 * `intent-not-ours` when the payment it names, its currency or its amount is not the one that we asked for.
 */
export function mergeIntent(payment: Payment, intent: Intent, now: Date): Result<PaymentChange | null> {
  const strange =
    (intent.paymentId !== null && intent.paymentId !== payment.id) ||
    (payment.processorIntentId !== null && payment.processorIntentId !== intent.id) ||
    intent.currency !== payment.currency ||
    intent.amountMinor !== payment.holdMinor ||
    intent.capturedMinor > payment.holdMinor;
  if (strange) return refuse('intent-not-ours', { intent: intent.id });
  const state = stateAfter(payment, intent);
  const known = {
    processorIntentId: intent.id,
    processorChargeId: intent.chargeId ?? payment.processorChargeId,
    holdEndsAt: intent.holdEndsAt ?? payment.holdEndsAt,
  };
  if (state === payment.state) {
    const news =
      known.processorIntentId !== payment.processorIntentId ||
      known.processorChargeId !== payment.processorChargeId ||
      known.holdEndsAt?.getTime() !== payment.holdEndsAt?.getTime();
    const { capturedMinor, declineCode, actionUrl, capturedAt } = payment;
    return ok(news ? { state, capturedMinor, declineCode, actionUrl, capturedAt, ...known } : null);
  }
  return ok({
    state,
    capturedMinor: state === 'captured' ? minorUnits(intent.capturedMinor) : payment.capturedMinor,
    capturedAt: state === 'captured' ? now : payment.capturedAt,
    declineCode: codeAfter(payment, state, intent),
    actionUrl: state === 'needs-action' ? intent.actionUrl : null,
    ...known,
  });
}

function stateAfter(payment: Payment, intent: Intent): Payment['state'] {
  if (intent.standing === 'open') return payment.state;
  // A hold that is gone when it is to be captured is a failure, not a release.
  const move = payment.state === 'capturing' && intent.standing === 'canceled' ? 'fail' : MOVES[intent.standing];
  const next = paymentStates.next(payment.state, move);
  return next.ok ? next.value : payment.state;
}

function codeAfter(payment: Payment, state: Payment['state'], intent: Intent): string | null {
  if (state === 'declined') return intent.declineCode ?? 'declined';
  // Nobody asked for it to be let go: it ran out.
  if (state === 'failed' || (state === 'released' && payment.state === 'pre-authorised')) return 'hold-ended';
  return payment.declineCode;
}
