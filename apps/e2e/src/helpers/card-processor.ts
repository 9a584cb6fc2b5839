import { expect, type Browser } from '@playwright/test';
import { addresses } from '../stack/addresses';

/** What the stand-in keeps of a card payment; whole minor units. */
interface Intent {
  readonly id: string;
  readonly description: string | null;
  readonly status: string;
  readonly amount: number;
  readonly amount_capturable: number;
  readonly amount_received: number;
  readonly latest_charge: string | null;
}

interface BalanceTransaction {
  readonly type: string;
  readonly source: string | null;
  readonly amount: number;
  readonly fee: number;
  readonly net: number;
}

export interface Payout {
  readonly id: string;
  readonly amount: number;
  /** Seconds since 1970. */
  readonly arrival_date: number;
}

interface State {
  readonly paymentIntents: readonly Intent[];
  readonly balanceTransactions: readonly BalanceTransaction[];
  /** The oldest first. */
  readonly payouts: readonly Payout[];
  readonly payoutParts: readonly { readonly id: string; readonly payout: string }[];
}

const control = (lever: string): string => new URL(`control/${lever}`, addresses().cards).href;

export async function processorState(): Promise<State> {
  return (await (await fetch(control('state'))).json()) as State;
}

/** The card payment of an order as the processor holds it. */
export async function intentOf(orderNumber: string): Promise<Intent> {
  const { paymentIntents } = await processorState();
  const found = paymentIntents.find(({ description }) => description === `Order ${orderNumber}`);
  if (!found) throw new Error(`The processor knows no payment for order ${orderNumber}`);
  return found;
}

/** What the processor took for itself and what it owes us for a payment. */
export async function transactionOf(intent: Intent): Promise<BalanceTransaction> {
  const { balanceTransactions } = await processorState();
  const found = balanceTransactions.find(({ type, source }) => type === 'charge' && source === intent.latest_charge);
  if (!found) throw new Error(`Nothing was charged for ${intent.id}`);
  return found;
}

/** Lets the processor's time go on along with the plant's. */
export async function moveProcessorClockTo(instant: string): Promise<void> {
  const answer = await fetch(control('advance-clock'), {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ to: instant }),
  });
  if (!answer.ok) throw new Error(`The processor's clock did not move: ${await answer.text()}`);
}

/** Presses "Pay out now" on the stand-in's page; gives the new payout. */
export async function payOutNow(browser: Browser): Promise<Payout> {
  const before = (await processorState()).payouts.length;
  const page = await browser.newPage();
  try {
    await page.goto(addresses().cards);
    await page.getByRole('button', { name: /^Pay out now/ }).click();
    await expect.poll(async () => (await processorState()).payouts.length).toBe(before + 1);
  } finally {
    await page.close();
  }
  const payout = (await processorState()).payouts.at(-1);
  if (!payout) throw new Error('Nothing was paid out');
  return payout;
}
