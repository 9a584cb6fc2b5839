import * as z from 'zod';
import { SPECIES, UNECE_FIELDS } from '@seamwright/catalogue/domain';
import { defineEndpoint, id, line, pageOf, pageQuery, staffOnly } from '@seamwright/shared/contracts';
import { uneceReading, uneceValueWire } from './unece.wire';

const readers = staffOnly('technical', 'rep', 'planner', 'admin');
const keepers = staffOnly('admin');
/** Where it was read; without one it is from memory, and is shown as such. */
const source = line(200).nullable();
const meaning = line(200);

export const listUneceValues = defineEndpoint({
  id: 'unece.values',
  summary: 'The values of the fields of the UNECE code, field by field, with where each was read',
  method: 'GET',
  path: '/unece-values',
  access: readers,
  query: { ...pageQuery, field: z.enum(UNECE_FIELDS).optional() },
  response: pageOf(uneceValueWire),
});

export const addUneceValue = defineEndpoint({
  id: 'unece.add-value',
  summary: 'Completes the list of a field of the UNECE code by a value',
  method: 'POST',
  path: '/unece-values',
  access: keepers,
  body: z.strictObject({
    field: z.enum(UNECE_FIELDS),
    value: z.string().max(8),
    meaning,
    species: z.enum(SPECIES).nullable(),
    source,
  }),
  response: uneceValueWire,
  status: 201,
  idempotent: true,
});

export const correctUneceValue = defineEndpoint({
  id: 'unece.correct-value',
  summary: 'Corrects what a value of a field stands for; with a source it is no longer from memory',
  method: 'PUT',
  path: '/unece-values/:id',
  access: keepers,
  params: { id },
  body: z.strictObject({ meaning, source }),
  response: uneceValueWire,
  guarded: true,
});

export const readUnece = defineEndpoint({
  id: 'unece.read',
  summary: 'Reads a UNECE code field by field, or refuses it by field',
  method: 'GET',
  path: '/unece-reading',
  access: readers,
  query: { code: line(60) },
  response: uneceReading,
});
