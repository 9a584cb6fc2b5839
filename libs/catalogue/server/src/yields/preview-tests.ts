import { cuttingLoss, faultsOfTest, subjectOf, type CuttingTestContent } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';
import {
  grams,
  parseKg,
  parsePlantDate,
  plantToday,
  refuse,
  RefusalError,
  unwrap,
  type Grams,
  type PlantDate,
  type Refusal,
  type Result,
} from '@seamwright/shared/util';
import type { Acting } from '../schemes/write-scheme';
import { subjectByCode, type Subject } from './subjects';
import {
  columnLetter,
  TEST_COLUMNS,
  type ReadTests,
  type TestColumn,
  type TestFault,
  type TestSheetRow,
} from './test-columns';

/** A row that can be recorded as it stands. */
export interface ReadyTest {
  readonly row: number;
  readonly subject: Subject;
  readonly content: CuttingTestContent;
  readonly lossGrams: Grams;
}

export interface TestPreview {
  readonly tests: readonly ReadyTest[];
  /** By row, then column. */
  readonly faults: readonly TestFault[];
}

const MOST_GRAMS = 100_000_000;

/** What would become of a workbook's rows now: the tests that can be recorded, and every faulty cell of the others. */
export async function previewTests(tx: Tx, { now }: Acting, timeZone: string, read: ReadTests): Promise<TestPreview> {
  const today = plantToday(now, timeZone);
  const subjects = await subjectsOf(tx, read.rows);
  const tests: ReadyTest[] = [];
  const faults: TestFault[] = [...read.faults];
  for (const row of read.rows) {
    const looked = lookAt(row, subjects.get(row.subject.toUpperCase()) ?? null, today);
    if ('faults' in looked) faults.push(...looked.faults);
    else tests.push(looked);
  }
  return {
    tests,
    faults: faults.sort((a, b) => a.row - b.row || a.column.length - b.column.length || (a.column < b.column ? -1 : 1)),
  };
}

/** Each code is asked for once. */
async function subjectsOf(tx: Tx, rows: readonly TestSheetRow[]): Promise<ReadonlyMap<string, Subject>> {
  const found = new Map<string, Subject>();
  for (const code of new Set(rows.map(({ subject }) => subject.toUpperCase()))) {
    const subject = await subjectByCode(tx, code).catch((error: unknown) => {
      if (error instanceof RefusalError) return null;
      throw error;
    });
    if (subject) found.set(code, subject);
  }
  return found;
}

const letterOf = (column: TestColumn): string => columnLetter(TEST_COLUMNS.indexOf(column) + 1);

function lookAt(row: TestSheetRow, subject: Subject | null, today: PlantDate): ReadyTest | { faults: TestFault[] } {
  const faults: TestFault[] = [];
  const add = (column: string, { code, params }: Pick<Refusal, 'code' | 'params'>) =>
    void faults.push({ row: row.row, column, code, params });
  const take = <T>(column: string, result: Result<T>, otherwise: T): T => {
    if (result.ok) return result.value;
    add(column, result.refusal);
    return otherwise;
  };
  const weight = (column: string, text: string): Grams => take(column, weightOf(text), grams(0));
  if (!subject) {
    add(letterOf('subject'), {
      code: row.subject === '' ? 'cell-empty' : 'test-subject-unknown',
      params: { code: row.subject.slice(0, 20) },
    });
    return { faults };
  }
  const named = new Map(subject.step.outputs.map(({ key, name }) => [name.toLowerCase(), key]));
  const outputs = row.outputs.flatMap(({ column, name, text }) => {
    const key = named.get(name.toLowerCase());
    if (key !== undefined) return [{ key, grams: weight(columnLetter(column), text), column }];
    add(columnLetter(column), { code: 'test-column-unknown', params: { name: name.slice(0, 60), code: subject.code } });
    return [];
  });
  const content: CuttingTestContent = {
    input: {
      lotCode: row.lotCode.slice(0, 60),
      supplier: row.supplier.slice(0, 120),
      grade: row.grade.slice(0, 40),
      pieces: take(letterOf('pieces'), piecesOf(row.pieces), 1),
      grams: weight(letterOf('input'), row.input),
      addedGrams: row.added === '' ? grams(0) : weight(letterOf('added'), row.added),
    },
    outputs: outputs.map(({ key, grams: weighed }) => ({ key, grams: weighed })),
    testedOn: take(letterOf('testedOn'), parsePlantDate(row.testedOn), today),
    note: row.note,
  };
  if (faults.length > 0) return { faults };
  for (const fault of faultsOfTest(content, subjectOf(subject.step), today)) add(columnOf(fault, outputs), fault);
  if (faults.length > 0) return { faults };
  return { row: row.row, subject, content, lossGrams: unwrap(cuttingLoss(content)) };
}

function weightOf(text: string): Result<Grams> {
  const weight = parseKg(text);
  return weight.ok && weight.value > MOST_GRAMS ? refuse('weight-too-large') : weight;
}

const piecesOf = (text: string): Result<number> =>
  /^\d{1,6}$/.test(text)
    ? { ok: true, value: Number(text) }
    : refuse('test-pieces-unreadable', { text: text.slice(0, 40) });

/** Where a fault of the whole test is shown: at its own field, else at what went in. */
function columnOf({ pointer = '' }: Refusal, outputs: readonly { readonly column: number }[]): string {
  const at = /^\/outputs\/(\d+)/.exec(pointer)?.[1];
  if (at !== undefined) return columnLetter(outputs[Number(at)]?.column ?? 1);
  const fields: Readonly<Record<string, TestColumn>> = {
    '/testedOn': 'testedOn',
    '/input/pieces': 'pieces',
    '/input/addedGrams': 'added',
  };
  return letterOf(fields[pointer] ?? 'input');
}
