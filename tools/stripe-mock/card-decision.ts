import { cardOf, type PaymentMethod } from './payment-methods';
import type { Processor } from './processor';
import { authenticationDecline, type Decline } from './test-cards';

/** What the bank says to a request for money or for saving a card. */
export type Decision = { kind: 'approved' } | { kind: 'authenticate' } | { kind: 'declined'; decline: Decline };

/** How the holder takes part. */
export interface Presence {
  /** The bank's confirmation was already given. */
  authenticated: boolean;
  /** The holder can be asked to confirm; when not, a card that needs it is refused. */
  canAsk: boolean;
}

/** The bank's answer for a card; a decline arranged by hand comes before the card's own behaviour. */
export function decide(processor: Processor, method: PaymentMethod, presence: Presence): Decision {
  const card = cardOf(method);
  if (card.authentication && !presence.authenticated) {
    return presence.canAsk ? { kind: 'authenticate' } : { kind: 'declined', decline: authenticationDecline };
  }
  const decline = processor.faults.takeDecline() ?? card.decline;
  return decline ? { kind: 'declined', decline } : { kind: 'approved' };
}
