import { createFeature, createReducer, on } from '@ngrx/store';
import type { CardWire } from '@seamwright/accounts/contracts';
import type { Problem } from '@seamwright/shared/contracts';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { CardsApiActions, CardsPageActions, type CardEntry } from './cards.actions';

interface CardDeed {
  readonly running: boolean;
  readonly problem: Problem | null;
}

export interface CardsState {
  readonly cards: Remote<readonly CardWire[]>;
  readonly entry: Remote<CardEntry>;
  readonly adding: CardDeed;
  readonly removing: CardDeed;
}

const still: CardDeed = { running: false, problem: null };
const running: CardDeed = { running: true, problem: null };

const initial: CardsState = { cards: idle(), entry: idle(), adding: still, removing: still };

/** The cards that the customer keeps, newest first, and how one is entered. */
export const cardsFeature = createFeature({
  name: 'cards',
  reducer: createReducer(
    initial,
    on(CardsPageActions.opened, (state): CardsState => ({
      cards: loading(state.cards),
      entry: loading(state.entry),
      adding: still,
      removing: still,
    })),
    on(CardsApiActions.loaded, (state, { items }): CardsState => ({ ...state, cards: loaded(items) })),
    on(CardsApiActions.failed, (state, { problem }): CardsState => ({ ...state, cards: failed(state.cards, problem) })),
    on(CardsApiActions.entryLoaded, (state, { entry }): CardsState => ({ ...state, entry: loaded(entry) })),
    on(CardsApiActions.entryFailed, (state, { problem }): CardsState => ({
      ...state,
      entry: failed(state.entry, problem),
    })),
    on(CardsPageActions.addOpened, (state): CardsState => ({ ...state, adding: still })),
    on(CardsPageActions.added, (state): CardsState => ({ ...state, adding: running })),
    on(CardsApiActions.kept, (state, { card }): CardsState => ({
      ...state,
      adding: still,
      cards: loaded([card, ...(state.cards.data ?? []).filter(({ id }) => id !== card.id)]),
    })),
    on(CardsApiActions.keepFailed, (state, { problem }): CardsState => ({
      ...state,
      adding: { running: false, problem },
    })),
    on(CardsPageActions.removed, (state): CardsState => ({ ...state, removing: running })),
    on(CardsApiActions.forgotten, (state, { cardId }): CardsState => ({
      ...state,
      removing: still,
      cards: loaded((state.cards.data ?? []).filter(({ id }) => id !== cardId)),
    })),
    on(CardsApiActions.forgetFailed, (state, { problem }): CardsState => ({
      ...state,
      removing: { running: false, problem },
    })),
  ),
});
