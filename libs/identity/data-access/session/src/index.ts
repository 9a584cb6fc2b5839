// What an application's first load needs: who is signed in. It stands apart from `identity/data-access`, so that the
// shells don't load what only pages of customers and people use.
export { provideIdentity } from '../../src/session/provide-identity';
export { hasRole, signedIn, signedOut } from '../../src/session/session.guards';
export { SessionActions, SessionApiActions } from '../../src/session/session.actions';
export {
  selectCustomerId,
  selectPerson,
  selectRoles,
  selectSignIn,
  sessionFeature,
  type SessionState,
} from '../../src/session/session.reducer';
