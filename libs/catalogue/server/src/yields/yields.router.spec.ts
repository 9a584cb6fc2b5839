import { Workbook, type CellValue } from 'exceljs';
import {
  adoptYields,
  createScheme,
  getCutOut,
  getScheme,
  getStaffSpecification,
  getTestImport,
  getTestTemplate,
  getYields,
  judgeTest,
  listSchemes,
  listTests,
  moveScheme,
  recordTest,
  saveSchemeDraft,
  takeTests,
  uploadTests,
  type NewTest,
  type SchemeContentWire,
} from '@seamwright/catalogue/contracts';
import {
  addTestPeople,
  addTestSpecification,
  addTestTree,
  type TestPeople,
  type TestTree,
} from '@seamwright/catalogue/server/testing';
import { inTransaction } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import { approveVersion } from '../approve-version';
import { catalogueImplementations } from '../catalogue.implementations';
import { schemeImplementations } from '../schemes/schemes.router';
import { yieldImplementations } from './yields.router';

let house: TestHouse;
let tree: TestTree;
let people: TestPeople;
let codes = 100;
/** The specifications that the higher storeys were asked about last. */
let asked: readonly string[] = [];

beforeAll(async () => {
  const readers = {
    countPriceLines: async (_tx: unknown, ids: readonly string[]) => ((asked = ids), ids.length * 2),
    countOpenOrderLines: async (_tx: unknown, ids: readonly string[]) => ids.length * 3,
  };
  house = await openTestHouse({
    implementations: () => [
      ...catalogueImplementations,
      ...schemeImplementations,
      ...yieldImplementations({ timeZone: 'Europe/London', readers }),
    ],
  });
  tree = await addTestTree(house.database);
  people = await addTestPeople(house.database, TEST_NOW);
});
afterAll(() => house.close());

const nextCode = () => `CS-${++codes}`;
const content = (stated: Partial<SchemeContentWire> = {}): SchemeContentWire => ({
  name: 'Striploin to steaks',
  kind: 'cutting',
  inputNodeId: tree.striploinId,
  outputs: [
    {
      key: 'steak',
      name: 'Steaks',
      kind: 'joint-product',
      nodeId: tree.steakId,
      yieldPpm: 780_000,
      valueMinorPerKg: 0,
    },
    {
      key: 'trim',
      name: 'Trim',
      kind: 'co-product',
      nodeId: null,
      yieldPpm: 120_000,
      valueMinorPerKg: 400,
      visualLean: 85,
    },
    { key: 'bone', name: 'Bone', kind: 'by-product', nodeId: null, yieldPpm: 90_000, valueMinorPerKg: -8 },
  ],
  ingredients: [],
  blend: null,
  note: '',
  ...stated,
});

async function drafted(stated: Partial<SchemeContentWire> = {}) {
  const code = nextCode();
  const { body } = await house.call(people.author, createScheme, { body: { code, content: content(stated) } });
  return body;
}
const move = (
  who: keyof TestPeople,
  code: string,
  body: { move: 'submit' | 'send-back' | 'approve' | 'withdraw'; reason?: string },
  ifMatch: number,
) => house.call(people[who], moveScheme, { params: { code }, body, ifMatch });

async function inForce(stated: Partial<SchemeContentWire> = {}): Promise<string> {
  const { code, rowVersion } = await drafted(stated);
  const submitted = await move('author', code, { move: 'submit' }, rowVersion);
  const approved = await move('approver', code, { move: 'approve' }, submitted.body.rowVersion);
  expect(approved.body).toMatchObject({ state: 'approved', standing: 'current', approverName: 'Ben Reviewer' });
  return code;
}

const testOf = (subject: string, grams: readonly [number, number, number], stated: Partial<NewTest['input']> = {}) => ({
  subject,
  input: { lotCode: 'L-1', supplier: 'Alder Farm', grade: 'R3', pieces: 2, grams: 10_000, addedGrams: 0, ...stated },
  outputs: ['steak', 'trim', 'bone'].map((key, at) => ({ key, grams: grams[at] ?? 0 })),
  testedOn: '2026-11-30',
  note: '',
});
const record = (body: NewTest) => house.call(people.author, recordTest, { body });

describe('a cutting scheme', () => {
  it('is kept as typed with its faults told, and refused field by field when it is submitted', async () => {
    const [steak] = content().outputs;
    if (!steak) throw new Error('there is a steak');
    const draft = await drafted({ outputs: [{ ...steak, yieldPpm: 1_000_001 }] });
    expect(draft).toMatchObject({
      state: 'draft',
      lossPpm: -1,
      faults: [{ code: 'scheme-yields-over', pointer: '/outputs' }],
    });
    const refused = await move('author', draft.code, { move: 'submit' }, draft.rowVersion);
    expect(refused.problem).toMatchObject({ status: 422, errors: [{ pointer: '/outputs' }] });

    const save = { params: { code: draft.code }, body: content({ note: 'Chine first' }), ifMatch: draft.rowVersion };
    expect((await house.call(people.approver, saveSchemeDraft, save)).problem.code).toBe('scheme-draft-of-another');
    const saved = await house.call(people.author, saveSchemeDraft, save);
    expect(saved.body).toMatchObject({ faults: [], lossPpm: 10_000, content: { note: 'Chine first' } });
    expect((await house.call(people.author, saveSchemeDraft, save)).problem.code).toBe('stale');
  });

  it('is approved by another person, followed by a next version, and withdrawn with a reason', async () => {
    const { code, rowVersion } = await drafted();
    const submitted = await move('author', code, { move: 'submit' }, rowVersion);
    const own = await move('author', code, { move: 'approve' }, submitted.body.rowVersion);
    expect(own.problem).toMatchObject({ code: 'own-version' });
    const speechless = await move('approver', code, { move: 'send-back' }, submitted.body.rowVersion);
    expect(speechless.problem).toMatchObject({ code: 'reason-missing', errors: [{ pointer: '/reason' }] });
    const approved = await move('approver', code, { move: 'approve' }, submitted.body.rowVersion);

    const edit = { params: { code }, body: content({ name: 'Striploin, thicker' }), ifMatch: approved.body.rowVersion };
    const next = await house.call(people.approver, saveSchemeDraft, edit);
    expect(next.body).toMatchObject({ version: 2, state: 'draft', authorName: 'Ben Reviewer' });
    const first = await house.call(people.author, getScheme, { params: { code }, query: { version: 1 } });
    expect(first.body).toMatchObject({ content: { name: 'Striploin to steaks' }, standing: 'current' });

    const withdrawn = await move(
      'author',
      code,
      { move: 'withdraw', reason: 'Not cut any more' },
      first.body.rowVersion,
    );
    expect(withdrawn.body.versions.at(-1)).toMatchObject({ standing: 'withdrawn', reason: 'Not cut any more' });
    const list = await house.call(people.author, listSchemes, { query: { q: 'thicker' } });
    expect(list.body.items).toMatchObject([
      { code, version: 2, state: 'draft', lossPpm: 10_000, inputName: 'Striploin' },
    ]);
  });

  it('may not close a circle with what is in force', async () => {
    const down = await inForce();
    const [steak] = content().outputs;
    if (!steak) throw new Error('there is a steak');
    const up = await drafted({
      name: 'Steak to striploin',
      inputNodeId: tree.steakId,
      outputs: [{ ...steak, nodeId: tree.striploinId }],
    });
    expect(up.faults).toMatchObject([{ code: 'scheme-cycle', pointer: '/outputs/0/nodeId' }]);
    expect((await move('author', up.code, { move: 'submit' }, up.rowVersion)).status).toBe(422);
    const { rowVersion } = (await house.call(people.author, getScheme, { params: { code: down } })).body;
    await move('author', down, { move: 'withdraw', reason: 'Only a test' }, rowVersion);
  });

  it('tells a recipe by its mixing bowl and a blend by its lean', async () => {
    const rusk = { name: 'Rusk', ppmOfInput: 250_000, allergens: ['cereals containing gluten'], declared: true };
    const recipe = await drafted({ kind: 'recipe', ingredients: [rusk] });
    expect(recipe).toMatchObject({
      addedPpm: 250_000,
      lossPpm: 260_000,
      recipe: [{ name: 'Rusk', sharePpm: 200_000 }],
    });
    const part = (name: string, visualLean: number, sharePpm: number) => ({ name, visualLean, tolerance: 1, sharePpm });
    const parts = [part('90VL', 90, 750_000), part('70VL', 70, 250_000)];
    const mixed = await drafted({ kind: 'blend', blend: { parts, leastLean: 84, mostLean: 86 } });
    expect(mixed).toMatchObject({ faults: [], lean: { statedPpm: 850_000, leastPpm: 840_000, within: 'always' } });
  });

  it('is broken down from the carcase to a specification, in grams that add up', async () => {
    const [steak, , bone] = content().outputs;
    if (!steak || !bone) throw new Error('there are both');
    const carcase = await inForce({
      name: 'Side to striploin',
      inputNodeId: tree.beefId,
      outputs: [
        { ...steak, key: 'striploin', name: 'Striploin', nodeId: tree.striploinId, yieldPpm: 60_000 },
        { ...bone, key: 'rest', name: 'Rest', yieldPpm: 935_000 },
      ],
    });
    const place = { cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
    await addTestSpecification(house.database, { now: TEST_NOW, people, code: 'BF-301', ...place });
    const query = { through: `${carcase},BF-301`, grams: 150_001 };
    const { body } = await house.call(people.author, getCutOut, { params: { nodeId: tree.beefId }, query });
    expect(body.lines.map(({ key, through, sharePpm }) => [key, through, sharePpm])).toEqual([
      ['rest', [carcase], 935_000],
      ['cut', [carcase, 'BF-301'], 47_040],
    ]);
    expect(body.loss.sharePpm).toBe(17_960);
    expect(body.lines.reduce((sum, { grams }) => sum + grams, body.loss.grams)).toBe(150_001);
    const unknown = { params: { nodeId: tree.beefId }, query: { through: 'BF-999' } };
    expect((await house.call(people.author, getCutOut, unknown)).problem.code).toBe('scheme-through-unknown');
  });
});

describe('cutting tests', () => {
  it('reconcile to the gram, or are refused at the field', async () => {
    const subject = await inForce();
    const { status, body } = await record(testOf(subject, [7_800, 1_200, 900]));
    expect(status).toBe(201);
    expect(body).toMatchObject({ subject, lossGrams: 100, recordedBy: 'Ada Author', verdict: null });
    expect(body.outputs[0]).toEqual({ key: 'steak', name: 'Steaks', grams: 7_800, yieldPpm: 780_000 });

    const over = await record(testOf(subject, [7_800, 1_200, 1_001]));
    expect(over.problem).toMatchObject({ status: 422, code: 'invalid', errors: [{ pointer: '/outputs' }] });
    expect(over.problem.errors[0]?.message).toContain('1 g');
    const unknown = await record(testOf('CS-999', [1, 1, 1]));
    expect(unknown.problem).toMatchObject({ code: 'test-subject-unknown', errors: [{ pointer: '/subject' }] });
    const early = await record({ ...testOf(subject, [7_800, 1_200, 900]), testedOn: '2026-12-02' });
    expect(early.problem.errors).toMatchObject([{ pointer: '/testedOn' }]);
  });

  it('are listed newest first, page by page', async () => {
    const subject = await inForce();
    for (const testedOn of ['2026-11-02', '2026-11-03', '2026-11-03'])
      await record({ ...testOf(subject, [7_800, 1_200, 900]), testedOn });
    const first = await house.call(people.author, listTests, { query: { subject, limit: 2 } });
    const cursor = first.body.nextCursor ?? '';
    const rest = await house.call(people.author, listTests, { query: { subject, limit: 2, cursor } });
    expect([...first.body.items, ...rest.body.items].map(({ testedOn }) => testedOn)).toEqual([
      '2026-11-03',
      '2026-11-03',
      '2026-11-02',
    ]);
    expect(new Set([...first.body.items, ...rest.body.items].map(({ id }) => id)).size).toBe(3);
  });

  it('make a yield that a person adopts: a version in review, and what reads it', async () => {
    const subject = await inForce();
    const nobody = await house.call(people.author, adoptYields, { params: { subject } });
    expect(nobody.problem).toMatchObject({ status: 409, code: 'adopt-without-tests' });
    for (const steak of [7_600, 7_650, 7_550, 7_620]) await record(testOf(subject, [steak, 1_200, 900]));
    await record(testOf(subject, [8_820, 1_600, 1_000], { grams: 12_000, supplier: 'Beck Farm', grade: '' }));
    const far = (await record(testOf(subject, [6_000, 1_200, 900]))).body;

    const query = { inputMinorPerKg: 1_000 };
    const before = (await house.call(people.author, getYields, { params: { subject }, query })).body;
    expect(before.awaiting).toContain(far.id);
    const flagged = before.outputs[0]?.points.find(({ testId }) => testId === far.id);
    expect(flagged).toMatchObject({ yieldPpm: 600_000, standsOut: true, counts: true });
    const early = await house.call(people.author, adoptYields, { params: { subject } });
    expect(early.problem.code).toBe('adopt-unjudged');

    const verdict = { params: { testId: far.id }, ifMatch: far.rowVersion };
    const aside = (reason: string) =>
      house.call(people.author, judgeTest, { ...verdict, body: { verdict: 'set-aside', reason } });
    expect((await aside('')).problem).toMatchObject({ code: 'test-reason-missing' });
    expect((await aside('Half of it fell on the floor')).body).toMatchObject({ verdict: 'set-aside', rowVersion: 2 });
    const rest = (await house.call(people.author, getYields, { params: { subject }, query })).body;
    for (const testId of rest.awaiting) {
      const judged = { params: { testId }, ifMatch: 1, body: { verdict: 'kept' as const, reason: '' } };
      expect((await house.call(people.author, judgeTest, judged)).status).toBe(200);
    }

    const after = (await house.call(people.author, getYields, { params: { subject }, query })).body;
    const [steak] = after.outputs;
    expect(after.awaiting).toEqual([]);
    // 39,240 g out of 52,000.
    expect(steak?.measured).toMatchObject({ n: 5, inputGrams: 52_000, outputGrams: 39_240, yieldPpm: 754_615 });
    expect(steak?.measured?.interval?.leastPpm).toBeLessThan(754_615);
    expect(steak?.bySupplier.map(({ name, n }) => [name, n])).toEqual([
      ['Alder Farm', 4],
      ['Beck Farm', 1],
    ]);
    expect(steak?.byGrade.map(({ name, n }) => [name, n])).toEqual([['R3', 4]]);
    // (10.00 − 0.123077 × 4.00 + 0.088462 × 0.08) ÷ 0.754615 a kilogram.
    expect(after.cost).toMatchObject({ usablePpm: 754_615, usableMinorPerKg: 1_261 });

    const place = { cutNodeId: tree.steakId, sourceNodeId: tree.steakId };
    const reader = await addTestSpecification(house.database, { now: TEST_NOW, people, code: 'BF-401', ...place });
    const idempotencyKey = newId();
    const adopt = () => house.call(people.author, adoptYields, { params: { subject }, idempotencyKey });
    const adopted = await adopt();
    expect(adopted.status).toBe(201);
    expect(adopted.body).toMatchObject({
      version: 2,
      state: 'in-review',
      tests: 5,
      outputs: [
        { key: 'steak', beforePpm: 780_000, afterPpm: 754_615 },
        { key: 'trim', beforePpm: 120_000, afterPpm: 123_077 },
        { key: 'bone', beforePpm: 90_000, afterPpm: 88_461 },
      ],
      readBy: { specifications: [{ code: 'BF-401' }], priceLines: 2, openOrderLines: 3 },
    });
    expect(asked).toEqual([reader.specificationId]);
    expect((await adopt()).body).toEqual(adopted.body);
    const again = await house.call(people.author, adoptYields, { params: { subject } });
    expect(again.problem).toMatchObject({ status: 409, code: 'adopt-version-open' });
  });

  it('of a specification give its next version, which another person approves', async () => {
    const place = { cutNodeId: tree.rolledShoulderId, sourceNodeId: tree.shoulderId };
    await addTestSpecification(house.database, { now: TEST_NOW, people, code: 'LM-201', ...place });
    await record({ ...testOf('LM-201', [0, 0, 0]), outputs: [{ key: 'cut', grams: 7_123 }] });
    const { body } = await house.call(people.author, adoptYields, { params: { subject: 'LM-201' } });
    expect(body).toMatchObject({
      version: 2,
      outputs: [{ key: 'cut', beforePpm: 784_000, afterPpm: 712_300 }],
      readBy: { specifications: [{ code: 'LM-201' }] },
    });
    await inTransaction(house.database, people.approver, (tx) =>
      approveVersion(tx, { now: TEST_NOW, caller: people.approver, versionId: body.versionId }),
    );
    const params = { code: 'LM-201' };
    expect((await house.call(people.author, getStaffSpecification, { params })).body.yieldPpm).toBe(712_300);
  });
});

describe('a workbook of tests', () => {
  async function filled(subject: string, rows: readonly CellValue[][]): Promise<Buffer> {
    const template = await house.call(people.author, getTestTemplate, { query: { subject } });
    const workbook = new Workbook();
    await workbook.xlsx.load(template.bytes as unknown as Parameters<typeof workbook.xlsx.load>[0]);
    for (const row of rows) workbook.worksheets[0]?.addRow([...row]);
    return Buffer.from(await workbook.xlsx.writeBuffer());
  }
  const upload = (bytes: Buffer) => house.call(people.author, uploadTests, { file: { bytes, name: 'tests.xlsx' } });
  const row = (code: string, ...grams: readonly CellValue[]): CellValue[] => [
    code,
    new Date('2026-11-30T00:00:00Z'),
    'L-7',
    'Alder Farm',
    'R3',
    2,
    10,
    '',
    '',
    ...grams,
  ];

  it('is looked at row by row, then taken once', async () => {
    const subject = await inForce();
    const bytes = await filled(subject, [
      row(subject, 7.8, '1,2', 0.9),
      row(subject, 7.8, 1.2, 1.001),
      row('CS-999', 1, 1, 1),
      row(subject, 7.8, 1.2),
      row(subject, 'heavy', 1.2, { formula: 'A1' } as CellValue),
      row(subject, 'heavy', 1.2, 0.9),
    ]);
    const seen = await upload(bytes);
    expect(seen.status).toBe(201);
    expect(seen.body).toMatchObject({ rows: 6, taken: null, sameFileTakenAt: null });
    expect(seen.body.tests).toMatchObject([{ row: 2, subject, inputGrams: 10_000, lossGrams: 100 }]);
    expect(seen.body.faults.map(({ row: at, column, code }) => [at, column, code])).toEqual([
      [3, 'G', 'test-outputs-over-input'],
      [4, 'A', 'test-subject-unknown'],
      [5, 'G', 'test-output-missing'],
      [6, 'L', 'cell-formula'],
      [7, 'J', 'weight-unreadable'],
    ]);

    const params = { importId: seen.body.id };
    const all = await house.call(people.author, takeTests, { params, body: { how: 'all-or-none' } });
    expect(all.problem).toMatchObject({ status: 409, code: 'import-has-faults' });
    const idempotencyKey = newId();
    const good = () => house.call(people.author, takeTests, { params, body: { how: 'good-rows' }, idempotencyKey });
    const taken = await good();
    expect(taken.body).toMatchObject({ taken: 'good-rows', recorded: [expect.any(String)] });
    expect((await good()).body).toEqual(taken.body);
    const twice = await house.call(people.author, takeTests, { params, body: { how: 'good-rows' } });
    expect(twice.problem.code).toBe('import-taken-already');
    expect((await house.call(people.author, listTests, { query: { subject } })).body.items).toHaveLength(1);

    const again = await upload(bytes);
    expect(
      (await house.call(people.author, getTestImport, { params: { importId: again.body.id } })).body,
    ).toMatchObject({
      sameFileTakenAt: expect.any(String),
    });
  });

  it('is refused whole where it can’t be read', async () => {
    const subject = await inForce();
    expect((await upload(Buffer.from('no workbook'))).problem.code).toBe('workbook-unreadable');
    expect((await upload(await filled(subject, []))).problem.code).toBe('workbook-empty');
    const other = new Workbook();
    other.addWorksheet('x').addRow(['Who', 'What']);
    const columns = await upload(Buffer.from(await other.xlsx.writeBuffer()));
    expect(columns.problem.code).toBe('workbook-columns');
  });
});
