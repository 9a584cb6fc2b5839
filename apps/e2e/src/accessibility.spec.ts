import { test } from '@playwright/test';
import { expectAccessible, settled } from './helpers/accessible';
import { addresses } from './stack/addresses';

test('nobody signed in: the entrances have no barrier', async ({ page }) => {
  const { storefront, admin } = addresses();
  for (const address of [`${storefront}sign-in`, `${storefront}forgotten-password`, `${admin}sign-in`]) {
    await page.goto(address);
    await settled(page);
    await expectAccessible(page);
  }
});
