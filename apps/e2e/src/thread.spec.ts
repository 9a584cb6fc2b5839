import { expect, test } from '@playwright/test';
import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import { Books } from './helpers/books';
import { intentOf, payOutNow, type Payout } from './helpers/card-processor';
import { mailTo } from './helpers/mailbox';
import { goTo } from './helpers/navigation';
import { ANNEKE, NORA, RUBEN } from './helpers/people';
import { pounds, tidy } from './helpers/reading';
import { acceptQuote, OrderImport, quoteAPrice } from './helpers/rep-desk';
import { as } from './helpers/sign-in';
import { BasketPage, expectLadder, findSpecification } from './helpers/storefront';
import { ordersWorkbook } from './helpers/workbooks';
import { TODAY } from './stack/addresses';
import { BAD_ROWS, NORAS_ORDER, ORDERED_BY_WORKBOOK } from './worked-example';

// One day of the plant from the order to the bank, each step on the ones before it.
test.describe.configure({ mode: 'serial' });

const { lamb, beef, pork } = NORAS_ORDER;
let orderNumber = '';
let payoutOfHistory: Payout;
let weekBefore: ReconciliationWire;

test('the processor pays out what the history left, so that the next payout is this order alone', async ({
  browser,
}) => {
  payoutOfHistory = await payOutNow(browser);
  expect(payoutOfHistory.amount).toBeGreaterThan(0);
  weekBefore = await (await Books.open(ANNEKE)).week(TODAY);
  expect(weekBefore.exceptions).toEqual([]);
  expect(weekBefore.payouts.find(({ id }) => id === payoutOfHistory.id)?.amountMinor).toBe(payoutOfHistory.amount);
});

test('a rep quotes a case price, and the buyer who accepts it is told why she pays it', async ({ browser }) => {
  await as(browser, NORA, async (page) => {
    const steak = await findSpecification(page, beef.code, beef.code);
    await steak.choose('Trim level', '3');
    await steak.choose('Portion', '225');
    await steak.order('cases', '1');
    await steak.expectPrice(beef.priceBefore);
    expect(await steak.why()).not.toContainEqual(expect.stringContaining('quote'));
  });
  const number = await as(browser, RUBEN, (page) =>
    quoteAPrice(page, {
      customer: 'The Copper Ladle',
      code: beef.code,
      chosen: { 'Trim level': '3', Portion: '225' },
      price: '118.00',
      basis: 'case',
    }),
  );
  await mailTo('accounts@ladle.example', `Quote ${number} for The Copper Ladle`);
  await as(browser, NORA, async (page) => {
    await acceptQuote(page, number);
    const steak = await findSpecification(page, beef.code, beef.code);
    await steak.choose('Trim level', '3');
    await steak.choose('Portion', '225');
    await steak.order('cases', '1');
    await steak.expectPrice(beef.price);
    await steak.expectLadder(beef.ladder);
    expect((await steak.why()).join(' · ')).toMatch(new RegExp(`quote ${number}.*£118\\.00/case`, 'i'));
  });
});

test('the buyer orders by the piece, by the case and about a weight, and her card is held for the most', async ({
  browser,
}) => {
  await as(browser, NORA, async (page) => {
    await test.step('she sees the next delivery day and the time left', async () => {
      await expect(page.getByRole('banner')).toContainText(/Wed 2 Dec\s*delivery · order within\s*5 h \d+ min/);
    });
    await test.step('she finds the shoulder though she types it wrong', async () => {
      const shoulder = await findSpecification(page, 'lamb sholder rolld', lamb.code);
      await expect(page.getByRole('heading', { level: 1 })).toHaveText(lamb.name);
      await expect(shoulder.drawing).toHaveAccessibleName(/fat cover 8 mm at most.*weighs 1\.850\skg/);
      await shoulder.choose('Trim level', '4');
      await shoulder.choose('Joint weight', '1400');
      await expect(shoulder.drawing).toHaveAccessibleName(/fat cover 4 mm at most.*weighs 1\.400\skg/);
      await shoulder.order('joints', '4');
      await shoulder.expectPrice(lamb.price);
      await shoulder.expectLadder(lamb.ladder);
      await shoulder.addToOrder();
    });
    await test.step('a case of steaks at the quoted price', async () => {
      const steak = await findSpecification(page, 'striploin', beef.code);
      await steak.choose('Trim level', '3');
      await steak.choose('Portion', '225');
      await steak.order('cases', '1');
      await steak.expectPrice(beef.price);
      await steak.addToOrder();
    });
    await test.step('and about 12 kg of belly', async () => {
      const belly = await findSpecification(page, 'pork belly', pork.code);
      await belly.order('about kg', '12');
      await expect(page.getByText('Whole pieces nearest to that: 3 pieces')).toBeVisible();
      await belly.expectPrice(pork.price);
      await belly.expectLadder(pork.ladder);
      await belly.addToOrder();
    });
    const basket = await BasketPage.open(page);
    await basket.deliverOn(NORAS_ORDER.deliveryDayShort);
    for (const { name, ladder, price } of [lamb, beef, pork]) {
      await expectLadder(basket.line(name), ladder);
      await expect(basket.line(name).locator('p.price')).toContainText(price);
    }
    await basket.payByCard('4242');
    await basket.expectSum('Total, most likely', pounds(NORAS_ORDER.estimateMinor));
    await basket.expectSum('Between', `${pounds(NORAS_ORDER.leastMinor)} – ${pounds(NORAS_ORDER.holdMinor)}`);
    await basket.expectSum('Held on the card, at most', pounds(NORAS_ORDER.holdMinor));
    orderNumber = await basket.place();
    await expect(page.getByText('Card held')).toBeVisible();
  });

  const intent = await intentOf(orderNumber);
  expect(intent.status).toBe('requires_capture');
  expect(intent.amount_capturable).toBe(NORAS_ORDER.holdMinor);

  const mail = await mailTo(NORA.email, `Order ${orderNumber} is confirmed for ${NORAS_ORDER.deliveryDayLong}`);
  const text = tidy(mail.text);
  expect(text).toContain('weight 5.040 kg to 6.160 kg, most likely 5.600 kg: £67.48');
  expect(text).toContain('1 × case (24 pieces), £118.00 per case');
  expect(text).toContain('about 12.000 kg (3 pieces), £6.20 per kg');
  expect(text).toContain('Total: most likely £252.44, between £237.32 and £267.56.');
  expect(text).toContain('£267.56 is held on your card.');
});

test('a rep loads six customers’ orders from a workbook, bad rows told and left out', async ({ browser }) => {
  const file = await ordersWorkbook('friday.xlsx', [...ORDERED_BY_WORKBOOK, ...BAD_ROWS]);
  await as(browser, RUBEN, async (page) => {
    const sheet = await OrderImport.open(page);
    await sheet.choose(file);
    await expect(sheet.sums).toContainText('good rows: 6, orders: 6');
    await expect(sheet.sums).toContainText('cells with faults: 3');
    const faults = await sheet.faults();
    expect(faults).toHaveLength(3);
    expect(faults[0]).toMatch(/^8 D .*not offered/);
    expect(faults[1]).toMatch(/^9 B .*site/i);
    expect(faults[2]).toMatch(/^10 F /);
    const orders = await sheet.orders();
    expect(orders.map((text) => text.split(' · ')[0])).toEqual(ORDERED_BY_WORKBOOK.map(({ customer }) => customer));
    const placed = await sheet.takeGoodRows();
    expect(placed).toHaveLength(6);

    await test.step('the same file again is recognised, and leaving it changes nothing', async () => {
      await page.getByRole('button', { name: 'Load another' }).click();
      await sheet.choose(file);
      await expect(page.getByText('This very file was taken before, on')).toBeVisible();
      await page.getByRole('button', { name: 'Leave it, load another' }).click();
      await goTo(page, 'Orders');
      await page.getByLabel('Delivery day').fill(NORAS_ORDER.deliveryDay);
      const rows = page.getByRole('table', { name: 'Orders' }).locator('tbody tr');
      await expect(rows).toHaveCount(7);
    });
  });
});
