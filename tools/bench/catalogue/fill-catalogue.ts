import { SPECIFICATIONS } from '../../../seeds/catalogue';
import type { Plain } from '../thread/plain';

export interface Filling {
  readonly specifications: number;
  readonly versionsEach: number;
}

/** Columns of a made version that are not its template's. */
const OWN = {
  id: 'gen_random_uuid()',
  specification_id: 'made.id',
  version: 'v',
  row_version: '1',
  name: `t.name || ' ' || made.word`,
  fat_cover_mm: '(t.fat_cover_mm + v) % 20',
  // Only the version in force is read whole by anybody; what came before it keeps its first step and no choices.
  steps: `case when v = $1 then t.steps else jsonb_build_array(t.steps -> 0) end`,
  choices: `case when v = $1 then t.choices else '[]' end`,
  choice_rules: `case when v = $1 then t.choice_rules else '[]' end`,
} as const;

/** Words that set one specification apart from the next, as places and ways of rearing do. */
const WORDS =
  'hill marsh moor river coast forest meadow orchard barley clover heather upland lowland island valley chalk native grass milk hay';

/**
 * Fills the catalogue set by set from what is in force in it, as the tables' owner: every template is copied under a new
 * code and name, with versions before it that were superseded. The last version is in force and can be found.
 */
export async function fillCatalogue(owner: Plain, { specifications, versionsEach }: Filling): Promise<void> {
  for (const table of ['specification_versions', 'specification_standings']) {
    await owner.query(`alter table ${table} disable trigger user`);
  }
  await owner.query(
    `create temporary table made as
     select gen_random_uuid() as id, 'X' || chr(65 + n / 1000) || '-' || lpad((n % 1000)::text, 3, '0') as code,
       (string_to_array($1, ' '))[1 + n % $2::integer] as word, t.id as template, t.specification_id as of
     from generate_series(1, $3::integer) as n
     join (
       select v.id, v.specification_id, row_number() over (order by s.code) - 1 as at
       from specification_versions v join specification_standings st on st.version_id = v.id
       join specifications s on s.id = v.specification_id where st.standing = 'current'
     ) t on t.at = (n * 7) % $4::integer`,
    [WORDS, WORDS.split(' ').length, specifications, SPECIFICATIONS.length],
  );
  await owner.query('create unique index on made (id)');
  await owner.query('analyze made');
  await owner.query(
    `insert into specifications (id, code, species, cut_node_id, created_at)
     select made.id, made.code, s.species, s.cut_node_id, s.created_at from made join specifications s on s.id = made.of`,
  );
  const columns = await owner.query(
    `select column_name as name from information_schema.columns where table_name = 'specification_versions' order by 1`,
  );
  const names = columns.map(({ name }) => String(name));
  const values = names.map((name) => (name in OWN ? OWN[name as keyof typeof OWN] : `t.${name}`));
  await owner.query(
    `insert into specification_versions (${names.join(', ')})
     select ${values.join(', ')} from made join specification_versions t on t.id = made.template
     cross join generate_series(1, $1::integer) as v`,
    [versionsEach],
  );
  await owner.query(
    `insert into specification_standings (version_id, specification_id, standing, since)
     select v.id, made.id, case when v.version = $1 then 'current' else 'superseded' end, v.approved_at
     from made join specification_versions v on v.specification_id = made.id`,
    [versionsEach],
  );
  const found = await owner.query(
    `select column_name as name from information_schema.columns
     where table_name = 'specification_search' and is_generated = 'NEVER' order by 1`,
  );
  const foundNames = found.map(({ name }) => String(name));
  const own = { specification_id: 'made.id', version_id: 'v.id', code: 'made.code', name: 'v.name' };
  const foundValues = foundNames.map((name) => (name in own ? own[name as keyof typeof own] : `t.${name}`));
  await owner.query(
    `insert into specification_search (${foundNames.join(', ')})
     select ${foundValues.join(', ')} from made join specification_search t on t.specification_id = made.of
     join specification_versions v on v.specification_id = made.id and v.version = $1`,
    [versionsEach],
  );
  await owner.query(
    `insert into price_lines (id, price_list_id, specification_id, basis, price_minor, valid)
     select gen_random_uuid(), l.price_list_id, made.id, l.basis, l.price_minor, l.valid
     from made join price_lines l on l.specification_id = made.of and l.customer_id is null
     join price_lists list on list.id = l.price_list_id and list.level = 'base'`,
  );
  for (const table of ['specification_versions', 'specification_standings']) {
    await owner.query(`alter table ${table} enable trigger user`);
  }
}
