// What an application's first load needs to sign somebody in: addresses and types. It stands apart from
// `identity/contracts`, so that the shells load neither zod nor what only pages of customers and people use.
export { refreshAddress, signInAddress, signOutAddress } from '../../src/session.addresses';
export type { refreshSession, Refreshed, SessionPerson, signIn, signOut, SignedIn } from '../../src/session.endpoints';
