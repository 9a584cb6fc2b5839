import { audited, type Migration } from '../migration';

/** The cut tree and the versioned specifications. Public to everyone who may sign in: no policies, so that search can use its indexes. */
export const catalogue: Migration = {
  name: '0004_catalogue',
  sql: `
    create table cut_nodes (
      id uuid primary key,
      parent_id uuid references cut_nodes (id),
      species text not null constraint cut_nodes_species check (species in ('lamb', 'beef', 'pork')),
      level text not null constraint cut_nodes_level check (level in ('species', 'primal', 'sub-primal', 'cut')),
      name text not null,
      unece_item text constraint cut_nodes_unece_item check (unece_item ~ '^[0-9]{4}$'),
      unece_item_seen boolean not null default false,
      region text,
      sort integer not null,
      constraint cut_nodes_name unique nulls not distinct (parent_id, name)
    );

    create table specifications (
      id uuid primary key,
      code text not null constraint specifications_code unique,
      species text not null constraint specifications_species check (species in ('lamb', 'beef', 'pork')),
      cut_node_id uuid not null references cut_nodes (id),
      created_at timestamptz not null
    );

    create index specifications_cut_node on specifications (cut_node_id);

    create table specification_versions (
      id uuid primary key,
      row_version integer not null default 1,
      specification_id uuid not null references specifications (id),
      version integer not null constraint specification_versions_version check (version > 0),
      state text not null constraint specification_versions_state check (state in ('draft', 'in-review', 'approved')),
      name text not null,
      summary text not null,
      source_node_id uuid not null references cut_nodes (id),
      unece_item text constraint specification_versions_unece_item check (unece_item ~ '^[0-9]{4}$'),
      -- Whether that number was read in the standard itself, or is written from memory.
      unece_item_seen boolean not null default false,
      fat_code text,
      cutting_lines text not null,
      bone_state text not null constraint specification_versions_bone check (bone_state in ('bone-in', 'boneless')),
      fat_cover_mm integer not null constraint specification_versions_fat check (fat_cover_mm between 0 and 60),
      removed text[] not null default '{}',
      finish text not null,
      -- Which plan the drawing follows, and the word for one piece: a steak, a joint, a bag.
      drawing_kind text not null constraint specification_versions_drawing_kind
        check (drawing_kind in ('steak', 'joint', 'rack', 'flat', 'dice', 'leg')),
      piece_kind text not null constraint specification_versions_piece_kind
        check (piece_kind in ('piece', 'steak', 'joint', 'rack', 'leg', 'chop', 'shank', 'bag')),
      length_mm integer not null constraint specification_versions_length check (length_mm > 0),
      width_mm integer not null constraint specification_versions_width check (width_mm > 0),
      height_mm integer not null constraint specification_versions_height check (height_mm > 0),
      -- How many ribs a rack keeps.
      ribs integer constraint specification_versions_ribs check (ribs between 1 and 14),
      tolerance_mm integer not null constraint specification_versions_tolerance check (tolerance_mm >= 0),
      piece_nominal_grams bigint not null,
      piece_min_grams bigint not null,
      piece_max_grams bigint not null,
      pieces_per_pack integer not null constraint specification_versions_pieces check (pieces_per_pack > 0),
      packs_per_case integer not null constraint specification_versions_packs check (packs_per_case > 0),
      pack_type text not null constraint specification_versions_pack_type
        check (pack_type in ('vacuum', 'modified-atmosphere', 'tray', 'paper')),
      tare_grams bigint not null constraint specification_versions_tare check (tare_grams >= 0),
      gtin text,
      temperature_state text not null constraint specification_versions_temperature
        check (temperature_state in ('chilled', 'frozen', 'defrosted')),
      storage_min_c integer not null,
      storage_max_c integer not null,
      shelf_life_days integer not null,
      min_life_at_delivery_days integer not null,
      constraint specification_versions_storage check (storage_min_c <= storage_max_c),
      constraint specification_versions_life
        check (min_life_at_delivery_days >= 0 and shelf_life_days > 0 and min_life_at_delivery_days <= shelf_life_days),
      ageing_kind text constraint specification_versions_ageing check (ageing_kind in ('dry-aged', 'wet-aged', 'hung')),
      ageing_min_days integer,
      ageing_max_days integer,
      allergens text[] not null default '{}',
      may_contain text[] not null default '{}',
      yield_ppm bigint not null constraint specification_versions_yield check (yield_ppm > 0 and yield_ppm <= 1000000),
      cooking_loss_ppm bigint not null default 0,
      -- Lists of small records: [{text, caution?}], [{station, setUpSeconds, secondsPerKg, secondsPerPiece}], …
      steps jsonb not null,
      stations jsonb not null,
      choices jsonb not null,
      choice_rules jsonb not null,
      other_outputs jsonb not null,
      authored_by uuid not null references people (id),
      approved_by uuid references people (id),
      approved_at timestamptz,
      constraint specification_versions_number unique (specification_id, version),
      constraint specification_versions_weights
        check (piece_min_grams > 0 and piece_min_grams <= piece_nominal_grams and piece_nominal_grams <= piece_max_grams),
      constraint specification_versions_two_people check (approved_by is distinct from authored_by),
      constraint specification_versions_approved check ((state = 'approved') = (approved_at is not null and approved_by is not null))
    );
    ${audited('specification_versions')}

    create function keep_approved_version() returns trigger language plpgsql as $$
    begin
      if old.state = 'approved' then
        raise exception 'an approved version never changes' using errcode = 'restrict_violation', constraint = 'approved_version';
      end if;
      return case when tg_op = 'DELETE' then old else new end;
    end $$;
    create trigger specification_versions_keep before update or delete on specification_versions
      for each row execute function keep_approved_version();

    -- What moves on an approved version stands apart from it.
    create table specification_standings (
      version_id uuid primary key references specification_versions (id),
      row_version integer not null default 1,
      specification_id uuid not null references specifications (id),
      standing text not null constraint specification_standings_standing check (standing in ('current', 'superseded', 'withdrawn')),
      since timestamptz not null,
      reason text
    );
    create unique index specification_standings_one_current on specification_standings (specification_id) where standing = 'current';
    ${audited('specification_standings', { key: 'version_id' })}

    -- What can be found: one row per specification that has a current version, gone when that is withdrawn. Words of the
    -- version and of its place in the cut tree stand together, so that one trigram index serves every search.
    create table specification_search (
      specification_id uuid primary key references specifications (id),
      version_id uuid not null references specification_versions (id),
      code text not null,
      name text not null,
      species text not null,
      primal_node_id uuid references cut_nodes (id),
      bone_state text not null,
      words text not null
    );
    create index specification_search_words on specification_search using gin (words gin_trgm_ops);
    create unique index specification_search_code on specification_search (code);
    create index specification_search_primal on specification_search (primal_node_id, code);
  `,
};
