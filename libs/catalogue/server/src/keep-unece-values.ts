import type { addUneceValue, correctUneceValue } from '@seamwright/catalogue/contracts';
import { fillsUneceField, UNECE_LAYOUT } from '@seamwright/catalogue/domain';
import type { CheckedInput } from '@seamwright/shared/contracts';
import { notFound, stale, violates, type Tx } from '@seamwright/shared/server';
import { newId, RefusalError, type Refusal } from '@seamwright/shared/util';
import { changeUneceValue, insertUneceValue, uneceValueById, type KeptUneceValue } from './unece-values.repository';

const refused = (code: string, pointer: string, params: Refusal['params'] = {}) =>
  new RefusalError({ code, params, pointer });

/**
 * Completes a field's list and gives the new value's id. Refuses with `unece-field-digits`, `unece-value-taken` or, for
 * the species of the house, `unece-species-taken`.
 */
export async function addUneceFieldValue(tx: Tx, added: CheckedInput<typeof addUneceValue>['body']): Promise<string> {
  if (!fillsUneceField(added.field, added.value)) {
    const { number = 0, digits = 0 } = UNECE_LAYOUT.find(({ field }) => field === added.field) ?? {};
    throw refused('unece-field-digits', '/value', { number, digits });
  }
  const id = newId();
  try {
    await insertUneceValue(tx, { ...added, id, seen: added.source !== null });
  } catch (error) {
    if (violates(error, 'unece_field_values_once')) throw refused('unece-value-taken', '/value');
    if (violates(error, 'unece_field_values_house_species')) throw refused('unece-species-taken', '/species');
    throw error;
  }
  return id;
}

interface Correction {
  readonly id: string;
  /** The row version that was read. */
  readonly rowVersion: number;
  readonly change: CheckedInput<typeof correctUneceValue>['body'];
}

/** Corrects a meaning: with a source it counts as seen, without one as from memory. */
export async function correctUneceFieldValue(tx: Tx, { id, rowVersion, change }: Correction): Promise<KeptUneceValue> {
  if (!(await uneceValueById(tx, id))) throw notFound();
  const changed = await changeUneceValue(tx, { id, rowVersion }, { ...change, seen: change.source !== null });
  const now = await uneceValueById(tx, id);
  if (!changed || !now) throw stale();
  return now;
}
