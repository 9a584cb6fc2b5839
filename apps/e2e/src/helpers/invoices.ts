import { expect, type Locator, type Page } from '@playwright/test';
import { entriesWithin } from './ledger';
import { goTo } from './navigation';
import { cellsOf, figure, rowOf, tidy } from './reading';

/** One invoice, as its buyer or the desk sees it. */
export class InvoicePage {
  private constructor(private readonly page: Page) {}

  /** Opens the invoice of an order. */
  static async open(page: Page, orderNumber: string): Promise<InvoicePage> {
    await goTo(page, 'Invoices');
    const table = page.getByRole('table', { name: 'Invoices' });
    await rowOf(table, new RegExp(`\\b${orderNumber}\\b`))
      .getByRole('link')
      .first()
      .click();
    await expect(page.getByRole('heading', { level: 1, name: /^Invoice \d+/ })).toBeVisible();
    const invoice = new InvoicePage(page);
    await expect(invoice.fact('Order')).toHaveText(orderNumber);
    return invoice;
  }

  async number(): Promise<string> {
    return /\d+/.exec(await this.page.getByRole('heading', { level: 1 }).innerText())?.[0] ?? '';
  }

  /** How it stands: "Paid". */
  get standing(): Locator {
    return this.page.locator('sw-invoice-standing');
  }

  /** "Total", "Paid", "Left to pay", "Held", "Let go again" and their like. */
  fact(term: string): Locator {
    return figure(this.page.getByRole('main'), term);
  }

  /** A line by what was sent: packs, pieces, kilograms, price, rate and amount. */
  async line(name: string): Promise<string[]> {
    const cells = await cellsOf(this.page.getByRole('table', { name: 'Lines of the invoice' }), name);
    return cells.slice(1);
  }

  /** What it posted, at the desk. */
  async posted(): Promise<string[]> {
    return entriesWithin(this.page.getByRole('main'));
  }

  /** Downloads the paper; gives where it lies. */
  async paper(): Promise<string> {
    const download = this.page.waitForEvent('download');
    await this.page.getByRole('button', { name: 'Download as PDF' }).click();
    return (await download).path();
  }

  /** The payment's stages as they are written. */
  async stages(): Promise<string[]> {
    const stages = this.page.getByRole('list', { name: 'Stages of the card payment' }).getByRole('listitem');
    return (await stages.allInnerTexts()).map(tidy);
  }
}
