import {
  getReconciliation,
  importBankStatement,
  ledgerBalances,
  ledgerEntries,
  refreshReconciliation,
} from '@seamwright/accounts/contracts';
import { FakeProcessor, openAccountsHouse, type AccountsHouse } from '@seamwright/accounts/server/testing';
import { inTransaction, system } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { syncProcessor } from './sync-processor';

let now = new Date('2026-12-01T12:00:00Z');
let house: AccountsHouse;
let processor: FakeProcessor;

beforeAll(async () => {
  processor = new FakeProcessor(() => now);
  house = await openAccountsHouse(processor);
});
afterAll(() => house.close());

const moveTo = (instant: string): void => {
  now = new Date(instant);
  house.clock.set(now);
};
const statement = (name: string, rows: readonly string[]) => ({
  file: { name, bytes: Buffer.from(['Date,Description,Reference,Amount', ...rows].join('\n')) },
});
const rowsOf = (table: 'bankLines' | 'bankStatements') =>
  inTransaction(house.database, system('job'), (tx) => tx.selectFrom(table).select('id').execute());
const balances = async (): Promise<Record<string, number>> => {
  const { body } = await house.call(house.accountant, ledgerBalances, {});
  return Object.fromEntries(body.items.map(({ account, balanceMinor }) => [account, balanceMinor]));
};
const pounds = (minor: number): string => `${Math.floor(minor / 100)}.${String(minor % 100).padStart(2, '0')}`;

it('refuses an entry that does not balance, in the database', async () => {
  const entryId: string = newId();
  const posting = inTransaction(house.database, system('job'), async (tx) => {
    await tx
      .insertInto('journalEntries')
      .values({ id: entryId, kind: 'fee', sourceKey: 'test', text: 'test', postedOn: '2026-12-01', postedAt: now })
      .execute();
    const line = { entryId, currency: 'GBP' };
    await tx
      .insertInto('journalLines')
      .values([
        { id: newId(), ...line, account: 'card-fees', debitMinor: 131 },
        { id: newId(), ...line, account: 'card-clearing', creditMinor: 130 },
      ])
      .execute();
  });
  await expect(posting).rejects.toMatchObject({ constraint: 'journal_balances' });
});

it('shows the books to accounts only', async () => {
  for (const caller of [house.heron.buyer, house.rep]) {
    expect((await house.call(caller, ledgerBalances, {})).status).toBe(403);
    expect((await house.call(caller, getReconciliation, { query: {} })).status).toBe(403);
  }
});

describe('a week of card money', () => {
  beforeAll(async () => {
    const card = await house.keepCard(house.heron.buyer);
    for (let order = 0; order < 2; order++) {
      const placed = await house.place({ cardId: card.id });
      await house.pack(placed.id);
      await house.drain();
    }
  });

  it('says what we took and the processor told nothing of yet', async () => {
    const { body } = await house.call(house.accountant, getReconciliation, { query: {} });
    expect(body.exceptions).toMatchObject([
      { kind: 'missing-there', differenceMinor: -7370, act: 'ask-processor', orderNumber: expect.any(Number) },
      { kind: 'missing-there', differenceMinor: -7370 },
    ]);
  });

  it('posts fees, refunds and payouts once, however often it asks', async () => {
    const [charge] = processor.money;
    processor.refund(charge?.chargeId ?? '', 1000);
    moveTo('2026-12-02T09:00:00Z');
    const payout = processor.payOut();
    // 2 × (£73.70 − £1.31) − £10.00
    expect(payout.amountMinor).toBe(13_478);
    const first = await house.call(house.accountant, refreshReconciliation, {});
    expect(first.body).toEqual({ transactions: 4, payouts: 1 });
    const parts = { ...house.parts };
    const again = await Promise.all([syncProcessor(house.jobs, parts), syncProcessor(house.jobs, parts)]);
    expect(again).toEqual([
      { transactions: 0, payouts: 0 },
      { transactions: 0, payouts: 0 },
    ]);
    expect(await balances()).toMatchObject({
      receivables: 1000,
      sales: -14_740,
      'card-clearing': 0,
      'card-fees': 262,
      'cash-in-transit': 13_478,
    });
    const { body } = await house.call(house.accountant, getReconciliation, { query: {} });
    expect(body.clearing).toMatchObject({ ledgerMinor: 0, toldMinor: 0, processorMinor: 0 });
    expect(body.exceptions).toEqual([]);
    expect(body.legs.find(({ leg }) => leg === 'bank')).toMatchObject({ waitingMinor: 13_478 });
  });

  it('takes a statement and matches the payout, by amount and day where no reference is given', async () => {
    const rows = [`2026-12-03,CARD PAYOUT,,${pounds(13_478)}`, '2026-12-03,RENT,,"-1,200.00"'];
    const taken = await house.call(house.accountant, importBankStatement, statement('one.csv', rows));
    expect(taken.body).toMatchObject({ lines: 2, matched: 1, firstDay: '2026-12-03', sumMinor: 13_478 - 120_000 });
    expect(await balances()).toMatchObject({ 'cash-in-transit': 0, bank: 13_478 });
    const { body } = await house.call(house.accountant, getReconciliation, { query: {} });
    expect(body.payouts).toMatchObject([
      { charges: 2, refunds: 1, partsNetMinor: 13_478, bankLine: { matchedBy: 'amount-and-date' } },
    ]);
    expect(body.legs.every(({ exceptions }) => exceptions === 0)).toBe(true);
  });

  it('keeps what nobody explains apart, so that the clearing account still equals the balance', async () => {
    processor.money.push({
      id: 'txn_foreign',
      type: 'charge',
      sourceId: 'ch_foreign',
      chargeId: 'ch_foreign',
      amountMinor: 5000,
      feeMinor: 95,
      netMinor: 4905,
      currency: 'GBP',
      createdAt: now,
      availableAt: now,
      payoutId: null,
    });
    await syncProcessor(house.jobs, house.parts);
    expect(await balances()).toMatchObject({ 'card-clearing': 4905, 'card-adjustments': -5000 });
    const { body } = await house.call(house.accountant, getReconciliation, { query: {} });
    expect(body.clearing).toMatchObject({ ledgerMinor: 4905, toldMinor: 4905, processorMinor: 4905 });
    expect(body.exceptions).toMatchObject([{ kind: 'missing-here', chargeId: 'ch_foreign', differenceMinor: 5000 }]);
  });

  it('tells when the processor does not answer', async () => {
    const payouts = jest.spyOn(processor, 'payouts');
    const { ProcessorSilent } = await import('./processor');
    payouts.mockRejectedValueOnce(new ProcessorSilent(new Error('timeout')));
    const refused = await house.call(house.accountant, refreshReconciliation, {});
    expect(refused.problem).toMatchObject({ status: 409, code: 'processor-silent' });
    payouts.mockRestore();
  });

  it('lists entries whole, newest first, page by page and by account', async () => {
    const first = await house.call(house.accountant, ledgerEntries, { query: { limit: 2 } });
    expect(first.body.items).toHaveLength(2);
    const cursor = first.body.nextCursor ?? '';
    const second = await house.call(house.accountant, ledgerEntries, { query: { limit: 2, cursor } });
    const numbers = [...first.body.items, ...second.body.items].map(({ number }) => number);
    expect(numbers).toEqual([...numbers].sort((a, b) => b - a));
    const sales = await house.call(house.accountant, ledgerEntries, { query: { account: 'sales' } });
    expect(sales.body.items.map(({ kind }) => kind)).toEqual(['invoice', 'invoice']);
    expect(sales.body.items[0]?.lines).toMatchObject([
      { account: 'receivables', debitMinor: 7370, customerName: 'The Heron Rooms' },
      { account: 'sales', creditMinor: 7370 },
    ]);
    const foreign = await house.call(house.accountant, ledgerEntries, { query: { cursor: 'bm90IG91cnM' } });
    expect(foreign.status).toBe(422);
  });
});

describe('a statement that can not be taken', () => {
  it.each([
    ['a workbook', Buffer.from('PK\u0003\u0004\0\0'), 'statement-unreadable'],
    ['nothing', Buffer.from(''), 'statement-empty'],
    ['other columns', Buffer.from('a,b\n1,2\n'), 'statement-column-missing'],
  ])('%s is refused as a whole', async (_what, bytes, code) => {
    const { problem } = await house.call(house.accountant, importBankStatement, { file: { name: 'x.csv', bytes } });
    expect(problem).toMatchObject({ status: 422, code });
  });

  it('names every fault by line and column, and stores nothing', async () => {
    const before = await rowsOf('bankLines');
    const rows = ['2026-12-03,good,,1.00', '2026-13-03,bad day,,1.00', '2026-12-03,bad amount,,1.2.3'];
    const { problem } = await house.call(house.accountant, importBankStatement, statement('bad.csv', rows));
    expect(problem).toMatchObject({ status: 422, code: 'statement-has-faults' });
    expect(problem.errors.map(({ pointer }) => pointer)).toEqual(['/lines/3/Date', '/lines/4/Amount']);
    expect(await rowsOf('bankLines')).toHaveLength(before.length);
  });

  it('is refused when it was taken already, or is too large', async () => {
    const same = statement('same.csv', ['2026-12-03,once,,1.00']);
    expect((await house.call(house.accountant, importBankStatement, same)).status).toBe(201);
    const before = await rowsOf('bankStatements');
    const twice = await house.call(house.accountant, importBankStatement, same);
    expect(twice.problem).toMatchObject({ status: 409, code: 'statement-taken-already' });
    const bytes = Buffer.alloc(5 * 1024 * 1024 + 1, 'x');
    const huge = await house.call(house.accountant, importBankStatement, { file: { name: 'huge.csv', bytes } });
    expect(huge.status).toBe(413);
    expect(await rowsOf('bankStatements')).toHaveLength(before.length);
  });
});
