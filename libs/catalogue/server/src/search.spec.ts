import {
  addSynonym,
  getCutTree,
  listSynonyms,
  removeSynonym,
  searchSpecifications,
  withdrawSpecification,
} from '@seamwright/catalogue/contracts';
import { aChoice, aValue } from '@seamwright/catalogue/domain/testing';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import type { Caller } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { grams, newId } from '@seamwright/shared/util';
import { catalogueImplementations } from './catalogue.implementations';
import type { PricePort, StockPort } from './search-ports';
import { searchImplementations } from './search.router';

type Query = Partial<Parameters<TestHouse['call']>[2]['query']> & Record<string, unknown>;

describe('finding a specification', () => {
  let house: TestHouse;
  let tree: TestTree;
  let people: TestPeople;
  const ids = new Map<string, string>();
  const customerId: string = newId();
  const buyer: Caller = { kind: 'user', personId: newId(), roles: ['buyer'], customerId, sites: '*' };

  /** Beef is in stock until the tenth. */
  const stock: StockPort = {
    nodesInStock: (_tx, day) => Promise.resolve(day <= '2026-12-10' ? [tree.striploinId] : []),
  };
  /** By code; the joint is on request. Everybody else's customer has no prices. */
  const MINOR = { 'BF-201': 2_400, 'LM-101': 950, 'LM-102': 1_150 };
  const prices: PricePort = {
    pricesPerKg: (_tx, asked, day, offers) =>
      Promise.resolve(
        new Map(
          Object.entries(MINOR)
            .map(([code, minor]) => [ids.get(code) ?? '', day < '2027-01-01' ? minor : minor + 100] as const)
            .filter(([id]) => asked === customerId && offers.some(({ specificationId }) => specificationId === id)),
        ),
      ),
  };

  beforeAll(async () => {
    const parts = { stock, prices, timeZone: 'Europe/London' };
    house = await openTestHouse({
      implementations: () => [...catalogueImplementations, ...searchImplementations(parts)],
    });
    tree = await addTestTree(house.database);
    people = await addTestPeople(house.database, TEST_NOW);
    const steak = { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
    const shoulder = { cutNodeId: tree.rolledShoulderId, sourceNodeId: tree.shoulderId };
    await add('BF-201', steak, {
      choices: [
        aChoice('trim', [aValue('6'), aValue('0', { changes: { fatCoverMm: 0 } })]),
        aChoice('portion', [
          aValue('280'),
          aValue('170', {
            changes: { pieceNominalGrams: grams(170), pieceMinGrams: grams(160), pieceMaxGrams: grams(180) },
          }),
        ]),
      ],
      ageing: { kind: 'wet-aged', minDays: 21, maxDays: 35 },
    });
    await add('BF-202', steak, {
      name: 'Striploin joint',
      boneState: 'bone-in',
      ...weights(2_500),
      fatCoverMm: 14,
      ageing: { kind: 'dry-aged', minDays: 28, maxDays: 45 },
    });
    await add('LM-101', shoulder, {
      name: 'Shoulder, boned and rolled',
      summary: 'For slow roasting.',
      finish: 'rolled',
      pieceKind: 'piece',
      ...weights(2_000),
    });
    await add('LM-102', shoulder, {
      name: 'Épaule carré',
      summary: 'As it comes.',
      pieceKind: 'piece',
      packType: 'tray',
      ...weights(1_200),
      fatCoverMm: 2,
    });
  });
  afterAll(() => house.close());

  const weights = (nominal: number) => ({
    pieceNominalGrams: grams(nominal),
    pieceMinGrams: grams(nominal - 50),
    pieceMaxGrams: grams(nominal + 50),
  });
  const add = async (code: string, where: { cutNodeId: string; sourceNodeId: string }, content = {}) => {
    const version = await addTestSpecification(house.database, { now: TEST_NOW, people, code, ...where, content });
    ids.set(code, version.specificationId);
  };
  const search = (query: Query = {}, caller: Caller = buyer) =>
    house.call(caller, searchSpecifications, { query: query as { q?: string } });
  const codes = async (query: Query) => (await search(query)).body.items.map(({ code }) => code);
  const counts = async (query: Query) => (await search(query)).body.counts;

  it.each([
    ['a name in any order', 'shoulder boned', ['LM-101']],
    ['a code', 'lm-101', ['LM-101']],
    ['the beginning of a code', 'BF-2', ['BF-201', 'BF-202']],
    ['its place in the cut tree', 'beef', ['BF-201', 'BF-202']],
    ['the summary', 'roasting', ['LM-101']],
    ['another form of a word', 'roasts', ['LM-101']],
    ['a part of a word', 'loin', ['BF-201', 'BF-202']],
    ['a name without its accents', 'epaule', ['LM-102']],
    ['letters changed over', 'shuolder', ['LM-101', 'LM-102']],
    ['a letter too many in one of two words', 'strriploin joint', ['BF-202']],
    ['nothing that is there', 'venison', []],
    ['a sign that means something to the database', '%', []],
    ['more such signs', "_ \\ ' :* & !", []],
  ])('by %s', async (_, q, expected) => {
    expect((await codes({ q })).sort()).toEqual(expected);
  });

  it('puts a code before a name, and a name before a mention', async () => {
    expect(await codes({ q: 'steak' })).toEqual(['BF-201', 'BF-202']);
    expect(await codes({ q: 'joint' })).toEqual(['BF-202']);
    expect((await codes({ q: 'shoulder' }))[0]).toBe('LM-101');
  });

  it.each<[string, () => Query, string[]]>([
    ['species', () => ({ species: 'lamb' }), ['LM-101', 'LM-102']],
    ['primal', () => ({ primal: tree.striploinId }), ['BF-201', 'BF-202']],
    ['anything of the cut tree', () => ({ node: tree.rolledShoulderId }), ['LM-101', 'LM-102']],
    ['bone state', () => ({ boneState: 'bone-in' }), ['BF-202']],
    ['fat cover, chosen ones too', () => ({ fat: 'none' }), ['BF-201']],
    ['portion weight, chosen ones too', () => ({ portionFrom: 150, portionTo: 200 }), ['BF-201']],
    ['a portion weight between two that can be had', () => ({ portionFrom: 190, portionTo: 250 }), []],
    ['at least a weight', () => ({ portionFrom: 2_000 }), ['BF-202', 'LM-101']],
    ['way of ageing', () => ({ ageing: 'dry-aged' }), ['BF-202']],
    ['days of ageing', () => ({ agedDays: 21 }), ['BF-201', 'BF-202']],
    ['pack', () => ({ pack: 'tray' }), ['LM-102']],
    ['what is in stock on a day', () => ({ inStockOn: '2026-12-09' }), ['BF-201', 'BF-202']],
    ['what is in stock on a later day', () => ({ inStockOn: '2026-12-11' }), []],
    ['own price', () => ({ priceFrom: 1_000, priceTo: 2_400 }), ['BF-201', 'LM-102']],
    ['own price of another day', () => ({ priceTo: 1_100, priceOn: '2027-01-04' }), ['LM-101']],
    ['several at once', () => ({ species: 'beef', ageing: 'wet-aged', inStockOn: '2026-12-09' }), ['BF-201']],
  ])('narrows by %s', async (_, query, expected) => {
    expect((await codes(query())).sort()).toEqual(expected);
  });

  it('counts what each value of a filter would leave, the other filters kept', async () => {
    const { species, primals, nodes, boneStates, ...rest } = await counts({ species: 'beef', boneState: 'bone-in' });
    expect(species).toEqual([
      { species: 'lamb', count: 0 },
      { species: 'beef', count: 1 },
    ]);
    expect(primals).toEqual([{ id: tree.striploinId, name: 'Striploin', species: 'beef', count: 1 }]);
    expect(nodes).toEqual([{ id: tree.steakId, name: 'Striploin steak', level: 'cut', count: 1 }]);
    expect(boneStates).toEqual([
      { boneState: 'bone-in', count: 1 },
      { boneState: 'boneless', count: 1 },
    ]);
    expect(rest).toEqual({
      fatBands: [{ band: 'over-12', count: 1 }],
      portionBands: [{ band: '1500-4999', fromGrams: 1_500, toGrams: 4_999, count: 1 }],
      ageingKinds: [{ kind: 'dry-aged', count: 1 }],
      packTypes: [{ packType: 'vacuum', count: 1 }],
      inStock: null,
      prices: null,
    });
  });

  it('counts a specification for each of what it can be had as', async () => {
    const { fatBands, portionBands, packTypes } = await counts({});
    expect(fatBands.map(({ band, count }) => [band, count])).toEqual([
      ['none', 1],
      ['to-3', 1],
      ['to-6', 2],
      ['over-12', 1],
    ]);
    expect(portionBands.map(({ band, count }) => [band, count])).toEqual([
      ['150-299', 1],
      ['600-1499', 1],
      ['1500-4999', 2],
    ]);
    expect(packTypes).toEqual([
      { packType: 'vacuum', count: 3 },
      { packType: 'tray', count: 1 },
    ]);
  });

  it('counts stock and prices with the other filters kept', async () => {
    expect((await counts({ inStockOn: '2026-12-09', ageing: 'dry-aged' })).inStock).toBe(1);
    expect((await counts({ inStockOn: '2026-12-09', ageing: 'dry-aged' })).ageingKinds).toEqual([
      { kind: 'dry-aged', count: 1 },
      { kind: 'wet-aged', count: 1 },
    ]);
    const { prices: found, species } = await counts({ priceTo: 1_000, species: 'lamb' });
    expect(found).toEqual({ count: 2, lowestMinor: 950, highestMinor: 1_150 });
    expect(species).toEqual([
      { species: 'lamb', count: 1 },
      { species: 'beef', count: 0 },
    ]);
  });

  it.each<[string, Query, string[]]>([
    ['fit without words: by code', {}, ['BF-201', 'BF-202', 'LM-101', 'LM-102']],
    ['fit', { q: 'striploin' }, ['BF-201', 'BF-202']],
    ['name', { sort: 'name' }, ['LM-101', 'BF-202', 'BF-201', 'LM-102']],
    ['weight of a portion', { sort: 'portion' }, ['BF-201', 'LM-102', 'LM-101', 'BF-202']],
    ['price', { sort: 'price' }, ['LM-101', 'LM-102', 'BF-201']],
  ])('pages without gap or repeat, sorted by %s', async (_, query, expected) => {
    const seen: string[] = [];
    let cursor: string | undefined;
    do {
      const { body } = await search({ ...query, limit: 1, ...(cursor === undefined ? {} : { cursor }) });
      seen.push(...body.items.map(({ code }) => code));
      cursor = body.nextCursor ?? undefined;
    } while (cursor !== undefined && seen.length < 10);
    expect(seen).toEqual(expected);
  });

  it('refuses what can’t be asked, by its field', async () => {
    const pointers = async (query: Query, caller: Caller = buyer) => {
      const { status, problem } = await search(query, caller);
      return [status, problem.code, problem.errors[0]?.pointer];
    };
    const { body } = await search({ limit: 1 });
    expect(await pointers({ cursor: 'nonsense' })).toEqual([422, 'invalid', '/cursor']);
    expect(await pointers({ cursor: body.nextCursor, sort: 'name' })).toEqual([422, 'invalid', '/cursor']);
    expect(await pointers({ portionFrom: 300, portionTo: 200 })).toEqual([422, 'search-range', '/portionTo']);
    expect(await pointers({ priceFrom: 300, priceTo: 200 })).toEqual([422, 'search-range', '/priceTo']);
    expect((await pointers({ priceTo: 200 }, people.author)).slice(0, 2)).toEqual([422, 'search-price-customer']);
    expect((await pointers({ fat: 'lean' }))[0]).toBe(422);
    expect((await search({}, { kind: 'anonymous' })).status).toBe(401);
  });

  it('finds nothing that was withdrawn', async () => {
    await add('BF-203', { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId }, { name: 'Minute steak' });
    expect(await codes({ q: 'minute' })).toEqual(['BF-203']);
    const withdrawal = { params: { code: 'BF-203' }, body: { reason: 'No longer cut' }, ifMatch: 1 };
    await house.call(people.author, withdrawSpecification, withdrawal);
    expect(await codes({ q: 'minute' })).toEqual([]);
  });

  describe('by what else the trade calls it', () => {
    const named = (body: object, caller = people.author) =>
      house.call(caller, addSynonym, {
        body: { nodeId: null, specificationId: null, region: null, term: 'Sirloin', ...body },
      });

    it('finds everything under a cut by its other names, accents and mistakes forgiven, until a name is taken away', async () => {
      const { status, body } = await named({ nodeId: tree.striploinId, term: 'Contre-filet', region: 'France' });
      expect([status, body.ofName, body.region]).toEqual([201, 'Striploin', 'France']);
      await named({ specificationId: ids.get('LM-102'), term: 'Entrecôte d’agneau' });

      expect(await codes({ q: 'contre-filet' })).toEqual(['BF-201', 'BF-202']);
      expect(await codes({ q: 'CONTRE FILET' })).toEqual(['BF-201', 'BF-202']);
      expect(await codes({ q: 'contrefillet' })).toEqual(['BF-201', 'BF-202']);
      expect(await codes({ q: 'entrecote' })).toEqual(['LM-102']);
      expect(await codes({ q: 'éntrecôte' })).toEqual(['LM-102']);

      const listed = await house.call(people.author, listSynonyms, { query: { q: 'FILET' } });
      expect(listed.body.items.map(({ term }) => term)).toEqual(['Contre-filet']);
      expect((await house.call(people.author, removeSynonym, { params: { id: body.id } })).status).toBe(204);
      expect(await codes({ q: 'contre-filet' })).toEqual([]);
      expect((await house.call(people.author, removeSynonym, { params: { id: body.id } })).status).toBe(404);
    });

    it('keeps the names of a specification that is approved anew or later', async () => {
      await named({ nodeId: tree.beefId, term: 'Rinderbraten' });
      await add('BF-204', { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId }, { name: 'Thin steak' });
      expect(await codes({ q: 'rinderbraten' })).toContain('BF-204');
    });

    it('puts a specification’s own name first', async () => {
      await named({ nodeId: tree.shoulderId, term: 'Joint' });
      expect(await codes({ q: 'joint' })).toEqual(['BF-202', 'LM-101', 'LM-102']);
    });

    it('pages and narrows the list of names', async () => {
      const all = (await house.call(people.author, listSynonyms, { query: {} })).body.items;
      const first = (await house.call(people.author, listSynonyms, { query: { limit: 1 } })).body;
      const rest = await house.call(people.author, listSynonyms, { query: { cursor: first.nextCursor ?? '' } });
      expect([...first.items, ...rest.body.items]).toEqual(all);
      const ofBeef = await house.call(people.author, listSynonyms, { query: { nodeId: tree.beefId } });
      expect(ofBeef.body.items.map(({ term }) => term)).toEqual(['Rinderbraten']);
    });

    it('refuses a name twice in a region, of nothing, and from buyers', async () => {
      const sirloin = { nodeId: tree.striploinId, region: 'England' };
      expect((await named(sirloin)).status).toBe(201);
      expect((await named({ ...sirloin, term: ' SIRLOIN' })).problem).toMatchObject({ code: 'synonym-taken' });
      expect((await named({ ...sirloin, region: 'Wales' })).status).toBe(201);
      expect((await named({ nodeId: newId() })).problem).toMatchObject({ status: 422, code: 'synonym-of-nothing' });
      expect((await named({})).status).toBe(422);
      expect((await named(sirloin, buyer)).status).toBe(403);
    });
  });

  it('leaves the cut tree as it is', async () => {
    expect((await house.call(buyer, getCutTree, {})).body.nodes).toHaveLength(6);
  });
});
