import { createFeature, createReducer, createSelector, on } from '@ngrx/store';
import type { Problem, Role } from '@seamwright/shared/contracts';
import type { SessionPerson } from '@seamwright/identity/contracts/session';
import { SessionActions, SessionApiActions } from './session.actions';

export interface SessionState {
  /** Unknown until the application's start has asked. */
  readonly status: 'unknown' | 'signed-in' | 'signed-out';
  readonly person: SessionPerson | null;
  /** Whoever was signed in last in this tab. */
  readonly lastPersonId: string | null;
  readonly submitting: boolean;
  readonly problem: Problem | null;
  /** Whether the sign-in ended by itself, so that the page can say so. */
  readonly ended: boolean;
}

const initial: SessionState = {
  status: 'unknown',
  person: null,
  lastPersonId: null,
  submitting: false,
  problem: null,
  ended: false,
};

const known = (state: SessionState, person: SessionPerson): SessionState => ({
  ...initial,
  status: 'signed-in',
  person,
  lastPersonId: state.lastPersonId ?? person.id,
});

export const sessionFeature = createFeature({
  name: 'session',
  reducer: createReducer(
    initial,
    on(SessionApiActions.restored, (state, { person }): SessionState =>
      person ? known(state, person) : { ...state, status: 'signed-out' },
    ),
    on(SessionApiActions.restoreFailed, (state, { problem }): SessionState => ({
      ...state,
      status: 'signed-out',
      problem,
    })),
    on(SessionActions.signInOpened, (state): SessionState => ({ ...state, submitting: false })),
    on(SessionActions.signInSubmitted, (state): SessionState => ({ ...state, submitting: true, problem: null })),
    on(SessionApiActions.signInRefused, (state, { problem }): SessionState => ({
      ...state,
      submitting: false,
      problem,
    })),
    on(SessionApiActions.signedIn, SessionApiActions.renewed, (state, { person }): SessionState =>
      known(state, person),
    ),
    on(SessionApiActions.ended, (state): SessionState =>
      state.status === 'signed-in' ? { ...state, status: 'signed-out', person: null, ended: true } : state,
    ),
    on(SessionApiActions.signedOut, (): SessionState => ({ ...initial, status: 'signed-out' })),
    on(SessionApiActions.signOutFailed, (state, { problem }): SessionState => ({ ...state, problem })),
    on(SessionActions.renamed, (state, { name }): SessionState =>
      state.person ? { ...state, person: { ...state.person, name } } : state,
    ),
  ),
});

const NOBODY: readonly Role[] = [];

export const { selectPerson, selectStatus, selectLastPersonId } = sessionFeature;
export const selectRoles = createSelector(selectPerson, (person): readonly Role[] => person?.roles ?? NOBODY);
export const selectCustomerId = createSelector(selectPerson, (person) => person?.customerId ?? null);

/** What the sign-in page shows. */
export const selectSignIn = createSelector(sessionFeature.selectSessionState, ({ submitting, problem, ended }) => ({
  submitting,
  problem,
  ended,
}));
