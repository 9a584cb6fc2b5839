import { expect, type Browser, type BrowserContextOptions, type Page } from '@playwright/test';
import { addresses } from '../stack/addresses';
import { passwordOf, type Person } from './people';

/** Signs somebody in to her application, in a browser of her own, and waits for her first page. */
export async function signIn(browser: Browser, person: Person, options: BrowserContextOptions = {}): Promise<Page> {
  const context = await browser.newContext({ baseURL: addresses()[person.application], ...options });
  const page = await context.newPage();
  await page.goto('sign-in');
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password', { exact: true }).fill(passwordOf(person));
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('button', { name: person.name })).toBeVisible();
  return page;
}

/** Plays a person's part and closes her browser, whatever comes of it. */
export async function as<T>(browser: Browser, person: Person, play: (page: Page) => Promise<T>): Promise<T> {
  const page = await signIn(browser, person);
  try {
    return await play(page);
  } finally {
    await page.context().close();
  }
}
