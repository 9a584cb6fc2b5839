import * as z from 'zod';
import {
  BUYER_ROLES,
  defineEndpoint,
  email,
  id,
  line,
  note,
  ownCustomer,
  pageOf,
  pageQuery,
  rowVersion,
  STAFF_ROLES,
  staffOnly,
} from '@seamwright/shared/contracts';
import { CUSTOMER_KINDS, TERMS_FROM } from '@seamwright/identity/domain';

/** Who opens accounts and sets their terms. */
const keepers = ['admin', 'accounts'] as const;

const facts = {
  name: line(120),
  kind: z.enum(CUSTOMER_KINDS),
  groupId: id.nullable(),
  invoiceEmail: email,
  billingAddress: note(500).min(1),
  vatNumber: line(20).nullable(),
  termsDays: z.int().min(0).max(120),
  termsFrom: z.enum(TERMS_FROM),
};
export const customerFacts = z.strictObject(facts);
export type CustomerFacts = z.infer<typeof customerFacts>;

export const customer = z.strictObject({
  id,
  rowVersion,
  number: z.int(),
  ...facts,
  groupName: z.string().nullable(),
  active: z.boolean(),
});
export type CustomerView = z.infer<typeof customer>;

export const listCustomers = defineEndpoint({
  id: 'customers.list',
  summary: 'Customers by name',
  method: 'GET',
  path: '/customers',
  access: ownCustomer(...STAFF_ROLES),
  query: {
    ...pageQuery,
    q: z.string().trim().max(120).optional(),
    kind: z.enum(CUSTOMER_KINDS).optional(),
  },
  response: pageOf(customer),
});

export const getCustomer = defineEndpoint({
  id: 'customers.get',
  summary: 'One customer',
  method: 'GET',
  path: '/customers/:customerId',
  access: ownCustomer(...BUYER_ROLES, ...STAFF_ROLES),
  params: { customerId: id },
  response: customer,
});

export const createCustomer = defineEndpoint({
  id: 'customers.create',
  summary: 'Open an account',
  method: 'POST',
  path: '/customers',
  access: staffOnly(...keepers),
  idempotent: true,
  body: customerFacts,
  response: customer,
  status: 201,
});

export const updateCustomer = defineEndpoint({
  id: 'customers.update',
  summary: 'Change a customer; one that is not active can’t sign in or order',
  method: 'PUT',
  path: '/customers/:customerId',
  access: ownCustomer(...keepers),
  guarded: true,
  params: { customerId: id },
  body: customerFacts.extend({ active: z.boolean() }),
  response: customer,
});

const siteFactsShape = {
  name: line(120),
  address: note(500).min(1),
  postcode: line(12),
  contactName: line(120).nullable(),
  phone: line(30).nullable(),
  accessNotes: note(1000).nullable(),
};
export const siteFacts = z.strictObject(siteFactsShape);
export type SiteFacts = z.infer<typeof siteFacts>;

export const site = z.strictObject({ id, rowVersion, customerId: id, ...siteFactsShape, active: z.boolean() });
export type SiteView = z.infer<typeof site>;

/** Whoever may add and change the places that a customer is delivered to. */
const siteKeepers = ownCustomer('buyer_owner', 'rep', ...keepers);

export const listSites = defineEndpoint({
  id: 'customers.sites',
  summary: 'The sites of a customer that the caller acts for, by name',
  method: 'GET',
  path: '/customers/:customerId/sites',
  access: ownCustomer(...BUYER_ROLES, ...STAFF_ROLES),
  params: { customerId: id },
  response: z.strictObject({ items: z.array(site) }),
});

export const addSite = defineEndpoint({
  id: 'customers.add-site',
  summary: 'Add a place to deliver to',
  method: 'POST',
  path: '/customers/:customerId/sites',
  access: siteKeepers,
  idempotent: true,
  params: { customerId: id },
  body: siteFacts,
  response: site,
  status: 201,
});

export const updateSite = defineEndpoint({
  id: 'customers.update-site',
  summary: 'Change a place to deliver to',
  method: 'PUT',
  path: '/customers/:customerId/sites/:siteId',
  access: siteKeepers,
  guarded: true,
  params: { customerId: id, siteId: id },
  body: siteFacts.extend({ active: z.boolean() }),
  response: site,
});
