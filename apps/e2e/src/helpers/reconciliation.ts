import { expect, type Locator, type Page } from '@playwright/test';
import { goTo } from './navigation';
import { cellsOf, minorOf, rowOf, tidy, wordInPassing } from './reading';
import type { Upload } from './workbooks';

/** One booking of a bank statement; pounds as the bank writes them. */
export interface Booking {
  readonly day: string;
  readonly reference: string;
  readonly amount: string;
}

/** A bank's statement as separated values. */
export function bankStatement(name: string, bookings: readonly Booking[]): Upload {
  const lines = bookings.map(({ day, reference, amount }) => [day, 'CARD PAYOUT', reference, amount].join(','));
  const text = ['Date,Description,Reference,Amount', ...lines].join('\n');
  return { name, mimeType: 'text/csv', buffer: Buffer.from(text) };
}

/** What moved at the processor in a week, in whole minor units. */
export interface Moved {
  readonly captured: number;
  readonly fees: number;
  readonly paidOut: number;
}

/** A week of card money, from the customers' cards to the bank. */
export class ReconciliationPage {
  private constructor(private readonly page: Page) {}

  /** Opens this week, with all that the processor can tell. */
  static async open(page: Page): Promise<ReconciliationPage> {
    await goTo(page, 'Reconciliation');
    const week = new ReconciliationPage(page);
    await week.askProcessor();
    await page.getByRole('button', { name: 'Every penny, as a table' }).click();
    return week;
  }

  async askProcessor(): Promise<void> {
    await this.page.getByRole('button', { name: 'Ask the processor' }).first().click();
    await expect(wordInPassing(this.page)).toContainText(/The processor (told of|has told everything)/);
  }

  /** What is told of the week under its name. */
  get told(): Locator {
    return this.page.locator('sw-page-head');
  }

  async moved(): Promise<Moved> {
    const table = this.page.getByRole('table', { name: 'Money at the processor in this week' });
    const side = async (words: string, column: 1 | 2): Promise<number> => {
      const row = rowOf(table, words);
      return (await row.count()) === 0 ? 0 : minorOf((await cellsOf(table, words))[column] ?? '');
    };
    await expect(table).toBeVisible();
    return {
      captured: await side('Captured from cards', 1),
      fees: await side('Fees', 2),
      paidOut: await side('Paid out to the bank', 2),
    };
  }

  /** A comparison by its name: first side, second side, matched, not due yet, and how much is not explained. */
  async comparison(name: string): Promise<{ amounts: number[]; exceptions: string }> {
    const cells = await cellsOf(this.page.getByRole('table', { name: 'The four comparisons' }), name);
    return { amounts: cells.slice(1, 5).map(minorOf), exceptions: cells[5] ?? '' };
  }

  /** The row of a payout by its amount: state, charges, refunds, its movements, paid out, booked, matched. */
  async payout(amount: string): Promise<string[]> {
    const cells = await cellsOf(this.page.getByRole('table', { name: 'Payouts and bank lines' }), amount);
    return cells.slice(2);
  }

  /** What is not explained: kind, what, amount and likely cause. */
  async exceptions(): Promise<string[][]> {
    const table = this.page.getByRole('table', { name: 'What is not explained yet' });
    const rows = await table.locator('tbody tr').all();
    return Promise.all(
      rows.map(async (row) => {
        const [kind = '', what = '', amount = '', , cause = ''] = await row.locator('td').allInnerTexts();
        return [kind, what, amount, cause].map(tidy);
      }),
    );
  }

  /** Imports a bank statement; gives what is told once it is taken. */
  async importStatement(file: Upload): Promise<string> {
    await this.chooseStatement(file);
    const taken = this.page.getByRole('status').filter({ hasText: `${file.name} is taken` });
    await expect(taken).toBeVisible();
    return tidy(await taken.innerText());
  }

  /** Gives a file to the import, whatever comes of it. */
  async chooseStatement(file: Upload): Promise<void> {
    const field = this.page.getByLabel('Bank statement');
    if ((await field.count()) === 0) await this.page.getByRole('button', { name: 'Import bank statement' }).click();
    await field.setInputFiles(file);
  }
}
