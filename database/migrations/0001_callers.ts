import type { Migration } from '../migration';

/**
 * Who asks is set once per transaction (see inTransaction); policies read it through these functions.
 * No caller set means no rows.
 */
export const callers: Migration = {
  name: '0001_callers',
  sql: `
    create function caller_kind() returns text language sql stable parallel safe
      return coalesce(current_setting('seamwright.caller', true), '');

    create function caller_person() returns uuid language sql stable parallel safe
      return nullif(current_setting('seamwright.person_id', true), '')::uuid;

    create function caller_purpose() returns text language sql stable parallel safe
      return nullif(current_setting('seamwright.purpose', true), '');

    -- The customers whose rows the caller may touch; null stands for all of them.
    create function caller_customers() returns uuid[] language sql stable parallel safe
      return case
        when current_setting('seamwright.customers', true) = '*' then null
        else coalesce(nullif(current_setting('seamwright.customers', true), ''), '{}')::uuid[]
      end;

    -- The sites a buyer is kept to; null stands for every site of the customers above.
    create function caller_sites() returns uuid[] language sql stable parallel safe
      return case
        when current_setting('seamwright.sites', true) = '*' then null
        else coalesce(nullif(current_setting('seamwright.sites', true), ''), '{}')::uuid[]
      end;

    create function caller_sees_all() returns boolean language sql stable parallel safe
      return caller_kind() in ('staff', 'system') and current_setting('seamwright.customers', true) = '*';

    create function caller_sees_all_sites() returns boolean language sql stable parallel safe
      return current_setting('seamwright.sites', true) = '*';

    grant usage on schema public to seamwright_app, seamwright_worker;
    alter default privileges in schema public grant select, insert, update, delete on tables to seamwright_app, seamwright_worker;
    alter default privileges in schema public grant usage, select on sequences to seamwright_app, seamwright_worker;
  `,
};
