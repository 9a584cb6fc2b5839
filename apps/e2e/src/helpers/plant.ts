import { expect, type Locator, type Page } from '@playwright/test';
import { confirm } from './confirm';
import { cellsOf, figure, figures, tidy } from './reading';
import { goTo } from './navigation';

export type DayDeed = 'Close to orders' | 'Send to the floor' | 'Finish the day';

/** The planner's cutting day. */
export class CuttingDayPage {
  constructor(private readonly page: Page) {}

  /** Opens the day of a delivery. */
  static async open(page: Page, deliveryDay: string): Promise<CuttingDayPage> {
    await goTo(page, 'Cutting days');
    await page.locator(`a[href$="/cutting-days/${deliveryDay}"]`).first().click();
    await expect(page.getByRole('tablist', { name: 'Lists' })).toBeVisible();
    return new CuttingDayPage(page);
  }

  /** Moves the day on and confirms it. */
  async do(deed: DayDeed): Promise<void> {
    await this.page.getByRole('button', { name: deed }).click();
    await confirm(this.page, deed);
    await expect(this.page.getByRole('button', { name: deed })).toHaveCount(0);
  }

  get state(): Locator {
    return this.page.getByRole('list', { name: 'States of the day' }).locator('[aria-current="step"] .label');
  }

  async show(list: 'Cutting list' | 'By customer' | 'Pull list'): Promise<Locator> {
    await this.page.getByRole('tab', { name: list }).click();
    return this.page.getByRole('tabpanel');
  }

  /** A table of the shown list, by its name or its customer's. */
  table(name: string): Locator {
    return this.page.getByRole('table', { name, exact: true });
  }

  /** A cut of the cutting list: pieces, how they were ordered, kilograms out and in, and minutes. */
  async cut(says: string | RegExp): Promise<string[]> {
    return (await cellsOf(this.table('Cutting list'), says)).slice(1);
  }

  /** The same of a primal, by its name, or of all: "Total". */
  async sumOf(name: string): Promise<string[]> {
    const row = this.table('Cutting list')
      .getByRole('row')
      .filter({ has: this.page.getByRole('rowheader', { name, exact: true }) });
    return (await row.locator('td').allInnerTexts()).map(tidy);
  }

  /** A figure of the day beside the lists. */
  figure(term: string): Locator {
    return figure(this.page.locator('.side'), term);
  }

  /** Minutes at a station. */
  minutesAt(station: string): Locator {
    return figures(this.page.locator('sw-station-bars'), station).nth(1);
  }

  /** Downloads the day's workbook; gives where it lies. */
  async workbook(): Promise<string> {
    const download = this.page.waitForEvent('download');
    await this.page.getByRole('button', { name: 'Cutting list as workbook' }).click();
    return (await download).path();
  }
}

export interface WeighedPack {
  /** What the scale shows, wrapping and all. */
  readonly grossGrams: number;
  /** What is left without the wrapping. */
  readonly netKg: string;
  /** Grams over its limits, and why it goes all the same. */
  readonly tooHeavyBy?: number;
  readonly reason?: string;
}

/** The packer's scale at one order. */
export class ScalePage {
  constructor(private readonly page: Page) {}

  static async open(page: Page, orderNumber: string, day: string): Promise<ScalePage> {
    await goTo(page, 'Scale');
    const days = page.getByRole('group', { name: 'Delivery day' });
    await expect(
      page
        .getByRole('listitem')
        .filter({ hasText: /to pack|Packed/ })
        .first(),
    ).toBeVisible();
    if (await days.isVisible()) await days.getByRole('radio', { name: day }).check();
    await page.getByRole('link', { name: new RegExp(`Order ${orderNumber}\\b`) }).click();
    await expect(page.getByRole('list', { name: 'Lines of the order' })).toBeVisible();
    return new ScalePage(page);
  }

  line(name: string): Locator {
    return this.page.getByRole('list', { name: 'Lines of the order' }).getByRole('button', { name });
  }

  async choose(name: string): Promise<void> {
    await this.line(name).click();
    await expect(this.line(name)).toHaveAttribute('aria-current', 'true');
  }

  /** Weighs the packs of a line one after the other, each with so many pieces. */
  async packLine(name: string, packs: readonly WeighedPack[], piecesEach: number): Promise<void> {
    await this.choose(name);
    for (const [at, pack] of packs.entries()) {
      await this.weigh(pack);
      await expect(this.line(name)).toContainText(`${(at + 1) * piecesEach} of `);
    }
  }

  /** What the bar of limits says of the weight. */
  private get verdict(): Locator {
    return this.page.locator('sw-limits-bar').getByRole('status');
  }

  /** Touches the weight in and packs it. */
  private async weigh({ grossGrams, netKg, tooHeavyBy, reason }: WeighedPack): Promise<void> {
    const pad = this.page.getByRole('group', { name: 'Weight in grams' });
    for (const digit of String(grossGrams)) await pad.getByRole('button', { name: digit, exact: true }).click();
    await expect(this.page.getByRole('status', { name: 'Net weight' })).toHaveText(netKg);
    const pack = this.page.getByRole('button', { name: 'Pack', exact: true });
    if (reason !== undefined) {
      await expect(this.verdict).toHaveText(`Too heavy by ${tooHeavyBy} g: weigh again, or say why`);
      await expect(pack).toBeDisabled();
      await this.page
        .getByRole('group', { name: 'Why is it out of its limits?' })
        .getByRole('radio', { name: reason })
        .check();
    }
    await pack.click();
  }

  /** Marks all that is open of the line as short. */
  async markShort(reason: string): Promise<void> {
    await this.page.getByRole('button', { name: 'Mark short' }).click();
    await this.page.getByRole('group', { name: 'Why' }).getByRole('radio', { name: reason }).check();
    await this.page.getByRole('button', { name: 'Mark short' }).click();
  }

  async finish(orderNumber: string): Promise<void> {
    await this.page.getByRole('button', { name: `Finish order ${orderNumber}` }).click();
    await expect(this.page.getByRole('link', { name: new RegExp(`Order ${orderNumber}\\b`) })).toContainText('Packed');
  }
}
