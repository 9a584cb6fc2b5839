import { inTransaction, notFound, system } from '@seamwright/shared/server';
import { clearWaiting, type CardPort, type CardState } from '../../src';

/** A card that a customer keeps, and what becomes of a hold on it. */
export interface FakeCard {
  readonly customerId: string;
  readonly answer: 'pre-authorised' | 'declined' | 'lost';
}

interface Started extends CardState {
  readonly cardId: string;
}

/** Stands in for the keeper of cards: remembers what was started and answers a hold as its card says. */
export class FakeCards implements CardPort {
  readonly cards = new Map<string, FakeCard>();
  readonly started = new Map<string, Started>();
  readonly holds: string[] = [];

  async start(_tx: unknown, wanted: Parameters<CardPort['start']>[1]): Promise<void> {
    const { orderId, customerId, holdMinor, cardId } = wanted;
    if (this.cards.get(cardId)?.customerId !== customerId) throw notFound();
    this.started.set(orderId, { cardId, state: 'started', holdMinor, capturedMinor: 0, declineCode: null });
  }

  async hold({ database, clock }: Parameters<CardPort['hold']>[0], orderId: string): Promise<void> {
    this.holds.push(orderId);
    const before = this.started.get(orderId);
    const answer = this.cards.get(before?.cardId ?? '')?.answer;
    if (!before || !answer) throw new Error('No hold was started');
    if (answer === 'lost') throw new Error('The processor did not answer');
    const declineCode = answer === 'declined' ? 'insufficient_funds' : null;
    this.started.set(orderId, { ...before, state: answer, declineCode });
    if (answer !== 'pre-authorised') return;
    const now = await clock.now();
    await inTransaction(database, system('job'), (tx) => clearWaiting(tx, { now, orderId, what: 'payment' }));
  }

  async stateOf(_tx: unknown, orderIds: readonly string[]): Promise<ReadonlyMap<string, CardState>> {
    const known = orderIds.flatMap((id) => {
      const started = this.started.get(id);
      if (!started) return [];
      const { cardId: _cardId, ...state } = started;
      return [[id, state] as const];
    });
    return new Map(known);
  }
}
