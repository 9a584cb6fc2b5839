import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, throwError, type Observable } from 'rxjs';
import { listCards, listPayments } from '@seamwright/accounts/contracts';
import { OrderPageActions, ordersEffects, ordersFeature } from '@seamwright/ordering/data-access';
import { ApiClient, LiveEvents } from '@seamwright/shared/data-access';
import { OrderCards } from './order-cards';

// Declared in ordering's contracts, which this room does not reach.
const GET_ORDER = 'orders.get';
const PAY_WITH = 'orders.pay-with';

const order = (state: string | null, changed: object = {}) => ({
  id: 'a',
  rowVersion: 4,
  stage: 'waiting',
  settlement: 'card',
  waitingFor: ['payment'],
  payment: state === null ? null : { state, declineCode: state === 'declined' ? 'insufficient_funds' : null },
  ...changed,
});
const visa = { id: 'visa', brand: 'visa', last4: '4242', expires: '08/29' };
const bank = 'https://bank.example/confirm';

let calls: { id: string; input: unknown }[];
let answers: Record<string, () => Observable<unknown>>;

function open(shown: object): { cards: OrderCards; store: Store } {
  calls = [];
  answers = {
    [GET_ORDER]: () => of(shown),
    [PAY_WITH]: () => of(order('started', { rowVersion: 5 })),
    [listCards.id]: () => of({ items: [visa] }),
    [listPayments.id]: () => of({ items: [{ actionUrl: bank }] }),
  };
  const call = (endpoint: { id: string }, input: unknown) => {
    calls.push({ id: endpoint.id, input });
    return answers[endpoint.id]?.() ?? of();
  };
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(ordersFeature),
      provideEffects(ordersEffects),
      OrderCards,
      { provide: ApiClient, useValue: { call } },
      { provide: LiveEvents, useValue: { changes: () => of() } },
    ],
  });
  const store = TestBed.inject(Store);
  store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
  const cards = TestBed.inject(OrderCards);
  TestBed.tick();
  return { cards, store };
}
const inputsOf = ({ id }: { id: string }) => calls.filter((call) => call.id === id).map(({ input }) => input);

describe('the card of an open order', () => {
  it.each(['declined', 'failed', 'released', null])('may be another one when the last one is %s', (state) => {
    const { cards } = open(order(state));
    expect(cards.mayTry()).toBe(true);
    expect(cards.cards()).toEqual([visa]);
  });

  it.each([
    ['is still asked', order('started')],
    ['is held', order('pre-authorised', { stage: 'confirmed', waitingFor: [] })],
    ['is not how it is paid', order(null, { settlement: 'account', waitingFor: ['credit'] })],
    ['belongs to a cancelled order', order('released', { stage: 'cancelled', waitingFor: [] })],
  ])('stays when it %s, and no card is fetched', (_, shown) => {
    const { cards } = open(shown);
    expect(cards.mayTry()).toBe(false);
    expect(inputsOf(listCards)).toEqual([]);
  });

  it('is asked for at the version that is shown, and can’t be changed until the bank has answered', () => {
    const { cards } = open(order('declined'));
    expect(cards.declineCode()).toBe('insufficient_funds');
    cards.payWith('visa');
    expect(inputsOf({ id: PAY_WITH })).toEqual([{ params: { orderId: 'a' }, ifMatch: 4, body: { cardId: 'visa' } }]);
    expect(cards.mayTry()).toBe(false);
  });

  it('leads to the bank when that asks its holder', () => {
    const { cards } = open(order('needs-action'));
    expect(inputsOf(listPayments)).toEqual([{ query: { orderId: 'a', limit: 1 } }]);
    expect(cards.confirmAt()).toBe(bank);
    expect(cards.mayTry()).toBe(false);
  });

  it('leads nowhere when the payment can’t be fetched', () => {
    const { cards, store } = open(order('started'));
    answers[GET_ORDER] = () => of(order('needs-action'));
    answers[listPayments.id] = () => throwError(() => new Error('offline'));
    store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
    TestBed.tick();
    expect(inputsOf(listPayments)).toHaveLength(1);
    expect(cards.confirmAt()).toBe('');
  });
});
