import { Workbook, type Cell, type Worksheet } from 'exceljs';
import { ok, refuse, RefusalError, type Result } from '@seamwright/shared/util';
import { guardWorkbook } from './workbook-guard';

/** A workbook of rows is read up to here. */
export const MOST_ROWS = 5_000;
const MOST_LETTERS = 1_000;

/**
 * The first sheet of a workbook that somebody sent. Refuses `workbook-unreadable`, `workbook-swollen` and
 * `workbook-empty`.
 */
export async function firstSheet(bytes: Buffer): Promise<Worksheet> {
  await guardWorkbook(bytes);
  const workbook = new Workbook();
  try {
    await workbook.xlsx.load(bytes as unknown as Parameters<typeof workbook.xlsx.load>[0]);
  } catch {
    throw new RefusalError({ code: 'workbook-unreadable', params: {} });
  }
  const [sheet] = workbook.worksheets;
  if (!sheet) throw new RefusalError({ code: 'workbook-empty', params: {} });
  return sheet;
}

/**
 * What a cell says, as text; nothing is an empty text. Formulas are refused, since what they say depends on who opens
 * the workbook: `cell-formula`, `cell-unreadable` or `cell-too-long` (most).
 */
export function cellText({ value }: Cell): Result<string> {
  if (value === null || value === undefined) return ok('');
  if (typeof value === 'string') return tidy(value);
  if (typeof value === 'number') return tidy(String(value));
  if (value instanceof Date)
    return Number.isNaN(value.getTime()) ? refuse('cell-unreadable') : ok(value.toISOString().slice(0, 10));
  if (typeof value !== 'object') return refuse('cell-unreadable');
  if ('formula' in value || 'sharedFormula' in value) return refuse('cell-formula');
  if ('richText' in value) return tidy(value.richText.map(({ text }) => text).join(''));
  if ('hyperlink' in value && typeof value.text === 'string') return tidy(value.text);
  return refuse('cell-unreadable');
}

function tidy(text: string): Result<string> {
  const tidied = text.replace(/[\p{Cc}\s]+/gu, ' ').trim();
  return tidied.length > MOST_LETTERS ? refuse('cell-too-long', { most: MOST_LETTERS }) : ok(tidied);
}
