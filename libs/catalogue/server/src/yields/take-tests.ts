import { createHash } from 'node:crypto';
import type { TestImportWire } from '@seamwright/catalogue/contracts';
import { sayRefusal } from '@seamwright/shared/contracts';
import { conflict, type Tx, type UploadedFile } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import type { Acting } from '../schemes/write-scheme';
import { actingPerson } from '../write-version';
import { previewTests, type ReadyTest, type TestPreview } from './preview-tests';
import { readTestWorkbook } from './read-test-workbook';
import { recordTests } from './record-tests';
import {
  insertTestImport,
  markTestsTaken,
  sameTestsTakenAt,
  testImportById,
  type KeptTests,
  type ShownTest,
} from './test-imports.repository';

/** Reads a workbook and keeps its rows with what would become of them; records nothing. Gives the import's id. */
export async function uploadTests(tx: Tx, acting: Acting, timeZone: string, file: UploadedFile): Promise<string> {
  const uploadedBy = actingPerson(acting.caller);
  const read = await readTestWorkbook(file.bytes);
  const preview = await previewTests(tx, acting, timeZone, read);
  const id = newId();
  await insertTestImport(tx, {
    id,
    fileName: file.fileName.slice(0, 200),
    fileHash: createHash('sha256').update(file.bytes).digest('hex'),
    kept: { ...read, shown: shownOf(preview) },
    uploadedBy,
    uploadedAt: acting.now,
  });
  return id;
}

/**
 * Records the tests of a workbook, once, as they stand now. Refuses `import-taken-already`, `import-has-faults` (count)
 * when all or none was asked for, and `import-nothing-good`.
 */
export async function takeTests(
  tx: Tx,
  acting: Acting,
  timeZone: string,
  { importId, how }: { readonly importId: string; readonly how: 'good-rows' | 'all-or-none' },
): Promise<string> {
  const { taken, kept } = await testImportById(tx, importId, true);
  if (taken) throw conflict('import-taken-already');
  const preview = await previewTests(tx, acting, timeZone, kept);
  if (how === 'all-or-none' && preview.faults.length > 0)
    throw conflict('import-has-faults', { count: preview.faults.length });
  if (preview.tests.length === 0) throw conflict('import-nothing-good');
  const testIds = await recordTests(tx, acting, timeZone, preview.tests);
  await markTestsTaken(tx, importId, { how, at: acting.now, testIds, kept: { ...kept, shown: shownOf(preview) } });
  return importId;
}

const shownOf = ({ tests, faults }: TestPreview): KeptTests['shown'] => ({ tests: tests.map(shownTest), faults });

function shownTest({ row, subject, content, lossGrams }: ReadyTest): ShownTest {
  const { lotCode, supplier, grade, pieces, grams: inputGrams, addedGrams } = content.input;
  const names = new Map(subject.step.outputs.map(({ key, name }) => [key, name]));
  return {
    row,
    subject: subject.code,
    subjectName: subject.step.name,
    testedOn: content.testedOn,
    lotCode,
    supplier,
    grade,
    pieces,
    inputGrams,
    addedGrams,
    lossGrams,
    outputs: content.outputs.map(({ key, grams }) => ({ name: names.get(key) ?? key, grams })),
  };
}

/** The import as it stands: what was seen of it last, and the tests that it became. Throws `not-found`. */
export async function presentTestImport(tx: Tx, id: string): Promise<TestImportWire> {
  const row = await testImportById(tx, id);
  const { tests, faults } = row.kept.shown;
  const before = row.taken ? null : await sameTestsTakenAt(tx, row.fileHash, id);
  return {
    id,
    rowVersion: row.rowVersion,
    fileName: row.fileName,
    uploadedAt: row.uploadedAt.toISOString(),
    rows: row.kept.rows.length + new Set(row.kept.faults.map((fault) => fault.row)).size,
    tests: tests.map((test) => ({ ...test, outputs: [...test.outputs] })),
    faults: faults.map(({ row: at, column, code, params }) => ({
      row: at,
      column,
      code,
      message: sayRefusal({ code, params }),
    })),
    sameFileTakenAt: before?.toISOString() ?? null,
    taken: row.taken as TestImportWire['taken'],
    takenAt: row.takenAt?.toISOString() ?? null,
    recorded: row.testIds,
  };
}
