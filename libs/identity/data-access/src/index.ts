export { AccountApi } from './account/account.api';
export { LinksApi } from './account/links.api';
export { CustomerPageActions, CustomersPageActions } from './customers/customers.actions';
export { CustomersApi } from './customers/customers.api';
export { customersFeature, selectCustomer, selectCustomersPage } from './customers/customers.reducer';
export { provideCustomers } from './customers/provide-customers';
export { SitesEditor } from './customers/sites-editor';
export { PeopleEditor, type PeopleScope, type PersonDone } from './people/people-editor';
export { PeopleApi, type NewInvitation, type PersonChange } from './people/people.api';
export { IDENTITY_APPLICATION } from './session/identity-application';
export { provideIdentity } from './session/provide-identity';
export { SessionActions, SessionApiActions } from './session/session.actions';
export { hasRole, signedIn, signedOut } from './session/session.guards';
export {
  selectCustomerId,
  selectPerson,
  selectRoles,
  selectSignIn,
  sessionFeature,
  type SessionState,
} from './session/session.reducer';
