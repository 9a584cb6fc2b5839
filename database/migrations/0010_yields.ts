import { audited, type Migration } from '../migration';

/**
 * Cutting schemes with their versions, and the cutting tests that yields are known by. Like the catalogue they belong to
 * no customer, and only staff have endpoints for them.
 */
export const yields: Migration = {
  name: '0010_yields',
  sql: `
    create table cutting_schemes (
      id uuid primary key,
      code text not null constraint cutting_schemes_code unique,
      species text not null constraint cutting_schemes_species check (species in ('lamb', 'beef', 'pork')),
      created_at timestamptz not null
    );

    create table cutting_scheme_versions (
      id uuid primary key,
      row_version integer not null default 1,
      scheme_id uuid not null references cutting_schemes (id),
      version integer not null constraint cutting_scheme_versions_version check (version > 0),
      state text not null constraint cutting_scheme_versions_state check (state in ('draft', 'in-review', 'approved')),
      name text not null,
      kind text not null constraint cutting_scheme_versions_kind check (kind in ('cutting', 'recipe', 'blend')),
      input_node_id uuid not null references cut_nodes (id),
      -- [{key, name, kind, nodeId, yieldPpm, valueMinorPerKg, visualLean?}], [{name, ppmOfInput, allergens, declared}],
      -- {parts: [{name, visualLean, tolerance, sharePpm}], leastLean, mostLean}
      outputs jsonb not null,
      ingredients jsonb not null,
      blend jsonb,
      note text not null,
      authored_by uuid not null references people (id),
      approved_by uuid references people (id),
      approved_at timestamptz,
      constraint cutting_scheme_versions_number unique (scheme_id, version),
      constraint cutting_scheme_versions_two_people check (approved_by is distinct from authored_by),
      constraint cutting_scheme_versions_approved
        check ((state = 'approved') = (approved_at is not null and approved_by is not null))
    );
    ${audited('cutting_scheme_versions')}
    create trigger cutting_scheme_versions_keep before update or delete on cutting_scheme_versions
      for each row execute function keep_approved_version();

    create table cutting_scheme_standings (
      version_id uuid primary key references cutting_scheme_versions (id),
      row_version integer not null default 1,
      scheme_id uuid not null references cutting_schemes (id),
      standing text not null
        constraint cutting_scheme_standings_standing check (standing in ('current', 'superseded', 'withdrawn')),
      since timestamptz not null,
      reason text
    );
    create unique index cutting_scheme_standings_one_current on cutting_scheme_standings (scheme_id) where standing = 'current';
    ${audited('cutting_scheme_standings', { key: 'version_id' })}

    create table cutting_tests (
      id uuid primary key,
      row_version integer not null default 1,
      -- What was tested: a scheme or a specification, and the version that named its outputs then.
      scheme_version_id uuid references cutting_scheme_versions (id),
      specification_version_id uuid references specification_versions (id),
      scheme_id uuid references cutting_schemes (id),
      specification_id uuid references specifications (id),
      lot_code text not null,
      supplier text not null,
      grade text not null,
      pieces integer not null constraint cutting_tests_pieces check (pieces > 0),
      input_grams bigint not null constraint cutting_tests_input check (input_grams > 0),
      added_grams bigint not null constraint cutting_tests_added check (added_grams >= 0),
      -- [{key, grams}]
      outputs jsonb not null,
      output_grams bigint not null,
      loss_grams bigint not null constraint cutting_tests_loss check (loss_grams >= 0),
      tested_on date not null,
      note text not null,
      recorded_by uuid not null references people (id),
      recorded_at timestamptz not null,
      verdict text constraint cutting_tests_verdict check (verdict in ('kept', 'set-aside')),
      verdict_reason text,
      verdict_by uuid references people (id),
      verdict_at timestamptz,
      constraint cutting_tests_subject check (
        (scheme_id is null) = (scheme_version_id is null)
        and (specification_id is null) = (specification_version_id is null)
        and (scheme_id is null) <> (specification_id is null)
      ),
      -- What went in is what came out and what was lost, to the gram.
      constraint cutting_tests_reconcile check (input_grams + added_grams = output_grams + loss_grams),
      constraint cutting_tests_judged check (
        (verdict is null) = (verdict_by is null) and (verdict is null) = (verdict_at is null)
        and (verdict is distinct from 'set-aside' or length(trim(verdict_reason)) > 0)
      )
    );
    create index cutting_tests_of_scheme on cutting_tests (scheme_id, tested_on, id) where scheme_id is not null;
    create index cutting_tests_of_specification on cutting_tests (specification_id, tested_on, id)
      where specification_id is not null;
    ${audited('cutting_tests')}

    create function keep_weighed() returns trigger language plpgsql as $$
    begin
      if tg_op = 'DELETE' or (old.input_grams, old.added_grams, old.outputs, old.output_grams, old.loss_grams, old.tested_on)
        is distinct from (new.input_grams, new.added_grams, new.outputs, new.output_grams, new.loss_grams, new.tested_on) then
        raise exception 'what was weighed never changes' using errcode = 'restrict_violation', constraint = 'cutting_tests_weighed';
      end if;
      return new;
    end $$;
    create trigger cutting_tests_weighed before update or delete on cutting_tests
      for each row execute function keep_weighed();

    -- A workbook of tests: looked at first, then taken once.
    create table cutting_test_imports (
      id uuid primary key,
      row_version integer not null default 1,
      file_name text not null,
      file_hash text not null,
      read_rows jsonb not null,
      uploaded_by uuid not null references people (id),
      uploaded_at timestamptz not null,
      taken text constraint cutting_test_imports_taken check (taken in ('good-rows', 'all-or-none')),
      taken_at timestamptz,
      test_ids uuid[] not null default '{}',
      constraint cutting_test_imports_once check ((taken is null) = (taken_at is null))
    );
    create index cutting_test_imports_same_file on cutting_test_imports (file_hash) where taken_at is not null;
  `,
};
