import * as contracts from '@seamwright/identity/contracts';
import {
  implement,
  implementOnce,
  inTransaction,
  pageFrom,
  readCursor,
  type Caller,
  type Implementation,
} from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { namePlace } from '../name-place';
import type { IdentityParts } from '../identity-parts';
import { endSessionsOfCustomer } from '../session/sessions.repository';
import {
  changeCustomer,
  createCustomer,
  createGroup,
  customerById,
  customerGroups,
  customerOf,
  customersPage,
  groupById,
} from './customers.repository';
import { addSite, changeSite, siteById, siteByItsId, sitesOf } from './sites.repository';

export const customersRouter = (parts: IdentityParts): Implementation[] => [
  implement(contracts.listCustomers, async ({ database, caller }, { query: { cursor, limit, q, kind } }) => {
    const after = cursor ? readCursor(cursor, namePlace) : null;
    const rows = await inTransaction(database, caller, (tx) => customersPage(tx, { q, kind, after, limit }));
    return pageFrom(rows, limit, ({ sortName, id }) => [sortName, id], customerOf);
  }),

  implement(contracts.getCustomer, ({ database, caller }, { params }) =>
    inTransaction(database, caller, (tx) => customerById(tx, params.customerId)),
  ),

  implementOnce(contracts.createCustomer, {
    make: (tx, { now }, { body }) => createCustomer(tx, now, body),
    present: (tx, _context, id) => customerById(tx, id),
  }),

  implement(contracts.updateCustomer, async ({ database, caller, ifMatch }, { params: { customerId }, body }) => {
    const realNow = await parts.clock.now();
    return inTransaction(database, caller, async (tx) => {
      await customerById(tx, customerId);
      await changeCustomer(tx, customerId, ifMatch, body);
      if (!body.active) await endSessionsOfCustomer(tx, realNow, customerId);
      return customerById(tx, customerId);
    });
  }),

  implement(contracts.listSites, ({ database, caller }, { params: { customerId } }) =>
    inTransaction(database, caller, async (tx) => {
      await customerById(tx, customerId);
      return { items: await sitesOf(tx, customerId) };
    }),
  ),

  implementOnce(contracts.addSite, {
    async make(tx, { caller }, { params: { customerId }, body }) {
      await customerById(tx, customerId);
      if (isKeptToSites(caller)) throw new RefusalError({ code: 'not-allowed', params: {} });
      return addSite(tx, customerId, body);
    },
    present: (tx, _context, id) => siteByItsId(tx, id),
  }),

  implement(contracts.updateSite, ({ database, caller, ifMatch }, { params: { customerId, siteId }, body }) =>
    inTransaction(database, caller, async (tx) => {
      await siteById(tx, customerId, siteId);
      await changeSite(tx, customerId, siteId, ifMatch, body);
      return siteById(tx, customerId, siteId);
    }),
  ),

  implement(contracts.listGroups, ({ database, caller }) =>
    inTransaction(database, caller, async (tx) => ({ items: await customerGroups(tx) })),
  ),

  implementOnce(contracts.createGroup, {
    make: (tx, _context, { body }) => createGroup(tx, body.name),
    present: (tx, _context, id) => groupById(tx, id),
  }),
];

/** A new site would lie outside what such a caller acts for. */
const isKeptToSites = (caller: Caller): boolean => caller.kind === 'user' && caller.sites !== '*';
