import { expect, test } from '@playwright/test';
import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import { Books, spoken } from './helpers/books';
import { intentOf, moveProcessorClockTo, payOutNow, transactionOf, type Payout } from './helpers/card-processor';
import { moveClockTo } from './helpers/demo-clock';
import { attachmentOf, mailTo } from './helpers/mailbox';
import { goTo } from './helpers/navigation';
import { ANNEKE, FEMI, NORA, PETRA, RUBEN } from './helpers/people';
import { pdfText } from './helpers/papers';
import { CuttingDayPage, ScalePage } from './helpers/plant';
import { cellsOf, figure, pounds, tidy } from './helpers/reading';
import { acceptQuote, OrderImport, quoteAPrice } from './helpers/rep-desk';
import { as } from './helpers/sign-in';
import { BasketPage, expectLadder, findSpecification } from './helpers/storefront';
import { ordersWorkbook, rowStarting, sheetRows } from './helpers/workbooks';
import { TODAY } from './stack/addresses';
import { BAD_ROWS, CUTTING_LIST, NORAS_ORDER, ORDERED_BY_WORKBOOK } from './worked-example';

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

test('the planner closes the day; screen and workbook hold the same list', async ({ browser }) => {
  // The Thursday before, past every zone's cut-off.
  await moveClockTo('2026-12-03T16:05:00Z');
  await moveProcessorClockTo('2026-12-03T16:05:00Z');
  await as(browser, PETRA, async (page) => {
    const cutting = await CuttingDayPage.open(page, NORAS_ORDER.deliveryDay);
    await cutting.do('Close to orders');
    await expect(cutting.state).toHaveText('Closed to orders');
    const { shoulder, striploin, belly, day } = CUTTING_LIST;

    await test.step('the cutting list adds up what is the same', async () => {
      const lambs = cutting.table('Shoulder');
      const [, pieces, , out, primal] = await cellsOf(lambs, '1400 g');
      expect([pieces, out, primal]).toEqual([
        String(shoulder.trimmed.pieces),
        shoulder.trimmed.outKg,
        shoulder.trimmed.inKg,
      ]);
      expect((await cellsOf(lambs, /^Total/)).slice(1, 5)).toEqual(['11', '', '15.850', '24.153']);
      expect((await cellsOf(cutting.table('Striploin'), beef.code)).slice(1)).toEqual([
        String(striploin.pieces),
        striploin.ordered,
        striploin.outKg,
        striploin.inKg,
        String(striploin.minutes),
      ]);
      expect((await cellsOf(cutting.table('Belly'), /^Total/)).slice(1, 5)).toEqual(['8', '', '28.800', '33.490']);
      await expect(cutting.sum('Pieces')).toHaveText(String(day.pieces));
      await expect(cutting.sum('Expected out')).toHaveText(`${day.outKg} kg`);
      await expect(cutting.sum('Primal in')).toHaveText(`${day.inKg} kg`);
    });

    await test.step('the same by customer', async () => {
      await cutting.show('By customer');
      const noras = cutting.table('The Copper Ladle');
      expect((await cellsOf(noras, lamb.code)).slice(1)).toEqual([orderNumber, '4', '4 loose', '5.600']);
      expect((await cellsOf(noras, beef.code)).slice(1)).toEqual([orderNumber, '24', '1 case', '5.400']);
      expect((await cellsOf(noras, pork.code)).slice(1)).toEqual([orderNumber, '3', '3 loose', '10.800']);
    });

    const pulled = await test.step('the pull list covers what is needed with whole pieces', async () => {
      await cutting.show('Pull list');
      const pull = cutting.table('Pull list');
      const rows = await Promise.all(['Shoulder', 'Striploin', 'Belly'].map((name) => cellsOf(pull, name)));
      expect(rows.map(([, , , , needed]) => needed)).toEqual([shoulder.total.inKg, striploin.inKg, belly.total.inKg]);
      for (const [, , , weightIn, needed, , left] of rows)
        expect(Number(weightIn) - Number(needed)).toBeCloseTo(Number(left), 3);
      return rows;
    });

    await test.step('the workbook says the same in numbers', async () => {
      const path = await cutting.workbook();
      const list = await sheetRows(path, 'Cutting list');
      expect(rowStarting(list, 'Total').slice(4, 9)).toEqual([67, 1, 43, 55.45, 72.067]);
      expect(rowStarting(list, 'Striploin', beef.code).slice(4)).toEqual([48, 1, 24, 10.8, 14.424, 34]);
      expect(rowStarting(list, 'Shoulder in all').slice(4, 9)).toEqual([11, 0, 11, 15.85, 24.153]);
      const customers = await sheetRows(path, 'By customer');
      expect(rowStarting(customers, 'The Copper Ladle', orderNumber, beef.code).slice(5)).toEqual([24, 1, 0, 5.4]);
      const pull = await sheetRows(path, 'Pull list');
      for (const [row, name] of [
        [pulled[0], 'Shoulder'],
        [pulled[1], 'Striploin'],
        [pulled[2], 'Belly'],
      ] as const)
        expect(rowStarting(pull, `${name} in all`).slice(3, 8)).toEqual(row?.slice(2).map(Number));
    });
    await cutting.do('Send to the floor');
  });
});

test('the packer weighs every pack of the order and finishes it', async ({ browser }) => {
  await as(browser, FEMI, async (page) => {
    const scale = await ScalePage.open(page, orderNumber, NORAS_ORDER.deliveryDayShort);
    await scale.packLine(lamb.name, lamb.packs, 1);
    await scale.markShort(lamb.shortBecause);
    await expect(scale.line(lamb.name)).toContainText(/3 of 4\s*1 short/);
    await scale.packLine(beef.name, beef.packs, 2);
    await scale.packLine(pork.name, pork.packs, 1);
    await scale.finish(orderNumber);
  });
});

test('the card is charged for what was packed, and the rest is let go', async ({ browser }) => {
  await expect.poll(async () => (await intentOf(orderNumber)).status).toBe('succeeded');
  const intent = await intentOf(orderNumber);
  expect([intent.amount, intent.amount_received]).toEqual([NORAS_ORDER.holdMinor, NORAS_ORDER.invoiceMinor]);
  await as(browser, NORA, async (page) => {
    await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Orders' }).click();
    await page.getByRole('link', { name: orderNumber }).click();
    await expect(figure(page.getByRole('main'), 'Total as packed')).toHaveText(pounds(NORAS_ORDER.invoiceMinor));
    await expect(page.getByText(`${pounds(NORAS_ORDER.invoiceMinor)} was charged for the real weight.`)).toBeVisible();
  });
});

test('the invoice says what was weighed, on paper and in the ledger', async () => {
  const { invoiceMinor } = NORAS_ORDER;
  const books = await Books.open(ANNEKE);
  const invoice = await books.invoiceOf(orderNumber);
  expect([invoice.netMinor, invoice.taxMinor, invoice.totalMinor]).toEqual([invoiceMinor, 0, invoiceMinor]);
  await expect.poll(async () => (await books.invoiceOf(orderNumber)).paidMinor).toBe(invoiceMinor);

  const subject = `Invoice ${invoice.number} for ${NORAS_ORDER.deliveryDayLong}`;
  const mail = await mailTo('accounts@ladle.example', subject);
  expect(tidy(mail.text)).toContain(
    'Total: £239.00 £239.00 is taken from the card that was held for this order. There is nothing left to pay.',
  );
  const paper = await pdfText(await attachmentOf(mail));
  expect(paper).toContain(`Invoice ${invoice.number}`);
  for (const { packedKg, price, packedMinor } of [lamb, beef, pork])
    expect(paper).toContain(`${packedKg} ${price} 0 % ${pounds(packedMinor)}`);
  expect(paper).toContain('Total £239.00');

  const entries = (await books.entries(`&invoiceId=${invoice.id}`)).map(spoken);
  expect(entries).toEqual(['card-clearing 239.00 / receivables 239.00', 'receivables 239.00 / sales 239.00']);
});

test('the money is followed to the bank, to the penny, and the planted difference is the only exception', async ({
  browser,
}) => {
  const { invoiceMinor, feeMinor, payoutMinor } = NORAS_ORDER;
  const taken = await transactionOf(await intentOf(orderNumber));
  expect([taken.amount, taken.fee, taken.net]).toEqual([invoiceMinor, feeMinor, payoutMinor]);
  const payout = await payOutNow(browser);
  expect(payout.amount).toBe(payoutMinor);

  const books = await Books.open(ANNEKE);
  const arrival = new Date(payout.arrival_date * 1000).toISOString().slice(0, 10);
  const arrivalOfHistory = new Date(payoutOfHistory.arrival_date * 1000).toISOString().slice(0, 10);
  // The bank books the history's payout fifty pence short: the planted difference.
  const shortMinor = 50;
  await books.week(TODAY);
  const statement = await books.takeStatement('december.csv', [
    {
      day: arrivalOfHistory,
      text: 'CARD PAYOUT',
      reference: payoutOfHistory.id,
      amount: decimal(payoutOfHistory.amount - shortMinor),
    },
    { day: arrival, text: 'CARD PAYOUT', reference: payout.id, amount: '235.21' },
  ]);
  expect([statement.lines, statement.matched]).toEqual([2, 2]);

  const { week, payouts, exceptions, legs } = await books.week(TODAY);
  expect(week.capturedMinor - weekBefore.week.capturedMinor).toBe(invoiceMinor);
  expect(week.feesMinor - weekBefore.week.feesMinor).toBe(feeMinor);
  expect(week.paidOutMinor - weekBefore.week.paidOutMinor).toBe(payoutMinor);
  expect(week.bankMinor - weekBefore.week.bankMinor).toBe(payoutMinor + payoutOfHistory.amount - shortMinor);
  const ours = payouts.find(({ id }) => id === payout.id);
  expect([ours?.charges, ours?.partsNetMinor, ours?.amountMinor, ours?.bankLine?.amountMinor]).toEqual([
    1,
    payoutMinor,
    payoutMinor,
    payoutMinor,
  ]);
  expect(
    exceptions.map(({ leg, kind, cause, differenceMinor, payoutId }) => [leg, kind, cause, differenceMinor, payoutId]),
  ).toEqual([['bank', 'amount-differs', 'bank-booked-differently', -shortMinor, payoutOfHistory.id]]);
  for (const { leg, oursMinor, theirsMinor, waitingMinor } of legs)
    expect(theirsMinor - oursMinor + waitingMinor, leg).toBe(leg === 'bank' ? -shortMinor : 0);

  const entries = (await books.entries()).map(spoken);
  expect(entries).toContain('card-fees 3.79 / card-clearing 3.79');
  expect(entries).toContain('cash-in-transit 235.21 / card-clearing 235.21');
  expect(entries).toContain('bank 235.21 / cash-in-transit 235.21');
});

/** Whole pence as a bank writes them: 11673 → "116.73". */
const decimal = (minor: number): string => pounds(minor).replace(/[£,]/g, '');
