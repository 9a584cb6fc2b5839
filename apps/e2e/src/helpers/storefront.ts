import { expect, type Locator, type Page } from '@playwright/test';
import { goTo } from './navigation';
import { figure, figures, tidy } from './reading';

/** What a line will come to, at least, most likely and at most, as the ladder shows it. */
export interface Ladder {
  readonly atLeast: readonly [money: string, weight: string];
  readonly mostLikely: readonly [money: string, weight: string];
  readonly atMost: readonly [money: string, weight: string];
}

/** Expects the weight and price ladder in a part of a page. */
export async function expectLadder(within: Locator, { atLeast, mostLikely, atMost }: Ladder): Promise<void> {
  for (const [rung, [money, weight]] of [
    ['at least', atLeast],
    ['most likely', mostLikely],
    ['at most', atMost],
  ] as const) {
    await expect(figures(within, rung)).toHaveText([money, weight]);
  }
}

/** The catalogue: finds a specification by words, however they are spelt, and opens it. */
export async function findSpecification(page: Page, words: string, code: string): Promise<SpecificationPage> {
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Catalogue' }).click();
  await page.getByRole('searchbox', { name: 'Search the catalogue' }).fill(words);
  // The search goes off once typing rests; until then the list is the one before.
  await page.waitForURL((url) => url.searchParams.get('q') === words);
  const found = page.getByRole('region', { name: 'What was found' });
  await expect(found).toHaveAttribute('aria-busy', 'false');
  // The first card is the one that was meant.
  await expect(found.getByRole('listitem').first()).toContainText(code);
  await found.getByRole('listitem').first().getByRole('link').click();
  const specification = new SpecificationPage(page);
  await expect(page.getByText(`${code} · version 1`)).toBeVisible();
  return specification;
}

/** A specification with its choices and the buyer's own price. */
export class SpecificationPage {
  private readonly buyBox: Locator;

  constructor(private readonly page: Page) {
    this.buyBox = page.getByRole('complementary', { name: 'Choices and price' });
  }

  /** Chooses a value of a choice: "Trim level", "4". */
  async choose(choice: string, value: string): Promise<void> {
    await this.buyBox
      .getByRole('group', { name: new RegExp(`^${choice}`) })
      .getByRole('radio', { name: new RegExp(`^${value}\\b`) })
      .check();
  }

  /** Says how it is ordered, by "joints", "cases" or "about kg", and how much. */
  async order(by: string, amount: string): Promise<void> {
    await this.choose('Order by', by);
    const quantity = this.buyBox.getByRole('spinbutton');
    await quantity.fill(amount);
    await quantity.blur();
  }

  async expectPrice(price: string): Promise<void> {
    await expect(this.buyBox.locator('.price .big')).toHaveText(price);
  }

  async expectLadder(ladder: Ladder): Promise<void> {
    await expectLadder(this.buyBox, ladder);
  }

  /** What the page says about how the price came about: each part with its figure. */
  async why(): Promise<string[]> {
    await this.buyBox.getByRole('button', { name: /^why this price/ }).click();
    const panel = this.page.getByRole('dialog');
    const parts = (await panel.locator('.part').allInnerTexts()).map(tidy);
    await panel.getByRole('button', { name: 'Close' }).click();
    await expect(panel).toHaveCount(0);
    return parts;
  }

  /** The drawing's words: they are redrawn with each choice. */
  get drawing(): Locator {
    return this.page.getByRole('img', { name: /^Drawing to scale/ });
  }

  async addToOrder(): Promise<void> {
    const link = this.page.getByRole('link', { name: /^Basket/ });
    const lines = Number(/\d+/.exec((await link.getAttribute('aria-label')) ?? (await link.innerText()))?.[0] ?? 0);
    await this.buyBox.getByRole('button', { name: 'Add to order' }).click();
    await expect(this.page.getByRole('link', { name: new RegExp(`^Basket, ${lines + 1} line`) })).toBeVisible();
  }
}

/** Gives one of the processor's test cards to be kept, by its name: "Mastercard". */
export async function offerCard(page: Page, card: string | RegExp): Promise<void> {
  await goTo(page, 'Invoices');
  await page.getByRole('link', { name: 'Cards', exact: true }).click();
  await page.getByRole('button', { name: 'Add a card' }).click();
  await page.getByRole('group', { name: 'Test card' }).getByRole('radio', { name: card }).check();
  await page.getByRole('button', { name: 'Keep this card' }).click();
}

/** Keeps a test card; gives the digits it ends in. */
export async function keepCard(page: Page, card: string): Promise<string> {
  await offerCard(page, card);
  const kept = page.getByRole('list', { name: 'Cards that are kept' }).getByRole('listitem').filter({ hasText: card });
  return /\d{4}/.exec(await kept.innerText())?.[0] ?? '';
}

/** The basket and its checkout. */
export class BasketPage {
  readonly sums: Locator;

  constructor(private readonly page: Page) {
    this.sums = page.getByRole('complementary');
  }

  static async open(page: Page): Promise<BasketPage> {
    await page.getByRole('link', { name: /^Basket/ }).click();
    await expect(page.getByRole('heading', { name: 'Basket', level: 1 })).toBeVisible();
    return new BasketPage(page);
  }

  line(name: string): Locator {
    return this.page.locator('sw-basket-line-row').filter({ has: this.page.getByRole('heading', { name }) });
  }

  /** Chooses the delivery day as it is written: "Fri 4 Dec". */
  async deliverOn(day: string): Promise<void> {
    await this.choose('Delivery day', day);
  }

  async payOnAccount(): Promise<void> {
    await this.choose('How it is paid', 'On account');
  }

  /** Pays by the card that ends in these digits. */
  async payByCard(last4: string): Promise<void> {
    await this.choose('How it is paid', 'By card');
    await this.page.getByRole('group', { name: 'Card' }).getByRole('radio', { name: last4 }).first().check();
  }

  async expectSum(term: string, money: string): Promise<void> {
    await expect(figure(this.sums, term)).toHaveText(money);
  }

  get placing(): Locator {
    return this.sums.getByRole('button', { name: /^Plac/ });
  }

  /** Places the order; gives its number. */
  async place(): Promise<string> {
    await this.placing.click();
    return this.placedNumber();
  }

  /** The number of the order that was just placed. */
  async placedNumber(): Promise<string> {
    await this.page.waitForURL(/\/basket\/placed\//);
    const heading = this.page.getByRole('heading', { level: 1, name: /^Order \d+/ });
    await expect(heading).toBeVisible();
    return /\d+/.exec(await heading.innerText())?.[0] ?? '';
  }

  private async choose(group: string, option: string): Promise<void> {
    const radio = this.page.getByRole('group', { name: group }).getByRole('radio', { name: new RegExp(`^${option}`) });
    await radio.check();
    await expect(radio).toBeChecked();
  }
}
