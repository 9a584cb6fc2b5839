import * as contracts from '@seamwright/catalogue/contracts';
import { implement, implementOnce, inTransaction, type Implementation } from '@seamwright/shared/server';
import { readCutOut } from './read-cut-out';
import { listNewestSchemes, readScheme } from './read-schemes';
import { createScheme, moveScheme, saveSchemeDraft } from './write-scheme';
import { schemeCodeOf } from './schemes.repository';

export const schemeImplementations: readonly Implementation[] = [
  implement(contracts.listSchemes, ({ database, caller }, { query }) =>
    inTransaction(database, caller, (tx) => listNewestSchemes(tx, query)),
  ),
  implement(contracts.getScheme, ({ database, caller }, { params, query }) =>
    inTransaction(database, caller, (tx) => readScheme(tx, params.code, query.version)),
  ),
  implementOnce(contracts.createScheme, {
    make: (tx, { now, caller }, { body }) => createScheme(tx, { now, caller }, body),
    present: async (tx, _context, id) => readScheme(tx, await schemeCodeOf(tx, id)),
  }),
  implement(contracts.saveSchemeDraft, ({ database, caller, now, ifMatch }, { params: { code }, body }) =>
    inTransaction(database, caller, async (tx) => {
      await saveSchemeDraft(tx, { now, caller }, { code, content: body, rowVersion: ifMatch });
      return readScheme(tx, code);
    }),
  ),
  implement(contracts.moveScheme, ({ database, caller, now, ifMatch }, { params: { code }, body }) =>
    inTransaction(database, caller, async (tx) => {
      await moveScheme(tx, { now, caller }, { code, ...body, rowVersion: ifMatch });
      return readScheme(tx, code);
    }),
  ),
  implement(contracts.getCutOut, ({ database, caller }, { params, query }) =>
    inTransaction(database, caller, (tx) =>
      readCutOut(tx, { ...params, grams: query.grams, through: query.through?.split(',') ?? [] }),
    ),
  ),
];
