import { expect, test, type Page } from '@playwright/test';
import { expectAccessible, settled } from './helpers/accessible';
import { ADA, ANNEKE, FEMI, NORA, PETRA, RUBEN, TAMSIN, type Person } from './helpers/people';
import { as } from './helpers/sign-in';
import { BasketPage, findSpecification } from './helpers/storefront';
import { addresses } from './stack/addresses';

/** A page by its address, or by what leads to it from the page before. */
type Stop = string | ((page: Page) => Promise<unknown>);

/** Follows the first link of the page that leads to such an address. */
const first =
  (address: string): Stop =>
  (page) =>
    page.getByRole('main').locator(`a[href*="${address}"]`).first().click();

async function walk(page: Page, stops: readonly Stop[]): Promise<void> {
  for (const stop of stops) {
    if (typeof stop === 'string') await page.goto(stop);
    else await stop(page);
    await settled(page);
    await expectAccessible(page);
  }
}

const fillBasket: Stop = async (page) => {
  const steak = await findSpecification(page, 'BF-201', 'BF-201');
  await steak.order('cases', '1');
  await steak.addToOrder();
  await BasketPage.open(page);
  await expect(page.getByText('Total, most likely')).toBeVisible();
};

const ROLES: readonly (readonly [string, Person, readonly Stop[]])[] = [
  [
    'a buyer',
    NORA,
    ['catalogue', 'catalogue/LM-104', fillBasket, 'orders', first('/orders/'), 'quotes', 'invoices', 'cards', 'team'],
  ],
  [
    'a rep',
    RUBEN,
    [
      './',
      'orders',
      first('/orders/0'),
      'orders/new',
      'order-import',
      'quotes/new',
      'price-lists',
      first('price-lists/'),
    ],
  ],
  ['technical', TAMSIN, ['specifications', 'specifications/LM-104']],
  ['a planner', PETRA, ['cutting-days', 'cutting-days/2026-12-02', 'lots', 'lots/receive']],
  ['the floor', FEMI, ['scale', first('/scale/2')]],
  ['accounts', ANNEKE, ['invoices', first('/invoices/'), 'payments', 'reconciliation', 'ledger', 'calendar']],
  ['the administrator', ADA, ['customers', first('/customers/0'), 'people', 'calendar']],
];

test('nobody signed in: the entrances have no barrier', async ({ page }) => {
  const { storefront, admin } = addresses();
  await walk(page, [`${storefront}sign-in`, `${storefront}forgotten-password`, `${admin}sign-in`]);
});

for (const [role, person, stops] of ROLES)
  test(`${role}: no barrier on any page, wide and light or narrow and dark`, async ({ browser }) => {
    await as(browser, person, (page) => walk(page, stops));
  });
