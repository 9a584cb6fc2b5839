import { plainWords } from '@seamwright/catalogue/domain';
import { notFound, violates, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { renameFindable } from './search-index.repository';
import { deleteSynonym, insertSynonym, synonymById } from './synonyms.repository';

/** A name of a cut or of one specification: exactly one of the two is named. */
export interface NewSynonym {
  readonly nodeId: string | null;
  readonly specificationId: string | null;
  readonly term: string;
  /** Null where it is said everywhere. */
  readonly region: string | null;
}

const refused = (code: string, pointer: string) => new RefusalError({ code, params: {}, pointer });

/**
 * Adds a name, by which the cut and all that is made of it are found from now on; gives its id. Refuses with
 * `synonym-empty`, `synonym-taken` or `synonym-of-nothing`.
 */
export async function addSynonym(tx: Tx, { now, added }: { now: Date; added: NewSynonym }): Promise<string> {
  const plain = plainWords(added.term);
  if (plain === '') throw refused('synonym-empty', '/term');
  const id = newId();
  try {
    await insertSynonym(tx, { ...added, id, plain, createdAt: now });
  } catch (error) {
    if (violates(error, 'cut_synonyms_once')) throw refused('synonym-taken', '/term');
    if (violates(error, 'cut_synonyms_node')) throw refused('synonym-of-nothing', '/nodeId');
    if (violates(error, 'cut_synonyms_specification')) throw refused('synonym-of-nothing', '/specificationId');
    throw error;
  }
  await renameFindable(tx, added);
  return id;
}

/** Takes a name away. */
export async function removeSynonym(tx: Tx, id: string): Promise<void> {
  const synonym = await synonymById(tx, id);
  if (!synonym) throw notFound();
  await deleteSynonym(tx, id);
  await renameFindable(tx, synonym);
}
