import { sql } from 'kysely';
import { UNECE_FIELDS, type Species, type UneceField, type UneceFieldValue } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

/** A kept value of a field of the UNECE code. */
export interface KeptUneceValue extends UneceFieldValue {
  readonly id: string;
  readonly rowVersion: number;
}

const kept = (tx: Tx) =>
  tx
    .selectFrom('uneceFieldValues')
    .select(['id', 'rowVersion', 'field', 'value', 'meaning', 'species', 'seen', 'source']);

type Row = Awaited<ReturnType<ReturnType<typeof kept>['executeTakeFirstOrThrow']>>;

const valueOf = (row: Row): KeptUneceValue => ({
  ...row,
  field: row.field as UneceField,
  species: row.species as Species | null,
});

/** Every value of every field. */
export async function uneceFieldValues(tx: Tx): Promise<KeptUneceValue[]> {
  return (await kept(tx).execute()).map(valueOf);
}

/** In the order of the code, then by value and species, those for all species first. */
const placeOf = sql`(array_position(${UNECE_FIELDS}::text[], field), value, coalesce(species, ''))`;

export type UneceValuePlace = readonly [number: number, value: string, species: string];

export const uneceValuePlace = ({ field, value, species }: UneceFieldValue): UneceValuePlace => [
  UNECE_FIELDS.indexOf(field) + 1,
  value,
  species ?? '',
];

/** A page of values, one more than `limit`. */
export async function listUneceValues(
  tx: Tx,
  wanted: { field: UneceField | undefined; after: UneceValuePlace | null; limit: number },
): Promise<KeptUneceValue[]> {
  const { field, after, limit } = wanted;
  let query = kept(tx);
  if (field) query = query.where('field', '=', field);
  if (after)
    query = query.where(sql<boolean>`${placeOf} > (${after[0]}::integer, ${after[1]}::text, ${after[2]}::text)`);
  const rows = await query
    .orderBy(placeOf)
    .limit(limit + 1)
    .execute();
  return rows.map(valueOf);
}

export async function uneceValueById(tx: Tx, id: string): Promise<KeptUneceValue | null> {
  const row = await kept(tx).where('id', '=', id).executeTakeFirst();
  return row ? valueOf(row) : null;
}

export async function insertUneceValue(tx: Tx, value: Omit<KeptUneceValue, 'rowVersion'>): Promise<void> {
  await tx.insertInto('uneceFieldValues').values(value).execute();
}

/** Changes a value that still has the row version that was read; false when somebody was quicker. */
export async function changeUneceValue(
  tx: Tx,
  { id, rowVersion }: Pick<KeptUneceValue, 'id' | 'rowVersion'>,
  change: Pick<UneceFieldValue, 'meaning' | 'seen' | 'source'>,
): Promise<boolean> {
  const { numUpdatedRows } = await tx
    .updateTable('uneceFieldValues')
    .set({ ...change, rowVersion: rowVersion + 1 })
    .where('id', '=', id)
    .where('rowVersion', '=', rowVersion)
    .executeTakeFirst();
  return numUpdatedRows === 1n;
}
