import type { Problem } from '@seamwright/shared/contracts';
import type { SessionPerson } from '@seamwright/identity/contracts/session';
import { SessionActions, SessionApiActions } from './session.actions';
import { selectCustomerId, selectRoles, sessionFeature } from './session.reducer';

const jo: SessionPerson = {
  id: '019af000-0000-7000-8000-000000000001',
  name: 'Jo Marsh',
  email: 'jo@anchor.example',
  roles: ['buyer'],
  customerId: '019af000-0000-7000-8000-000000000002',
  customerName: 'The Blue Anchor',
  sites: '*',
};
const problem: Problem = {
  type: '',
  title: '',
  status: 401,
  detail: 'No.',
  instance: '',
  code: 'sign-in-refused',
  errors: [],
};
const { reducer } = sessionFeature;
const after = (...actions: Parameters<typeof reducer>[1][]) =>
  actions.reduce(reducer, reducer(undefined, { type: '' }));

describe('the session', () => {
  it('is unknown until the start has asked', () => {
    expect(after().status).toBe('unknown');
    expect(after(SessionApiActions.restored({ person: null })).status).toBe('signed-out');
    expect(after(SessionApiActions.restored({ person: jo }))).toMatchObject({ status: 'signed-in', person: jo });
  });

  it('keeps the problem of a refused sign-in until the next try', () => {
    const submitted = SessionActions.signInSubmitted({ email: jo.email, password: 'x' });
    const refused = after(submitted, SessionApiActions.signInRefused({ problem }));
    expect(refused).toMatchObject({ submitting: false, problem });
    expect(reducer(refused, submitted)).toMatchObject({ submitting: true, problem: null });
  });

  it('says that it ended only when there was one, and remembers whose it was', () => {
    expect(after(SessionApiActions.restored({ person: null }), SessionApiActions.ended()).ended).toBe(false);
    expect(after(SessionApiActions.signedIn({ person: jo }), SessionApiActions.ended())).toMatchObject({
      status: 'signed-out',
      person: null,
      ended: true,
      lastPersonId: jo.id,
    });
  });

  it('forgets everything after signing out', () => {
    expect(after(SessionApiActions.signedIn({ person: jo }), SessionApiActions.signedOut())).toMatchObject({
      status: 'signed-out',
      ended: false,
      lastPersonId: null,
    });
  });

  it('keeps no password', () => {
    const state = after(SessionActions.signInSubmitted({ email: jo.email, password: 'boned and rolled' }));
    expect(JSON.stringify(state)).not.toContain('boned');
  });

  it('tells roles and customer, also of nobody', () => {
    const root = (session: ReturnType<typeof reducer>) => ({ session });
    expect(selectRoles(root(after()))).toEqual([]);
    expect(selectCustomerId(root(after(SessionApiActions.signedIn({ person: jo }))))).toBe(jo.customerId);
  });

  it('shows a changed name at once', () => {
    const renamed = after(SessionApiActions.signedIn({ person: jo }), SessionActions.renamed({ name: 'Joan Marsh' }));
    expect(renamed.person?.name).toBe('Joan Marsh');
  });
});
