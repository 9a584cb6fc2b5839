import { searchSpecifications } from '@seamwright/catalogue/contracts';
import { implement, inTransaction, type Implementation } from '@seamwright/shared/server';
import { searchCatalogue, type SearchParts } from './search-catalogue';

export const searchImplementations = (parts: SearchParts): Implementation[] => [
  implement(searchSpecifications, ({ database, caller, now }, { query }) =>
    inTransaction(database, caller, (tx) => searchCatalogue(tx, parts, { now, caller, query })),
  ),
];
