import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import { BasketActions, BasketStorageActions } from './basket.actions';
import { emptyDraft, withLine, type BasketDraft } from './basket-draft';

export interface BasketState {
  /** Whose basket it is; null while nobody is signed in. */
  readonly owner: string | null;
  readonly draft: BasketDraft;
}

const initial: BasketState = { owner: null, draft: emptyDraft('') };

const changed = (state: BasketState, key: string, change: Partial<BasketDraft>): BasketState => ({
  ...state,
  draft: { ...state.draft, ...change, key },
});

/** What is going to be ordered: a long-lived draft that outlives pages, reloads and sign-outs. */
export const basketFeature = createFeature({
  name: 'basket',
  reducer: createReducer(
    initial,
    on(BasketStorageActions.restored, (_state, { owner, draft }): BasketState => ({ owner, draft })),
    on(BasketStorageActions.putAway, (): BasketState => initial),
    on(BasketActions.lineAdded, (state, { line, key }) =>
      changed(state, key, { lines: withLine(state.draft.lines, line) }),
    ),
    on(BasketActions.lineChanged, (state, { lineId, change, key }) =>
      changed(state, key, {
        lines: state.draft.lines.map((line) => (line.id === lineId ? { ...line, ...change } : line)),
      }),
    ),
    on(BasketActions.lineRemoved, (state, { lineId, key }) =>
      changed(state, key, { lines: state.draft.lines.filter(({ id }) => id !== lineId) }),
    ),
    on(BasketActions.linePutBack, (state, { line, at, key }) => {
      const { lines } = state.draft;
      return changed(state, key, { lines: [...lines.slice(0, at), line, ...lines.slice(at)] });
    }),
    on(BasketActions.detailsChanged, (state, { details, key }) => changed(state, key, details)),
    // Site and settlement are as usual next time; the day, the reference and the note were this order's.
    on(BasketActions.emptied, (state, { key }): BasketState => {
      const { siteId, settlement, cardId } = state.draft;
      return { ...state, draft: { ...emptyDraft(key), siteId, settlement, cardId } };
    }),
  ),
  extraSelectors: ({ selectDraft }) => {
    const selectLines = createSelector(selectDraft, ({ lines }) => lines);
    return { selectLines, selectCount: createSelector(selectLines, (lines) => lines.length) };
  },
});
