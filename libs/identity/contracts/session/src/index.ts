// What an application's first load needs to sign somebody in. It stands apart from `identity/contracts`, so that the
// shells don't load what only pages of customers and people use.
export {
  refreshSession,
  signIn,
  signOut,
  type Refreshed,
  type SessionPerson,
  type SignedIn,
} from '../../src/session.endpoints';
