import { expect, type Locator, type Page } from '@playwright/test';

/** Texts as a person reads them: one space between words. */
export const tidy = (text: string): string => text.replace(/\s+/g, ' ').trim();

/** A term of a list of facts, as it is written. */
const term = (within: Locator, words: string): Locator =>
  within.getByRole('term').filter({ hasText: new RegExp(`^\\s*${words}\\s*$`) });

/** The figure that stands beside a term, within a part of a page. */
export const figure = (within: Locator, words: string): Locator =>
  term(within, words).locator('xpath=following-sibling::dd[1]');

/** All the figures of a term that has a box of its own. */
export const figures = (within: Locator, words: string): Locator =>
  term(within, words).locator('xpath=following-sibling::dd');

/** The row of a table that says something. */
export const rowOf = (table: Locator, says: string | RegExp): Locator =>
  table.getByRole('row').filter({ hasText: says });

/** The row of a table that says something, its cells as texts. */
export async function cellsOf(table: Locator, says: string | RegExp): Promise<string[]> {
  const row = rowOf(table, says);
  await expect(row).toHaveCount(1);
  return (await row.locator('td').allInnerTexts()).map(tidy);
}

/** What is told in passing after a deed. */
export const wordInPassing = (page: Page): Locator => page.locator('mat-snack-bar-container');

/** Whole minor units as the screens write them: 23521 → "£235.21". */
export function pounds(minor: number): string {
  const size = Math.abs(minor);
  const whole = Math.floor(size / 100).toLocaleString('en-GB');
  return `${minor < 0 ? '-' : ''}£${whole}.${String(size % 100).padStart(2, '0')}`;
}

/** Pounds as the screens write them in whole minor units: "£235.21" → 23521; nothing written is nothing. */
export function minorOf(text: string): number {
  if (text.trim() === '') return 0;
  const [, minus, whole, pence] = /^([-−]?)£([\d,]+)\.(\d\d)$/.exec(tidy(text)) ?? [];
  if (whole === undefined) throw new Error(`"${text}" is no amount`);
  return Number(`${minus ? '-' : ''}${whole.replaceAll(',', '')}${pence}`);
}
