import * as z from 'zod';
import { addSynonym, listSynonyms, removeSynonym, type SynonymWire } from '@seamwright/catalogue/contracts';
import { plainWords } from '@seamwright/catalogue/domain';
import { id } from '@seamwright/shared/contracts';
import {
  implement,
  implementOnce,
  inTransaction,
  notFound,
  pageFrom,
  readCursor,
  type Implementation,
} from '@seamwright/shared/server';
import { addSynonym as add, removeSynonym as remove } from './keep-synonyms';
import { listSynonyms as list, synonymById, type Synonym } from './synonyms.repository';

const present = ({ plain: _plain, createdAt, ...synonym }: Synonym): SynonymWire => ({
  ...synonym,
  createdAt: createdAt.toISOString(),
});

export const synonymImplementations: readonly Implementation[] = [
  implement(listSynonyms, ({ database, caller }, { query: { cursor, limit, q, nodeId, specificationId } }) =>
    inTransaction(database, caller, async (tx) => {
      const after = cursor ? readCursor(cursor, z.tuple([z.string(), id])) : null;
      const found = await list(tx, { q: q && plainWords(q), nodeId, specificationId, after, limit });
      return pageFrom(found, limit, (synonym) => [synonym.plain, synonym.id], present);
    }),
  ),
  implementOnce(addSynonym, {
    make: (tx, { now }, { body }) => add(tx, { now, added: body }),
    present: async (tx, _, synonymId) => {
      const synonym = await synonymById(tx, synonymId);
      if (!synonym) throw notFound();
      return present(synonym);
    },
  }),
  implement(removeSynonym, ({ database, caller }, { params }) =>
    inTransaction(database, caller, async (tx) => {
      await remove(tx, params.id);
      return undefined;
    }),
  ),
];
