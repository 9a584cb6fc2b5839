import { expect, type Locator, type Page } from '@playwright/test';
import { goTo } from './navigation';
import { cellsOf, minorOf, tidy } from './reading';

/** Opens the ledger with the entries of one account, by the link of its name. */
export async function openAccount(page: Page, account: string): Promise<void> {
  await goTo(page, 'Ledger');
  await page.getByRole('table', { name: 'Balances of the accounts' }).getByRole('link', { name: account }).click();
  await expect(page.getByRole('heading', { name: `Entries on ${account}` })).toBeVisible();
}

/** An account's balance in whole minor units. */
export async function balanceOf(page: Page, account: string): Promise<number> {
  const table = page.getByRole('table', { name: 'Balances of the accounts' });
  return minorOf((await cellsOf(table, new RegExp(`^\\s*${account}\\b`))).at(-1) ?? '');
}

/** The journal entries in a part of a page, each as it is read aloud: "Receivables £239.00 / Sales £239.00". */
export async function entriesWithin(within: Locator): Promise<string[]> {
  const entries = within.getByRole('table', { name: 'Journal entries with their lines' }).locator('tbody');
  await expect(entries.first()).toBeVisible();
  const read: string[] = [];
  for (const entry of await entries.all()) {
    // Beside its lines, each of which names an account by a link, an entry has a head and a sum.
    const rows = await entry
      .getByRole('row')
      .filter({ has: within.page().getByRole('link') })
      .all();
    const lines = await Promise.all(
      rows.map(async (row) => {
        const [account = ''] = await row.getByRole('link').allInnerTexts();
        const [, debit = '', credit = ''] = (await row.locator('td').allInnerTexts()).map(tidy);
        return { account: tidy(account), debit, credit };
      }),
    );
    const side = (of: 'debit' | 'credit'): string =>
      lines
        .filter((line) => line[of] !== '')
        .map((line) => `${line.account} ${line[of]}`)
        .join(' + ');
    read.push(`${side('debit')} / ${side('credit')}`);
  }
  return read;
}
