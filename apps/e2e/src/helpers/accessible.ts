import { AxeBuilder } from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** WCAG 2.2 at levels A and AA, and the earlier versions it stands on. */
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Each theme and each width once: colours follow the theme alone, places the width alone. */
const VIEWS = [
  { width: 1440, colorScheme: 'light' },
  { width: 390, colorScheme: 'dark' },
] as const;
const HEIGHT = 900;

/** What axe holds against a page, a line for each kind of fault with where it first stands. */
async function violations(page: Page): Promise<string[]> {
  const { violations: found } = await new AxeBuilder({ page }).withTags(RULES).analyze();
  return found.map(({ id, help, nodes }) => `${id}: ${help} (${nodes.length} × ${nodes[0]?.target.join(' ') ?? ''})`);
}

/** Waits until a page shows what it has fetched. */
export async function settled(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.locator('sw-loading, [aria-busy="true"]')).toHaveCount(0);
}

/** Expects no violation on the page as it stands, wide in the light theme and narrow in the dark one. */
export async function expectAccessible(page: Page): Promise<void> {
  for (const { width, colorScheme } of VIEWS) {
    await page.setViewportSize({ width, height: HEIGHT });
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    expect.soft(await violations(page), `${page.url()}, ${colorScheme}, ${width} px`).toEqual([]);
  }
  await page.setViewportSize({ width: VIEWS[0].width, height: HEIGHT });
}
