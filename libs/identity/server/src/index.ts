export {
  createCustomer,
  createGroup,
  customerById,
  customersByNames,
  type CustomerRecord,
} from './customers/customers.repository';
export { addSite, siteById, sitesOf } from './customers/sites.repository';
export { identityImplementations } from './implementations';
export type { IdentityParts } from './identity-parts';
export { hashPassword } from './passwords';
export {
  personById,
  setPasswordHash,
  staffWithRole,
  type NewPerson,
  type PersonRecord,
} from './people/people.repository';
export { buyersOf, type Addressee } from './people/buyers.repository';
export { addPerson } from './people/invite-person';
export { tidyIdentity } from './tidy-identity';
export { authenticateBearer } from './tokens/authenticate-bearer';
