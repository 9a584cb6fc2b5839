import { expect, test, type Locator, type Page } from '@playwright/test';
import { moveClockTo } from './helpers/demo-clock';
import { ADA, ANNEKE, LUCIAN, NORA, RUBEN } from './helpers/people';
import { goTo } from './helpers/navigation';
import { wordInPassing } from './helpers/reading';
import { bankStatement, ReconciliationPage } from './helpers/reconciliation';
import { OrderImport } from './helpers/rep-desk';
import { as } from './helpers/sign-in';
import { BasketPage, findSpecification, offerCard } from './helpers/storefront';
import { TODAY } from './stack/addresses';

/** Opens the buyer's list of orders; gives its rows, once there are any. */
async function orderRows(page: Page): Promise<Locator> {
  await goTo(page, 'Orders');
  const rows = page.getByRole('table', { name: 'Orders' }).locator('tbody tr');
  await expect(rows.first()).toBeVisible();
  return rows;
}

async function openCustomer(page: Page, name: string): Promise<void> {
  await goTo(page, 'Customers');
  await page.getByRole('link', { name }).click();
  await expect(page.getByRole('heading', { name, level: 1 })).toBeVisible();
}

const vatNumber = (page: Page) => page.getByLabel('VAT number');
const save = (page: Page) => page.getByRole('button', { name: 'Save the customer' });

test('a stale edit is told what changed, and keeps what was typed', async ({ browser }) => {
  await as(browser, ADA, (mine) =>
    as(browser, ANNEKE, async (other) => {
      await openCustomer(mine, 'Tarnside Farm Shop');
      await openCustomer(other, 'Tarnside Farm Shop');
      await mine.getByLabel('Billing address').fill('The Byre, Tarnside, Upper Withenbeck, WB5 3TF');
      await vatNumber(other).fill('GB 000 0000 05');
      await save(other).click();
      await expect(wordInPassing(other)).toContainText('was saved');

      await save(mine).click();
      await expect(mine.getByRole('heading', { name: 'Somebody changed this since you opened it' })).toBeVisible();
      await expect(mine.getByText('GB 000 0000 05')).toBeVisible();
      await expect(mine.getByLabel('Billing address')).toHaveValue('The Byre, Tarnside, Upper Withenbeck, WB5 3TF');

      await mine.getByRole('button', { name: 'Keep mine, I will save again' }).click();
      await save(mine).click();
      await expect(wordInPassing(mine)).toContainText('was saved');
      await mine.reload();
      await expect(mine.getByLabel('Billing address')).toHaveValue('The Byre, Tarnside, Upper Withenbeck, WB5 3TF');
    }),
  );
});

test('an order sent twice, its first answer lost, is one order', async ({ browser }) => {
  await as(browser, LUCIAN, async (page) => {
    const before = await (await orderRows(page)).count();
    const rib = await findSpecification(page, 'BF-202', 'BF-202');
    await rib.order('steaks', '4');
    await rib.addToOrder();
    const basket = await BasketPage.open(page);
    await basket.deliverOn('Mon 7 Dec');
    await basket.payOnAccount();

    let lost = 0;
    await page.route(/\/api\/v1\/orders$/, async (route) => {
      if (route.request().method() !== 'POST' || lost > 0) return route.continue();
      lost += 1;
      await route.fetch();
      return route.abort('connectionreset');
    });
    await basket.placing.click();
    await expect(page.getByText('Your basket is kept on this device.')).toBeVisible();
    expect(lost).toBe(1);
    await basket.place();
    await expect(await orderRows(page)).toHaveCount(before + 1);
  });
});

test('past the cut-off the order is refused in words, and the basket is kept', async ({ browser }) => {
  await as(browser, LUCIAN, async (page) => {
    const rib = await findSpecification(page, 'BF-202', 'BF-202');
    await rib.order('steaks', '2');
    await rib.addToOrder();
    const basket = await BasketPage.open(page);
    await basket.deliverOn('Wed 2 Dec');
    await basket.payOnAccount();
    await expect(basket.placing).toBeEnabled();
    // The fell side's cut-off is 15:00.
    await moveClockTo(`${TODAY}T15:01:00Z`);
    try {
      await basket.placing.click();
      await expect(page.getByRole('alert').filter({ hasText: /cut-off|closed|no longer/i })).toBeVisible();
      await expect(basket.line('Rib-eye steak')).toBeVisible();
      await page.reload();
      await expect(basket.line('Rib-eye steak')).toBeVisible();
      await expect(page.getByRole('banner')).not.toContainText('Wed 2 Dec');
    } finally {
      await moveClockTo(`${TODAY}T10:00:00Z`);
    }
  });
});

test('a card that the bank declines is not kept, and she is told', async ({ browser }) => {
  await as(browser, NORA, async (page) => {
    await offerCard(page, /^Visa, declined(?! later)/);
    await expect(page.getByRole('alert').filter({ hasText: 'This card was refused' })).toBeVisible();
    const kept = page.getByRole('list', { name: 'Cards that are kept' });
    await expect(kept.getByRole('listitem').first()).toBeVisible();
    await expect(kept.getByRole('listitem').filter({ hasText: '0002' })).toHaveCount(0);
  });
});

test('a bank statement that can’t be read is refused whole, each cell told', async ({ browser }) => {
  await as(browser, ANNEKE, async (page) => {
    const week = await ReconciliationPage.open(page);
    await week.chooseStatement(
      bankStatement('torn.csv', [
        { day: '2026-12-01', reference: 'RENT', amount: '-900.00' },
        { day: '31/31/2026', reference: 'CARDS', amount: 'twelve' },
      ]),
    );
    const faults = page.getByRole('table', { name: "Cells that can't be read" }).locator('tbody tr');
    await expect(faults).toHaveCount(2);
    await expect(faults.filter({ hasText: 'Date' })).toHaveCount(1);
    await expect(faults.filter({ hasText: 'Amount' })).toHaveCount(1);
    await expect(page.getByText('is taken:')).toHaveCount(0);
  });
});

test('a file that is no workbook is refused and nothing is placed', async ({ browser }) => {
  await as(browser, RUBEN, async (page) => {
    const sheet = await OrderImport.open(page);
    const mimeType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
    await sheet.choose({
      name: 'orders.xlsx',
      mimeType,
      buffer: Buffer.from('customer;code;quantity\nladle;LM-104;4\n'),
    });
    await expect(page.getByRole('alert').filter({ hasText: /workbook/i })).toBeVisible();
    await sheet.choose({ name: 'orders.csv', mimeType: 'text/csv', buffer: Buffer.from('customer;code\n') });
    await expect(page.getByRole('alert').filter({ hasText: /\.xlsx/i })).toBeVisible();
    await expect(page.getByRole('button', { name: 'Place the orders' })).toHaveCount(0);
  });
});

test('another customer’s order is not there, whoever knows its address', async ({ browser }) => {
  const address = await as(browser, NORA, async (page) => {
    await goTo(page, 'Orders');
    await page.getByRole('table', { name: 'Orders' }).locator('tbody a').first().click();
    await expect(page.getByRole('heading', { level: 1, name: /Order \d+/ })).toBeVisible();
    return page.url();
  });
  await as(browser, LUCIAN, async (page) => {
    await page.goto(address);
    await expect(page.getByRole('alert')).toBeVisible();
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Order');
    await expect(page.getByText('The Copper Ladle')).toHaveCount(0);
  });
});
