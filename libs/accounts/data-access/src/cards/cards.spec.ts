import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of, Subject, throwError, type Observable } from 'rxjs';
import { addCard, cardSettings, listCards, removeCard, type CardWire } from '@seamwright/accounts/contracts';
import { ApiClient, ApiProblem } from '@seamwright/shared/data-access';
import { CardsPageActions } from './cards.actions';
import { cardsEffects } from './cards.effects';
import { cardsFeature } from './cards.feature';

const card = (id: string): CardWire => ({ id, brand: 'visa', last4: '4242', expires: '08/29' });
const refusal = new ApiProblem({
  type: '',
  title: '',
  status: 422,
  detail: 'This card was refused.',
  instance: '',
  code: 'card-refused',
  errors: [],
});

let calls: { id: string; input: Record<string, unknown> }[];
let answers: Record<string, () => Observable<unknown>>;
let store: Store;
const state = () => store.selectSignal(cardsFeature.selectCardsState)();
const ids = () => state().cards.data?.map(({ id }) => id);

beforeEach(() => {
  calls = [];
  answers = {
    [listCards.id]: () => of({ items: [card('old')] }),
    [cardSettings.id]: () => of({ mode: 'demo', publishableKey: null }),
    [addCard.id]: () => of(card('new')),
    [removeCard.id]: () => of(undefined),
  };
  const call = (endpoint: { id: string }, input: Record<string, unknown>) => {
    calls.push({ id: endpoint.id, input });
    return answers[endpoint.id]?.() ?? of();
  };
  TestBed.configureTestingModule({
    providers: [
      provideStore(),
      provideState(cardsFeature),
      provideEffects(cardsEffects),
      { provide: ApiClient, useValue: { call } },
    ],
  });
  store = TestBed.inject(Store);
  store.dispatch(CardsPageActions.opened());
});

describe('kept cards', () => {
  it('come with how one is entered', () => {
    expect(ids()).toEqual(['old']);
    expect(state().entry.data).toEqual({ mode: 'demo', publishableKey: null });
  });

  it('are added once while an answer is awaited, newest first', () => {
    const answer = new Subject<CardWire>();
    answers[addCard.id] = () => answer;
    const added = CardsPageActions.added({ methodId: 'pm_card_visa', idempotencyKey: 'one' });
    store.dispatch(added);
    store.dispatch(added);
    expect(calls.filter(({ id }) => id === addCard.id)).toEqual([
      { id: addCard.id, input: { body: { methodId: 'pm_card_visa' }, idempotencyKey: 'one' } },
    ]);
    expect(state().adding.running).toBe(true);
    answer.next(card('new'));
    answer.complete();
    expect(ids()).toEqual(['new', 'old']);
    expect(state().adding.running).toBe(false);
  });

  it('say why one was refused, until it is tried again', () => {
    answers[addCard.id] = () => throwError(() => refusal);
    store.dispatch(CardsPageActions.added({ methodId: 'pm_card_visa_chargeDeclined', idempotencyKey: 'one' }));
    expect(state().adding).toMatchObject({ running: false, problem: { code: 'card-refused' } });
    expect(ids()).toEqual(['old']);
    store.dispatch(CardsPageActions.addOpened());
    expect(state().adding.problem).toBeNull();
  });

  it('are gone once they are forgotten, and stay when that failed', () => {
    answers[removeCard.id] = () => throwError(() => refusal);
    store.dispatch(CardsPageActions.removed({ cardId: 'old' }));
    expect(ids()).toEqual(['old']);
    expect(state().removing.problem?.code).toBe('card-refused');
    answers[removeCard.id] = () => of(undefined);
    store.dispatch(CardsPageActions.removed({ cardId: 'old' }));
    expect(ids()).toEqual([]);
  });
});
