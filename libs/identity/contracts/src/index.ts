export {
  changePassword,
  endSession,
  getMe,
  listSessions,
  me,
  openSession,
  renameMe,
  signOutEverywhere,
  type Me,
  type OpenSession,
} from './account.endpoints';
export {
  addSite,
  createCustomer,
  customer,
  customerFacts,
  getCustomer,
  listCustomers,
  listSites,
  site,
  siteFacts,
  updateCustomer,
  updateSite,
  type CustomerFacts,
  type CustomerView,
  type SiteFacts,
  type SiteView,
} from './customers.endpoints';
export { createGroup, group, listGroups, type GroupView } from './groups.endpoints';
export { acceptInvitation, forgotPassword, resetPassword, type UsedLink } from './links.endpoints';
export {
  endPersonSessions,
  getPerson,
  invitePerson,
  listPeople,
  person,
  reInvitePerson,
  updatePerson,
  type PersonView,
} from './people.endpoints';
export {
  refreshSession,
  signIn,
  signOut,
  type Refreshed,
  type SessionPerson,
  type SignedIn,
} from './session.endpoints';
