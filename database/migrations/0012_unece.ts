import { audited, type Migration } from '../migration';
import { UNECE_START_VALUES } from '../reference/unece-field-values';

const START = `'${JSON.stringify(UNECE_START_VALUES).replaceAll("'", "''")}'`;

/**
 * What the fields of the 20-digit UNECE meat code can hold, as rows that an administrator completes and corrects, since
 * the standards could be read in part only; and what an author chose of them for a version.
 */
export const unece: Migration = {
  name: '0012_unece',
  sql: `
    create table unece_field_values (
      id uuid primary key,
      row_version integer not null default 1,
      field text not null constraint unece_field_values_field check (field in (
        'species', 'item', 'unused', 'refrigeration', 'category', 'production', 'feeding', 'slaughter', 'postSlaughter',
        'fatThickness', 'quality', 'weightRange', 'packing', 'conformity'
      )),
      value text not null constraint unece_field_values_digits check (value ~ '^[0-9]{1,4}$'),
      meaning text not null,
      -- Null for all species; of the field 'species', the house's species that the value stands for.
      species text constraint unece_field_values_species check (species in ('lamb', 'beef', 'pork')),
      -- Whether it was read in a standard; else it is from memory.
      seen boolean not null,
      source text,
      constraint unece_field_values_seen check (not seen or source is not null),
      constraint unece_field_values_once unique nulls not distinct (field, value, species)
    );
    create unique index unece_field_values_house_species on unece_field_values (species) where field = 'species';
    insert into unece_field_values (id, field, value, meaning, species, seen, source)
      select gen_random_uuid(), field, value, meaning, species, seen, source
      from jsonb_to_recordset(${START}::jsonb)
        as start (field text, value text, meaning text, species text, seen boolean, source text);
    ${audited('unece_field_values')}

    -- What is left out of the record is written as zeros in the code: {category?, production?, …, conformity?}.
    alter table specification_versions add column unece_fields jsonb not null default '{}';
  `,
};
