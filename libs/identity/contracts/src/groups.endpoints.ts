import * as z from 'zod';
import { defineEndpoint, id, line, STAFF_ROLES, staffOnly } from '@seamwright/shared/contracts';

export const group = z.strictObject({ id, name: z.string() });
export type GroupView = z.infer<typeof group>;

export const listGroups = defineEndpoint({
  id: 'groups.list',
  summary: 'Head offices that are billed for several customers, by name',
  method: 'GET',
  path: '/customer-groups',
  access: staffOnly(...STAFF_ROLES),
  response: z.strictObject({ items: z.array(group) }),
});

export const createGroup = defineEndpoint({
  id: 'groups.create',
  summary: 'Name a new group',
  method: 'POST',
  path: '/customer-groups',
  access: staffOnly('admin', 'accounts'),
  idempotent: true,
  body: z.strictObject({ name: line(120) }),
  response: group,
  status: 201,
});
