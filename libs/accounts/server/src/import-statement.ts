import { createHash } from 'node:crypto';
import { parseBankCsv, type StatementFault } from '@seamwright/accounts/domain';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { sayRefusal } from '@seamwright/shared/contracts';
import { conflict, personOf, ProblemError, type Caller, type Tx, type UploadedFile } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { insertStatement, isTaken } from './bank.repository';
import type { Posting } from './journal.repository';
import { matchBank } from './match-bank';

/** So many faults are told at once. */
const MOST_FAULTS_TOLD = 200;

/**
 * Takes a bank statement, whole or not at all, and matches payouts with it. Refuses `statement-taken-already` for the
 * same bytes, and `statement-has-faults` (count) with every fault by line and column. Gives its id.
 */
export async function importStatement(
  tx: Tx,
  by: Posting & { readonly caller: Caller },
  file: UploadedFile,
): Promise<string> {
  const importedBy = personOf(by.caller);
  if (importedBy === null) throw new RefusalError({ code: 'not-allowed', params: {} });
  const fileHash = createHash('sha256').update(file.bytes).digest('hex');
  if (await isTaken(tx, fileHash)) throw conflict('statement-taken-already');
  const { lines, faults } = parseBankCsv(textOf(file.bytes), HOUSE_CURRENCY);
  if (faults.length > 0) throw problemOf(faults);
  const id = newId<'BankStatement'>();
  const fileName = file.fileName.slice(0, 200);
  await insertStatement(tx, { id, fileName, fileHash, importedAt: by.now, importedBy }, HOUSE_CURRENCY, lines);
  await matchBank(tx, by);
  return id;
}

/** UTF-8, or the older western code page that some banks still write. Bytes of zero are no text. */
function textOf(bytes: Buffer): string {
  if (bytes.includes(0)) throw new RefusalError({ code: 'statement-unreadable', params: {} });
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}

function problemOf(faults: readonly StatementFault[]): ProblemError {
  const [first] = faults;
  if (first && first.row === null) return new ProblemError(422, first.refusal);
  const errors = faults.slice(0, MOST_FAULTS_TOLD).map(({ row, column, refusal }) => ({
    pointer: `/lines/${row ?? 0}/${column ?? ''}`,
    message: sayRefusal(refusal),
  }));
  return new ProblemError(422, { code: 'statement-has-faults', params: { count: faults.length } }, errors);
}
