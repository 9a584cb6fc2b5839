import { expect, type Page } from '@playwright/test';

/** Answers the question that is asked before something that can't be taken back. */
export async function confirm(page: Page, act: string | RegExp): Promise<void> {
  const question = page.getByRole('alertdialog');
  await question.getByRole('button', { name: act }).click();
  await expect(question).toHaveCount(0);
}
