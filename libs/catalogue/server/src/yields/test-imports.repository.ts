import { notFound, type Tx } from '@seamwright/shared/server';
import type { ReadTests, TestFault } from './test-columns';

/** A test as the screen shows it before it is recorded. */
export interface ShownTest {
  readonly row: number;
  readonly subject: string;
  readonly subjectName: string;
  readonly testedOn: string;
  readonly lotCode: string;
  readonly supplier: string;
  readonly grade: string;
  readonly pieces: number;
  readonly inputGrams: number;
  readonly addedGrams: number;
  readonly lossGrams: number;
  readonly outputs: readonly { readonly name: string; readonly grams: number }[];
}

/** What is kept of a workbook: its rows as read, and what was shown of them last. */
export interface KeptTests extends ReadTests {
  readonly shown: { readonly tests: readonly ShownTest[]; readonly faults: readonly TestFault[] };
}

export async function insertTestImport(
  tx: Tx,
  {
    kept,
    ...made
  }: {
    readonly id: string;
    readonly fileName: string;
    readonly fileHash: string;
    readonly kept: KeptTests;
    readonly uploadedBy: string;
    readonly uploadedAt: Date;
  },
): Promise<void> {
  await tx
    .insertInto('cuttingTestImports')
    .values({ ...made, readRows: JSON.stringify(kept) })
    .execute();
}

/** Throws `not-found`; with `lock`, nobody else can take it until the transaction ends. */
export async function testImportById(tx: Tx, id: string, lock = false) {
  const query = tx.selectFrom('cuttingTestImports').selectAll().where('id', '=', id);
  const row = await (lock ? query.forUpdate() : query).executeTakeFirst();
  if (!row) throw notFound();
  const { readRows, ...rest } = row;
  return { ...rest, kept: readRows as unknown as KeptTests };
}

/** When the very same file was taken before, if it was. */
export async function sameTestsTakenAt(tx: Tx, fileHash: string, exceptId: string): Promise<Date | null> {
  const row = await tx
    .selectFrom('cuttingTestImports')
    .select('takenAt')
    .where('fileHash', '=', fileHash)
    .where('id', '<>', exceptId)
    .where('takenAt', 'is not', null)
    .orderBy('takenAt', 'desc')
    .limit(1)
    .executeTakeFirst();
  return row?.takenAt ?? null;
}

export async function markTestsTaken(
  tx: Tx,
  id: string,
  taken: { readonly how: string; readonly at: Date; readonly testIds: readonly string[]; readonly kept: KeptTests },
): Promise<void> {
  await tx
    .updateTable('cuttingTestImports')
    .set((eb) => ({
      taken: taken.how,
      takenAt: taken.at,
      testIds: [...taken.testIds],
      readRows: JSON.stringify(taken.kept),
      rowVersion: eb('rowVersion', '+', 1),
    }))
    .where('id', '=', id)
    .execute();
}
