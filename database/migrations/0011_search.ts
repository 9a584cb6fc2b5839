import { audited, type Migration } from '../migration';

/** Plain and stemmed words of a column with their weight: names may not be stemmed away, nor an ending hide a word. */
const weighed = (column: string, weight: 'A' | 'B' | 'C' | 'D'): string =>
  `setweight(to_tsvector('simple', ${column}) || to_tsvector('english', ${column}), '${weight}')`;

/** One-off: what the domain works out for each approval from now on, for the versions that are in force already. */
const fillFromVersions = `
  with recursive up as (
    select id as cut_id, id, parent_id, level, name, 0 as height from cut_nodes
    union all
    select up.cut_id, n.id, n.parent_id, n.level, n.name, height + 1 from up join cut_nodes n on n.id = up.parent_id
  ), paths as (
    select cut_id, array_agg(id order by height desc) as ids, string_agg(name, ' ' order by height desc) as names,
      (array_agg(id) filter (where level = 'primal'))[1] as primal_id
    from up group by cut_id
  ), offered as (
    select v.*, s.code, s.species, s.cut_node_id, st.version_id,
      jsonb_path_query_array(v.choices, '$[*].values[*].changes') as changes
    from specification_standings st
    join specification_versions v on v.id = st.version_id
    join specifications s on s.id = v.specification_id
    where st.standing = 'current'
  )
  insert into specification_search (
    specification_id, version_id, code, name, species, cut_node_id, primal_node_id, node_ids, source_node_id,
    usual_choice_key, usual_price_change_minor, piece_grams, pieces_per_case,
    bone_states, fat_bands, portions, portion_bands, pack_types, ageing_kind, ageing_min_days, place, also, rest
  )
  select o.specification_id, o.version_id, o.code, o.name, o.species, o.cut_node_id, p.primal_id, p.ids, o.source_node_id,
    coalesce((
      select string_agg((c ->> 'key') || '=' || (c ->> 'defaultValue'), ';' order by c ->> 'key' collate "C")
      from jsonb_array_elements(o.choices) as c
    ), ''),
    coalesce((
      select sum((val ->> 'priceChangeMinorPerKg')::bigint)
      from jsonb_array_elements(o.choices) as c, jsonb_array_elements(c -> 'values') as val
      where val ->> 'value' = c ->> 'defaultValue'
    ), 0),
    o.piece_nominal_grams, o.pieces_per_pack * o.packs_per_case,
    array(select o.bone_state union select each ->> 'boneState' from jsonb_array_elements(o.changes) as each
      where each ? 'boneState' order by 1),
    array(
      select distinct case when mm <= 0 then 'none' when mm <= 3 then 'to-3' when mm <= 6 then 'to-6'
        when mm <= 12 then 'to-12' else 'over-12' end
      from (select o.fat_cover_mm as mm union select (each ->> 'fatCoverMm')::integer
        from jsonb_array_elements(o.changes) as each where each ? 'fatCoverMm') as fats
    ),
    (
      select range_agg(int8range(weight, weight, '[]')) from (select o.piece_nominal_grams as weight
        union select (each ->> 'pieceNominalGrams')::bigint from jsonb_array_elements(o.changes) as each
        where each ? 'pieceNominalGrams') as weights
    ),
    array(
      select distinct case when weight < 150 then 'under-150' when weight < 300 then '150-299'
        when weight < 600 then '300-599' when weight < 1500 then '600-1499'
        when weight < 5000 then '1500-4999' else '5000-up' end
      from (select o.piece_nominal_grams as weight union select (each ->> 'pieceNominalGrams')::bigint
        from jsonb_array_elements(o.changes) as each where each ? 'pieceNominalGrams') as weights
    ),
    array(select o.pack_type union select each ->> 'packType' from jsonb_array_elements(o.changes) as each
      where each ? 'packType' order by 1),
    o.ageing_kind, o.ageing_min_days, p.names, '',
    concat_ws(' ', o.summary, o.bone_state, o.finish, o.piece_kind, o.unece_item)
  from offered o join paths p on p.cut_id = o.cut_node_id;
`;

/**
 * Finding a specification by any of its trade's names, and by what can be chosen of it. The table is made anew: it holds
 * nothing that can't be worked out from the versions in force and the synonyms.
 */
export const search: Migration = {
  name: '0011_search',
  sql: `
    -- The trade has many names for one cut, by region. A name of a node is a name of every cut under it.
    create table cut_synonyms (
      id uuid primary key,
      node_id uuid constraint cut_synonyms_node references cut_nodes (id),
      specification_id uuid constraint cut_synonyms_specification references specifications (id),
      term text not null,
      -- The term in small letters without accents, as it is searched.
      plain text not null,
      -- Null where it is said everywhere.
      region text,
      created_at timestamptz not null,
      constraint cut_synonyms_of_one check (num_nonnulls(node_id, specification_id) = 1),
      constraint cut_synonyms_once unique nulls not distinct (node_id, specification_id, plain, region)
    );
    create index cut_synonyms_of_specification on cut_synonyms (specification_id);
    ${audited('cut_synonyms')}

    drop table specification_search;

    -- What can be found: one row per specification that has a current version, gone when that is withdrawn.
    create table specification_search (
      specification_id uuid primary key references specifications (id),
      version_id uuid not null references specification_versions (id),
      code text not null,
      name text not null,
      species text not null,
      cut_node_id uuid not null references cut_nodes (id),
      primal_node_id uuid references cut_nodes (id),
      -- From the species down to the cut.
      node_ids uuid[] not null,
      source_node_id uuid not null references cut_nodes (id),
      -- As it is offered when nothing is chosen.
      usual_choice_key text not null,
      usual_price_change_minor bigint not null,
      piece_grams bigint not null,
      pieces_per_case integer not null,
      -- Everything that it can be had as, by choice.
      bone_states text[] not null,
      fat_bands text[] not null,
      portions int8multirange not null,
      portion_bands text[] not null,
      pack_types text[] not null,
      ageing_kind text,
      ageing_min_days integer,
      -- Its words: names of its place in the cut tree, what else the trade calls it, everything else.
      place text not null,
      also text not null,
      rest text not null,
      lexemes tsvector not null generated always as (
        setweight(array_to_tsvector(array[lower(code)]), 'A')
        || ${weighed('name', 'A')} || ${weighed('also', 'B')} || ${weighed('place', 'C')} || ${weighed('rest', 'D')}
      ) stored,
      -- The same for all that no filter but the price can tell apart: counted first, so that filters are weighed once for each.
      kind uuid not null default gen_random_uuid()
    );
    create function name_search_kind() returns trigger language plpgsql as $$
    begin
      new.kind := md5(concat_ws('|', new.species, new.node_ids::text, new.source_node_id::text, new.bone_states::text,
        new.fat_bands::text, new.portions::text, new.pack_types::text, new.ageing_kind, new.ageing_min_days::text))::uuid;
      return new;
    end $$;
    create trigger specification_search_kind before insert or update on specification_search
      for each row execute function name_search_kind();
    create index specification_search_kinds on specification_search (kind, code);
    create unique index specification_search_code on specification_search (code);
    create index specification_search_name on specification_search (name, code);
    create index specification_search_weight on specification_search (piece_grams, code);
    create index specification_search_lexemes on specification_search using gin (lexemes);
    create index specification_search_nodes on specification_search using gin (node_ids);

    -- Every word that finds something, once: a part of a word, or one that is mistyped, is looked up here, where the words
    -- are few, and the specifications by whole words only.
    create table search_terms (
      term text primary key
    );
    create index search_terms_like on search_terms using gin (term gin_trgm_ops);
    create function keep_search_terms() returns trigger language plpgsql as $$
    begin
      insert into search_terms
        select distinct unnest(tsvector_to_array(to_tsvector('simple', concat_ws(' ', name, also, place, rest))))
        from changed order by 1 on conflict do nothing;
      return null;
    end $$;
    create trigger specification_search_added after insert on specification_search
      referencing new table as changed for each statement execute function keep_search_terms();
    create trigger specification_search_changed after update on specification_search
      referencing new table as changed for each statement execute function keep_search_terms();
    ${fillFromVersions}

    -- How much of a lot packing has used, whoever asks: a sum over all customers that tells nothing of any of them. The
    -- function reads as the owner of the tables, who serves nobody.
    create policy summed_by_owner on packs for select to seamwright_owner using (true);
    create function grams_used_of_lot(lot uuid) returns bigint
      language sql stable security definer set search_path = public
      as $$ select coalesce(sum(input_grams), 0)::bigint from packs where lot_id = lot and voided_at is null $$;
  `,
};
