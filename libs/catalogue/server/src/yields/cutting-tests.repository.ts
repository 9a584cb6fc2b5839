import type { TestVerdict, WeighedOutput } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';
import type { Subject } from './subjects';

/** A test as it is kept. */
export interface TestRow {
  readonly id: string;
  readonly rowVersion: number;
  readonly schemeId: string | null;
  readonly specificationId: string | null;
  readonly lotCode: string;
  readonly supplier: string;
  readonly grade: string;
  readonly pieces: number;
  readonly inputGrams: number;
  readonly addedGrams: number;
  readonly outputs: readonly WeighedOutput[];
  readonly outputGrams: number;
  readonly lossGrams: number;
  readonly testedOn: string;
  readonly note: string;
  readonly recordedBy: string;
  readonly recordedAt: Date;
  readonly verdict: TestVerdict | null;
  readonly verdictReason: string | null;
}

export interface NewTestRow extends Omit<
  TestRow,
  'rowVersion' | 'verdict' | 'verdictReason' | 'schemeId' | 'specificationId'
> {
  readonly subject: Pick<Subject, 'kind' | 'id' | 'versionId'>;
}

/** Rows of one statement: PostgreSQL takes at most 65,535 parameters. */
const AT_ONCE = 1_000;

export async function insertTests(tx: Tx, tests: readonly NewTestRow[]): Promise<void> {
  const rows = tests.map(({ subject, outputs, ...rest }) => ({
    ...rest,
    outputs: JSON.stringify(outputs),
    schemeId: subject.kind === 'scheme' ? subject.id : null,
    schemeVersionId: subject.kind === 'scheme' ? subject.versionId : null,
    specificationId: subject.kind === 'specification' ? subject.id : null,
    specificationVersionId: subject.kind === 'specification' ? subject.versionId : null,
  }));
  for (let from = 0; from < rows.length; from += AT_ONCE)
    await tx
      .insertInto('cuttingTests')
      .values(rows.slice(from, from + AT_ONCE))
      .execute();
}

const ofSubject = (tx: Tx, { kind, id }: Pick<Subject, 'kind' | 'id'>) =>
  tx
    .selectFrom('cuttingTests')
    .selectAll()
    .where(kind === 'scheme' ? 'schemeId' : 'specificationId', '=', id);

const asTests = (rows: readonly object[]): TestRow[] => rows as TestRow[];

/** All tests of a subject, oldest first. */
export async function testsOf(tx: Tx, subject: Pick<Subject, 'kind' | 'id'>): Promise<TestRow[]> {
  return asTests(await ofSubject(tx, subject).orderBy('testedOn').orderBy('id').execute());
}

/** Tests of a subject, newest first, from the place after `after` on. */
export async function pageOfTests(
  tx: Tx,
  subject: Pick<Subject, 'kind' | 'id'>,
  { after, limit }: { readonly after: readonly [string, string] | null; readonly limit: number },
): Promise<TestRow[]> {
  let query = ofSubject(tx, subject);
  if (after) {
    const [day, id] = after;
    query = query.where(({ or, and, eb }) =>
      or([eb('testedOn', '<', day), and([eb('testedOn', '=', day), eb('id', '<', id)])]),
    );
  }
  return asTests(await query.orderBy('testedOn', 'desc').orderBy('id', 'desc').limit(limit).execute());
}

export async function testById(tx: Tx, id: string): Promise<(TestRow & { readonly subjectCode: string }) | undefined> {
  const row = await tx
    .selectFrom('cuttingTests as t')
    .leftJoin('cuttingSchemes as c', 'c.id', 't.schemeId')
    .leftJoin('specifications as s', 's.id', 't.specificationId')
    .selectAll('t')
    .select(({ fn }) => fn.coalesce('c.code', 's.code').as('subjectCode'))
    .where('t.id', '=', id)
    .executeTakeFirst();
  return row as (TestRow & { subjectCode: string }) | undefined;
}

/** Writes down what a person decided; false when the test changed since it was read. */
export async function judge(
  tx: Tx,
  id: string,
  verdict: {
    readonly rowVersion: number;
    readonly verdict: TestVerdict;
    readonly reason: string;
    readonly by: string;
    readonly at: Date;
  },
): Promise<boolean> {
  const { numUpdatedRows } = await tx
    .updateTable('cuttingTests')
    .set((eb) => ({
      verdict: verdict.verdict,
      verdictReason: verdict.reason,
      verdictBy: verdict.by,
      verdictAt: verdict.at,
      rowVersion: eb('rowVersion', '+', 1),
    }))
    .where('id', '=', id)
    .where('rowVersion', '=', verdict.rowVersion)
    .executeTakeFirst();
  return numUpdatedRows > 0n;
}

export async function countTests(tx: Tx, schemeId: string): Promise<number> {
  const { count } = await tx
    .selectFrom('cuttingTests')
    .select(({ fn }) => fn.countAll<number>().as('count'))
    .where('schemeId', '=', schemeId)
    .executeTakeFirstOrThrow();
  return count;
}
