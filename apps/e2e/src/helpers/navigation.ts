import { expect, type Page } from '@playwright/test';

/** Goes to a place by its link in the bar, or in the menu where the bar has no room for all of them. */
export async function goTo(page: Page, place: string): Promise<void> {
  const inBar = page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: place, exact: true });
  const menu = page.getByRole('button', { name: 'Menu' });
  await expect(inBar.or(menu)).toBeVisible();
  if (await inBar.isVisible()) await inBar.click();
  else {
    await menu.click();
    await page.getByRole('navigation', { name: 'Menu' }).getByRole('link', { name: place, exact: true }).click();
  }
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
}
