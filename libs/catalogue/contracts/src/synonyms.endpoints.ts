import * as z from 'zod';
import { defineEndpoint, id, instant, line, pageOf, pageQuery, staffOnly } from '@seamwright/shared/contracts';

const readers = staffOnly('technical', 'rep', 'planner', 'admin');
const keepers = staffOnly('technical', 'admin');

/** Another name of a cut or a specification; null as region where it is said everywhere. */
export const synonymWire = z.strictObject({
  id,
  nodeId: id.nullable(),
  specificationId: id.nullable(),
  /** What it is a name of. */
  ofName: z.string(),
  term: z.string(),
  region: z.string().nullable(),
  createdAt: instant,
});
export type SynonymWire = z.infer<typeof synonymWire>;

export const listSynonyms = defineEndpoint({
  id: 'synonyms.list',
  summary: 'What else the trade calls cuts and specifications, by name and region',
  method: 'GET',
  path: '/cut-synonyms',
  access: readers,
  query: {
    ...pageQuery,
    q: z.string().trim().max(100).optional(),
    nodeId: id.optional(),
    specificationId: id.optional(),
  },
  response: pageOf(synonymWire),
});

export const addSynonym = defineEndpoint({
  id: 'synonyms.add',
  summary: 'Adds a name by which a cut with all that is made of it, or one specification, is found',
  method: 'POST',
  path: '/cut-synonyms',
  access: keepers,
  body: z
    .strictObject({
      nodeId: id.nullable(),
      specificationId: id.nullable(),
      term: line(60),
      region: line(60).nullable(),
    })
    .refine(({ nodeId, specificationId }) => (nodeId === null) !== (specificationId === null), {
      message: 'Name either a cut or a specification.',
    }),
  response: synonymWire,
  status: 201,
  idempotent: true,
});

export const removeSynonym = defineEndpoint({
  id: 'synonyms.remove',
  summary: 'Takes a name away: it finds nothing any more',
  method: 'DELETE',
  path: '/cut-synonyms/:id',
  access: keepers,
  params: { id },
});
