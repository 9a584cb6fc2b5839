import * as z from 'zod';
import {
  defineEndpoint,
  email,
  id,
  instant,
  line,
  ownCustomer,
  pageOf,
  pageQuery,
  rowVersion,
} from '@seamwright/shared/contracts';
import { reach, role } from './session.endpoints';

/** Administrators look after everybody, reps after buyers, account owners after their colleagues. */
const stewards = ownCustomer('admin', 'rep', 'buyer_owner');

export const person = z.strictObject({
  id,
  rowVersion,
  email: z.string(),
  name: z.string(),
  roles: z.array(role),
  customerId: id.nullable(),
  customerName: z.string().nullable(),
  sites: reach,
  customers: reach,
  state: z.enum(['invited', 'active', 'inactive']),
  lastSeenAt: instant.nullable(),
});
export type PersonView = z.infer<typeof person>;

const standing = {
  name: line(120),
  roles: z.array(role).min(1).max(8),
  sites: reach.default('*'),
  customers: reach.default('*'),
};

export const listPeople = defineEndpoint({
  id: 'people.list',
  summary: 'People by name: of one customer, staff, or everybody that the caller may see',
  method: 'GET',
  path: '/people',
  access: stewards,
  query: {
    ...pageQuery,
    customerId: id.optional(),
    who: z.enum(['staff', 'buyers']).optional(),
    q: z.string().trim().max(120).optional(),
  },
  response: pageOf(person),
});

export const getPerson = defineEndpoint({
  id: 'people.get',
  summary: 'One person',
  method: 'GET',
  path: '/people/:personId',
  access: stewards,
  params: { personId: id },
  response: person,
});

export const invitePerson = defineEndpoint({
  id: 'people.invite',
  summary: 'Invite somebody by mail; without a customer they become staff',
  method: 'POST',
  path: '/people',
  access: stewards,
  idempotent: true,
  body: z.strictObject({ email, customerId: id.nullable(), ...standing }),
  response: person,
  status: 201,
});

export const updatePerson = defineEndpoint({
  id: 'people.update',
  summary: 'Change a person’s name, roles, sites, customers, and whether they may sign in',
  method: 'PUT',
  path: '/people/:personId',
  access: stewards,
  guarded: true,
  params: { personId: id },
  body: z.strictObject({ ...standing, active: z.boolean() }),
  response: person,
});

export const reInvitePerson = defineEndpoint({
  id: 'people.re-invite',
  summary: 'Mail a new invitation; the older link stops working',
  method: 'POST',
  path: '/people/:personId/invitations',
  access: stewards,
  idempotent: true,
  params: { personId: id },
  response: person,
  status: 201,
});

export const endPersonSessions = defineEndpoint({
  id: 'people.end-sessions',
  summary: 'Sign a person out everywhere',
  method: 'POST',
  path: '/people/:personId/end-sessions',
  access: stewards,
  params: { personId: id },
});
