import { expect, type Locator, type Page } from '@playwright/test';
import { confirm } from './confirm';
import { goTo } from './navigation';
import { tidy } from './reading';
import type { Upload } from './workbooks';

export interface QuotedPrice {
  readonly customer: string;
  readonly code: string;
  /** Choices by their labels: {'Trim level': '3'}. */
  readonly chosen: Readonly<Record<string, string>>;
  readonly price: string;
  readonly basis: 'kg' | 'piece' | 'case';
}

/** The rep writes a quote with one price and sends it to the customer; gives its number. */
export async function quoteAPrice(page: Page, { customer, code, chosen, price, basis }: QuotedPrice): Promise<string> {
  await goTo(page, 'Quotes');
  await page.getByRole('link', { name: 'New quote' }).click();
  await page.getByRole('combobox', { name: 'Customer' }).fill(customer);
  await page.getByRole('option', { name: customer }).click();
  await page.getByRole('combobox', { name: 'Add a specification' }).fill(code);
  await page.getByRole('option', { name: code }).click();
  for (const [choice, value] of Object.entries(chosen)) {
    const group = page.getByRole('group', { name: new RegExp(`^${choice}`) });
    await group.getByRole('radio', { name: new RegExp(`^${value}\\b`) }).check();
  }
  await page.getByRole('combobox', { name: 'For each' }).click();
  await page.getByRole('option', { name: basis, exact: true }).click();
  await page.getByRole('textbox', { name: 'Price', exact: true }).fill(price);
  await page.getByRole('button', { name: 'Save the draft' }).click();
  await page.getByRole('button', { name: 'Send to the customer' }).click();
  await confirm(page, 'Send the quote');
  await expect(page.locator('sw-quote-state')).toHaveText('Sent');
  const heading = page.getByRole('heading', { level: 1 });
  return /\d+/.exec(await heading.innerText())?.[0] ?? '';
}

/** The buyer accepts a quote in her storefront. */
export async function acceptQuote(page: Page, number: string): Promise<void> {
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Quotes' }).click();
  await page.getByRole('link', { name: new RegExp(`^Quote ${number}\\b`) }).click();
  await page.getByRole('button', { name: 'Accept these prices' }).click();
  await confirm(page, /^Accept/);
  await expect(page.locator('sw-quote-state')).toHaveText('Accepted');
}

/** Orders from a workbook: looked through first, then taken. */
export class OrderImport {
  constructor(private readonly page: Page) {}

  static async open(page: Page): Promise<OrderImport> {
    await goTo(page, 'From a spreadsheet');
    return new OrderImport(page);
  }

  async choose(file: Upload): Promise<void> {
    await this.page.getByLabel('Workbook of orders').setInputFiles(file);
  }

  get sums(): Locator {
    return this.page.locator('.sums');
  }

  /** The faults as "row, column, what is wrong", in the order of the sheet. */
  async faults(): Promise<string[]> {
    const table = this.page.getByRole('table', { name: 'Cells with faults' });
    await expect(table).toBeVisible();
    return (await table.locator('tbody tr').allInnerTexts()).map(tidy);
  }

  /** The orders that would be made, each by its head and what it will most likely come to. */
  async orders(): Promise<string[]> {
    return (await this.page.locator('div.order').allInnerTexts()).map(tidy);
  }

  /** Takes the rows without faults, pressing twice as hurried people do; gives the lines that say what was placed. */
  async takeGoodRows(): Promise<string[]> {
    const how = this.page.getByRole('group', { name: 'What is taken' });
    await how.getByRole('radio', { name: /good/i }).check();
    await this.page.getByRole('button', { name: 'Place the orders' }).dblclick();
    await expect(this.page.getByRole('heading', { name: 'Placed' })).toBeVisible();
    return (await this.page.locator('ul.placed li').allInnerTexts()).map(tidy);
  }

  get problem(): Locator {
    return this.page.getByRole('alert').filter({ hasText: /\S/ });
  }
}
