// Not times are checked but what grows with the catalogue: finding by words, by code or by name reads no more of the search
// table than it has to, however many specifications and versions there are.
import { addTestPeople, addTestSpecification, addTestTree } from '@seamwright/catalogue/server/testing';
import { createTestDatabase, type TestDatabase } from '@seamwright/database/testing';
import { inTransaction, openDatabase, system, type Database, type Tx } from '@seamwright/shared/server';
import { TEST_NOW, watchPlans, type TableRead } from '@seamwright/shared/server/testing';
import { countByFilter } from './search-counts.repository';
import { findSpecifications } from './search.repository';
import { searchWords } from './search-words';
import { currentVersions } from './specifications.repository';

let urls: TestDatabase;
let api: Database;

beforeAll(async () => {
  urls = await createTestDatabase();
  api = openDatabase(urls.appUrl, { max: 2 });
  const tree = await addTestTree(api);
  const people = await addTestPeople(api, TEST_NOW);
  const steak = { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
  await addTestSpecification(api, { now: TEST_NOW, people, code: 'BF-201', ...steak });
  await fill(urls.ownerUrl);
});
afterAll(async () => {
  await api.close();
  await urls.drop();
});

/** Three thousand specifications, each called by a word of its own, with two versions. */
async function fill(ownerUrl: string): Promise<void> {
  const owner = openDatabase(ownerUrl, { max: 1 });
  const run = (text: string) => owner.pool.query(text);
  await run('alter table specification_versions disable trigger user');
  await run(`create temporary table made as select gen_random_uuid() as id, n,
    'X' || chr(65 + n / 1000) || '-' || lpad((n % 1000)::text, 3, '0') as code from generate_series(0, 2999) as n`);
  await run(`insert into specifications (id, code, species, cut_node_id, created_at)
    select made.id, made.code, s.species, s.cut_node_id, s.created_at from made, specifications s where s.code = 'BF-201'`);
  await run(`create temporary table copied as select t.*, made.id as of, made.n, v
    from made, generate_series(1, 2) as v, (select * from specification_versions limit 1) as t`);
  await run(
    `update copied set id = gen_random_uuid(), specification_id = of, version = v, name = 'Cut ' || md5(n::text)`,
  );
  await run('alter table copied drop column of, drop column n, drop column v');
  await run('insert into specification_versions select * from copied');
  await run(`insert into specification_standings (version_id, specification_id, standing, since)
    select id, specification_id, case version when 2 then 'current' else 'superseded' end, approved_at from copied`);
  await run(`create temporary table found as select s.* from specification_search s`);
  await run('alter table found drop column lexemes');
  await run(`insert into specification_search
    select c.specification_id, c.id, made.code, c.name, f.species, f.cut_node_id, f.primal_node_id, f.node_ids,
      f.source_node_id, f.usual_choice_key, f.usual_price_change_minor, f.piece_grams, f.pieces_per_case, f.bone_states,
      f.fat_bands, f.portions, f.portion_bands, f.pack_types, f.ageing_kind, f.ageing_min_days, f.place, f.also, f.rest
    from found f, copied c join made on made.id = c.specification_id where c.version = 2`);
  await run('vacuum analyze');
  await owner.close();
}

async function readsOf(
  work: (tx: Tx) => Promise<unknown>,
  how: Parameters<typeof watchPlans>[1] = 'as-it-would',
): Promise<readonly TableRead[]> {
  const { database, reads } = watchPlans(api, how);
  await inTransaction(database, system('job'), work);
  return reads;
}

const readsOfTable = (reads: readonly TableRead[], table: string) =>
  reads.filter((read) => read.table === table).map(({ index }) => index);

const page = { filters: {}, prices: null, after: null, limit: 50 };
/** The beginning of what only one of them is called: md5 of 7. */
const RARE = '8f14e45fceea';

describe('however large the catalogue', () => {
  it('finds by a rare word, and counts what it finds, by the index of words', async () => {
    const reads = await readsOf(async (tx) => {
      const words = [{ word: RARE, others: [] }];
      expect(await findSpecifications(tx, { ...page, words, sort: 'fit' })).toHaveLength(1);
      await countByFilter(tx, { words, filters: { species: 'beef' } });
    });
    const index = 'specification_search_lexemes';
    expect(readsOfTable(reads, 'specification_search')).toEqual([index, index, 'specification_search_code']);
  });

  it('counts all there is from an index alone, and looks at one specification of each kind', async () => {
    const everything = { words: [], filters: { species: 'beef' } } as const;
    const reads = await readsOf((tx) => countByFilter(tx, everything), 'by-index');
    const indexes = ['specification_search_kinds', 'specification_search_code'];
    expect(readsOfTable(reads, 'specification_search')).toEqual(indexes);
  });

  it('looks mistyped words and parts of words up among the catalogue’s words', async () => {
    const reads = await readsOf((tx) => searchWords(tx, 'triploi striplionn'), 'by-index');
    const read = readsOfTable(reads, 'search_terms');
    expect(read.length).toBeGreaterThan(0);
    expect(read.filter((index) => index !== 'search_terms_like')).toEqual([]);
    expect(readsOfTable(reads, 'specification_search')).toEqual([]);
  });

  it.each([
    ['fit', 'specification_search_code'],
    ['name', 'specification_search_name'],
    ['portion', 'specification_search_weight'],
  ] as const)('gives the first page by %s in the order of an index', async (sort, index) => {
    const reads = await readsOf((tx) => findSpecifications(tx, { ...page, words: [], sort }));
    expect(readsOfTable(reads, 'specification_search')).toEqual([index]);
  });

  it('reads the versions of a page and no others', async () => {
    const reads = await readsOf(async (tx) => {
      const found = await findSpecifications(tx, { ...page, words: [], sort: 'fit' });
      await currentVersions(
        tx,
        found.map(({ specificationId }) => specificationId),
      );
    });
    for (const table of ['specification_versions', 'specification_standings']) {
      expect(readsOfTable(reads, table)).not.toContain(null);
      expect(readsOfTable(reads, table).length).toBeGreaterThan(0);
    }
  });
});
