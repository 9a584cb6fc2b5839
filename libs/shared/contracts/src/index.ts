export {
  anyone,
  defineEndpoint,
  ownCustomer,
  staffOnly,
  type Access,
  type Answer,
  type AnyEndpoint,
  type CallAddress,
  type CallInput,
  type CheckedInput,
  type Endpoint,
  type Method,
} from './endpoint';
export { hasWords, sayRefusal } from './messages/messages';
export { PROBLEM_MEDIA_TYPE, problem, type Problem } from './problem';
export { BUYER_ROLES, ROLES, STAFF_ROLES, isBuyerRole, type Role } from './roles';
export {
  currency,
  email,
  gramsWire,
  id,
  instant,
  line,
  minor,
  note,
  pageOf,
  pageQuery,
  plantDay,
  ppmWire,
  rowVersion,
} from './wire';
export { MOST_IMPORT_BYTES, WORKBOOK_MEDIA_TYPE } from './workbook';
