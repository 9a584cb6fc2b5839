import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import { resolveOffer, type ChosenValues, type ResolvedOffer } from '@seamwright/catalogue/domain';
import { failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { offeredNumbers } from './offered-numbers';
import { SpecificationApiActions, SpecificationPageActions } from './specification.actions';

interface SpecificationState {
  readonly code: string;
  readonly specification: Remote<PublicSpecification>;
  readonly chosen: ChosenValues;
}

const initial: SpecificationState = { code: '', specification: idle(), chosen: {} };

const reducer = createReducer<SpecificationState>(
  initial,
  on(SpecificationPageActions.opened, (state, { code }) =>
    // Another specification: nothing of the one before may be taken for it.
    code === state.code
      ? { ...state, specification: loading(state.specification) }
      : { code, specification: loading(idle()), chosen: {} },
  ),
  on(SpecificationPageActions.tryAgainAsked, (state) => ({ ...state, specification: loading(state.specification) })),
  on(SpecificationPageActions.valueChosen, (state, { choice, value }) => ({
    ...state,
    chosen: { ...state.chosen, [choice]: value },
  })),
  on(SpecificationApiActions.loaded, (state, { specification }) => ({
    ...state,
    specification: loaded(specification),
    chosen: stillOffered(specification, state.chosen),
  })),
  on(SpecificationApiActions.loadFailed, (state, { problem }) => ({
    ...state,
    specification: failed(state.specification, problem),
  })),
);

/** A newer version may offer less: what it doesn't goes back to the usual value. */
function stillOffered({ choices }: PublicSpecification, chosen: ChosenValues): ChosenValues {
  return Object.fromEntries(
    Object.entries(chosen).filter(([key, value]) =>
      choices.some((choice) => choice.key === key && choice.values.some((offered) => offered.value === value)),
    ),
  );
}

/** The specification that is open, with what is chosen on it. */
export const specificationFeature = createFeature({
  name: 'specification',
  reducer,
  extraSelectors: ({ selectSpecification, selectChosen }) => {
    const selectOffer = createSelector(selectSpecification, ({ data }) => data && offeredNumbers(data));
    return {
      selectOffer,
      /** The version with its choices applied; null until loaded. */
      selectResolved: createSelector(selectOffer, selectChosen, (offer, chosen): ResolvedOffer | null => {
        const resolved = offer && resolveOffer(offer, chosen);
        return resolved?.ok ? resolved.value : null;
      }),
    };
  },
});
