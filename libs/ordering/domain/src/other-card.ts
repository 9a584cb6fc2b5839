import { ok, refuse, type Result } from '@seamwright/shared/util';
import type { OrderStage } from './order-stage';

/** Nothing is held on such a card, and nothing more will come of it. */
const CARD_IS_OUT: readonly string[] = ['declined', 'failed', 'released'];

export interface WaitingOrder {
  readonly stage: OrderStage;
  readonly waitingFor: readonly string[];
  /** How the card stands that was asked last; null when none was. */
  readonly cardState: string | null;
}

/**
 * Whether another card may be tried for an order. Refuses with `order-waits-for-no-card` (stage), and with
 * `card-still-asked` while the last one may still be held: two holds for one order must not stand side by side.
 */
export function checkOtherCard({ stage, waitingFor, cardState }: WaitingOrder): Result<true> {
  if (stage !== 'waiting' || !waitingFor.includes('payment')) return refuse('order-waits-for-no-card', { stage });
  if (cardState !== null && !CARD_IS_OUT.includes(cardState)) return refuse('card-still-asked');
  return ok(true);
}
