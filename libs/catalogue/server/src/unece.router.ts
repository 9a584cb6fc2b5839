import * as z from 'zod';
import { addUneceValue, correctUneceValue, listUneceValues, readUnece } from '@seamwright/catalogue/contracts';
import { readUneceCode } from '@seamwright/catalogue/domain';
import {
  implement,
  implementOnce,
  inTransaction,
  notFound,
  pageFrom,
  ProblemError,
  readCursor,
  type Implementation,
} from '@seamwright/shared/server';
import { addUneceFieldValue, correctUneceFieldValue } from './keep-unece-values';
import { presentUneceReading, saidFaults } from './unece.presenter';
import {
  listUneceValues as listValues,
  uneceFieldValues,
  uneceValueById,
  uneceValuePlace,
} from './unece-values.repository';

/** Where a page of values ends: the field's number, the value and its species, empty for all. */
const valuePlace = z.tuple([z.int().min(1).max(99), z.string(), z.string()]);

export const uneceImplementations: readonly Implementation[] = [
  implement(listUneceValues, ({ database, caller }, { query: { cursor, limit, field } }) =>
    inTransaction(database, caller, async (tx) => {
      const after = cursor ? readCursor(cursor, valuePlace) : null;
      return pageFrom(await listValues(tx, { field, after, limit }), limit, uneceValuePlace, (value) => value);
    }),
  ),
  implementOnce(addUneceValue, {
    make: (tx, _, { body }) => addUneceFieldValue(tx, body),
    present: async (tx, _, id) => {
      const value = await uneceValueById(tx, id);
      if (!value) throw notFound();
      return value;
    },
  }),
  implement(correctUneceValue, ({ database, caller, ifMatch }, { params, body }) =>
    inTransaction(database, caller, (tx) =>
      correctUneceFieldValue(tx, { id: params.id, rowVersion: ifMatch, change: body }),
    ),
  ),
  implement(readUnece, ({ database, caller }, { query }) =>
    inTransaction(database, caller, async (tx) => {
      const reading = readUneceCode(query.code, await uneceFieldValues(tx));
      if (!reading.ok) throw new ProblemError(422, { code: 'invalid', params: {} }, saidFaults(reading.refusal));
      return presentUneceReading(reading.value);
    }),
  ),
];
