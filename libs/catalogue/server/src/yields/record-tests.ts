import type { CuttingTestWire } from '@seamwright/catalogue/contracts';
import {
  cuttingLoss,
  faultsOfTest,
  subjectOf,
  yieldOfTest,
  type CuttingTestContent,
  type TestVerdict,
} from '@seamwright/catalogue/domain';
import { notFound, stale, type Tx } from '@seamwright/shared/server';
import { newId, plantToday, RefusalError, unwrap, type PlantDate } from '@seamwright/shared/util';
import { refuseAll } from '../schemes/scheme-faults';
import type { Acting } from '../schemes/write-scheme';
import { namesOf } from '../specifications.repository';
import { actingPerson } from '../write-version';
import { insertTests, judge, testById, type NewTestRow, type TestRow } from './cutting-tests.repository';
import { subjectByCode, type Subject } from './subjects';

export interface WantedTest {
  readonly subject: Subject;
  readonly content: CuttingTestContent;
}

/**
 * Keeps tests of any subjects in one go; gives their ids in the same order. Every fault of the first faulty test is
 * refused at its field (422).
 */
export async function recordTests(
  tx: Tx,
  { now, caller }: Acting,
  timeZone: string,
  tests: readonly WantedTest[],
): Promise<string[]> {
  const recordedBy = actingPerson(caller);
  const today = plantToday(now, timeZone);
  const rows = tests.map((test) => rowOf(test, today, recordedBy, now));
  await insertTests(tx, rows);
  return rows.map(({ id }) => id);
}

function rowOf({ subject, content }: WantedTest, today: PlantDate, recordedBy: string, now: Date): NewTestRow {
  refuseAll(faultsOfTest(content, subjectOf(subject.step), today));
  const { input, outputs, testedOn, note } = content;
  const lossGrams = unwrap(cuttingLoss(content));
  const { grams: inputGrams, ...rest } = input;
  return {
    ...rest,
    id: newId(),
    subject,
    inputGrams,
    outputs,
    outputGrams: inputGrams + input.addedGrams - lossGrams,
    lossGrams,
    testedOn,
    note,
    recordedBy,
    recordedAt: now,
  };
}

/** Sets a test aside or keeps it. Refuses `test-reason-missing` for setting aside without one, `stale`, `not-found`. */
export async function judgeTest(
  tx: Tx,
  { now, caller }: Acting,
  judged: {
    readonly testId: string;
    readonly verdict: TestVerdict;
    readonly reason: string;
    readonly rowVersion: number;
  },
): Promise<void> {
  const { testId, verdict, reason, rowVersion } = judged;
  if (verdict === 'set-aside' && reason === '')
    throw new RefusalError({ code: 'test-reason-missing', params: {}, pointer: '/reason' });
  if (!(await testById(tx, testId))) throw notFound();
  if (!(await judge(tx, testId, { rowVersion, verdict, reason, by: actingPerson(caller), at: now }))) throw stale();
}

/** One test as staff see it. Throws `not-found`. */
export async function readTest(tx: Tx, id: string): Promise<CuttingTestWire> {
  const test = await testById(tx, id);
  if (!test) throw notFound();
  const [shown] = await presentTests(tx, await subjectByCode(tx, test.subjectCode), [test]);
  if (!shown) throw notFound();
  return shown;
}

/** Tests of one subject as staff see them. An output that is no longer one keeps its key for a name. */
export async function presentTests(tx: Tx, subject: Subject, tests: readonly TestRow[]): Promise<CuttingTestWire[]> {
  const people = await namesOf(tx, [...new Set(tests.map(({ recordedBy }) => recordedBy))]);
  const names = new Map(subject.step.outputs.map(({ key, name }) => [key, name]));
  return tests.map((test) => ({
    id: test.id,
    rowVersion: test.rowVersion,
    subject: subject.code,
    subjectName: subject.step.name,
    lotCode: test.lotCode,
    supplier: test.supplier,
    grade: test.grade,
    pieces: test.pieces,
    inputGrams: test.inputGrams,
    addedGrams: test.addedGrams,
    outputs: test.outputs.map(({ key, grams }) => ({
      key,
      name: names.get(key) ?? key,
      grams,
      yieldPpm: yieldOfTest({ inputGrams: test.inputGrams, outputGrams: grams }),
    })),
    lossGrams: test.lossGrams,
    testedOn: test.testedOn,
    note: test.note,
    recordedBy: people.get(test.recordedBy) ?? '',
    verdict: test.verdict,
    verdictReason: test.verdictReason,
  }));
}
