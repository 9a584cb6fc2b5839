import type { Migration } from '../migration';

/** Audit, the demo clock, idempotency keys, and the outbox that carries events, jobs and mail. */
export const kernel: Migration = {
  name: '0002_kernel',
  sql: `
    create table audit_entries (
      id bigint generated always as identity primary key,
      at timestamptz not null default clock_timestamp(),
      table_name text not null,
      row_id text not null,
      action text not null constraint audit_entries_action check (action in ('insert', 'update', 'delete')),
      person_id uuid,
      purpose text,
      customer_id uuid,
      changed jsonb not null
    );
    create index audit_entries_row on audit_entries (table_name, row_id, id);

    -- Arguments: the column that names the row, then those that are never written down (secrets, large contents).
    create function write_audit() returns trigger language plpgsql security definer set search_path = public as $$
    declare
      before jsonb := case when tg_op = 'INSERT' then '{}'::jsonb else to_jsonb(old) end;
      after jsonb := case when tg_op = 'DELETE' then '{}'::jsonb else to_jsonb(new) end;
      changed jsonb := '{}'::jsonb;
      field text;
    begin
      for field in select key from jsonb_object_keys(before || after) as key loop
        if (before -> field) is distinct from (after -> field) and not (field = any (tg_argv[1:])) then
          changed := changed || jsonb_build_object(field, jsonb_build_array(before -> field, after -> field));
        end if;
      end loop;
      if tg_op = 'UPDATE' and changed = '{}'::jsonb then return null; end if;
      insert into audit_entries (table_name, row_id, action, person_id, purpose, customer_id, changed)
      values (
        tg_table_name,
        (before || after) ->> tg_argv[0],
        lower(tg_op),
        caller_person(),
        caller_purpose(),
        nullif(coalesce(after, before) ->> 'customer_id', '')::uuid,
        changed
      );
      return null;
    end $$;

    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception '% is append-only', tg_table_name using errcode = 'restrict_violation', constraint = 'append_only';
    end $$;
    create trigger audit_entries_append_only before update or delete on audit_entries
      for each row execute function refuse_change();
    alter table audit_entries enable row level security;
    alter table audit_entries force row level security;
    create policy written_by_trigger on audit_entries for insert with check (true);
    create policy read_by_staff on audit_entries for select using ((select caller_sees_all()));
    revoke insert, update, delete on audit_entries from seamwright_app, seamwright_worker;

    -- The one clock that the demo and browser tests may move. Production never reads it.
    create table app_clock (
      id integer primary key default 1 constraint app_clock_one_row check (id = 1),
      offset_seconds bigint not null default 0
    );
    insert into app_clock default values;

    create table idempotency_keys (
      caller text not null,
      endpoint text not null,
      key text not null,
      request_hash text not null,
      resource_id text,
      created_at timestamptz not null,
      primary key (caller, endpoint, key)
    );
    create index idempotency_keys_age on idempotency_keys (created_at);

    create table outbox_events (
      id bigint generated always as identity primary key,
      type text not null,
      subject_id uuid not null,
      customer_id uuid,
      payload jsonb not null default '{}',
      at timestamptz not null,
      dispatched_at timestamptz
    );
    create index outbox_events_waiting on outbox_events (id) where dispatched_at is null;

    -- Anyone may tell what happened; only the jobs read it.
    alter table outbox_events enable row level security;
    alter table outbox_events force row level security;
    create policy told_by_anyone on outbox_events for insert with check (true);
    create policy read_by_jobs on outbox_events using ((select caller_kind()) = 'system');

    create table outbox_deliveries (
      id bigint generated always as identity primary key,
      event_id bigint not null references outbox_events (id) on delete cascade,
      subscriber text not null,
      attempts integer not null default 0,
      due_at timestamptz not null,
      done_at timestamptz,
      last_error text,
      constraint outbox_deliveries_once unique (event_id, subscriber)
    );
    create index outbox_deliveries_open on outbox_deliveries (due_at) where done_at is null;

    create table documents (
      id uuid primary key,
      customer_id uuid,
      kind text not null,
      file_name text not null,
      media_type text not null,
      bytes bytea not null,
      created_at timestamptz not null
    );
    create index documents_customer on documents (customer_id, kind);

    create table mails (
      id uuid primary key,
      customer_id uuid,
      to_address text not null,
      subject text not null,
      body_text text not null,
      document_id uuid references documents (id),
      dedupe_key text not null constraint mails_once unique,
      created_at timestamptz not null,
      sent_at timestamptz
    );
  `,
};
