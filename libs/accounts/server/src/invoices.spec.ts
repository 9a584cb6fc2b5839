import { execFileSync } from 'node:child_process';
import { getInvoice, getInvoicePdf, listInvoices } from '@seamwright/accounts/contracts';
import { invoiceTotal } from '@seamwright/accounts/domain';
import { FakeProcessor, openAccountsHouse, type AccountsHouse } from '@seamwright/accounts/server/testing';
import { inTransaction, system, type Caller } from '@seamwright/shared/server';
import { grams, minorUnits, ppm } from '@seamwright/shared/util';
import type { InvoicePaper } from './invoice-paper';
import { invoicePdf } from './invoice-pdf';
import { makeInvoice } from './make-invoice';

const NOW = new Date('2026-12-01T12:00:00Z');
let house: AccountsHouse;

beforeAll(async () => {
  house = await openAccountsHouse(new FakeProcessor(() => NOW));
});
afterAll(() => house.close());

// The reader is a module of the newer kind, which the test runner can't load, so it has a process of its own.
const READER = `
  import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
  const chunks = [];
  for await (const chunk of process.stdin) chunks.push(chunk);
  const pdf = await getDocument({ data: new Uint8Array(Buffer.concat(chunks)), verbosity: 0 }).promise;
  const pages = [];
  for (let page = 1; page <= pdf.numPages; page++) {
    const { items } = await (await pdf.getPage(page)).getTextContent();
    pages.push(items.map(({ str }) => str).join(' ').replace(/\\s+/g, ' '));
  }
  process.stdout.write(JSON.stringify(pages));`;

const pagesOf = (bytes: Buffer): string[] =>
  JSON.parse(
    execFileSync(process.execPath, ['--input-type=module', '-e', READER], { input: bytes }).toString('utf8'),
  ) as string[];

const invoices = async (caller: Caller = house.accountant) => {
  const { body } = await house.call(caller, listInvoices, { query: { limit: 200 } });
  return body.items;
};

it('numbers invoices without a gap, made at once, with one that was rolled back between', async () => {
  const placed = await Promise.all(Array.from({ length: 6 }, () => house.place()));
  for (const { id } of placed) await house.pack(id);
  const make = (orderId: string, fail = false) =>
    inTransaction(house.database, system('job'), async (tx) => {
      await makeInvoice(tx, house.parts, NOW, orderId);
      if (fail) throw new Error('rolled back');
    });
  const [first, ...others] = placed.map(({ id }) => id);
  const results = await Promise.allSettled([
    make(first ?? '', true),
    ...others.map((id) => make(id)),
    // Told twice at once: only one is made.
    ...others.slice(0, 2).map((id) => make(id)),
  ]);
  expect(results.filter(({ status }) => status === 'rejected')).toHaveLength(1);
  await house.drain();
  const numbers = (await invoices()).map(({ number }) => number).sort((a, b) => a - b);
  expect(numbers).toEqual([2001, 2002, 2003, 2004, 2005, 2006]);
});

it('makes no invoice for an order of which nothing was packed', async () => {
  const placed = await house.place();
  await inTransaction(house.database, system('job'), (tx) =>
    tx.updateTable('orders').set({ packedAt: NOW, releasedAt: NOW }).where('id', '=', placed.id).execute(),
  );
  await inTransaction(house.database, system('job'), (tx) => makeInvoice(tx, house.parts, NOW, placed.id));
  expect((await invoices()).some(({ order }) => order.id === placed.id)).toBe(false);
});

it('shows a buyer her own invoices only, and to a buyer of one site those of that site', async () => {
  const theirs = await house.place({ buyer: 'quayside' });
  await house.pack(theirs.id);
  await house.drain();
  const [invoice] = await invoices(house.quayside.buyer);
  expect(invoice?.order.id).toBe(theirs.id);
  const params = { invoiceId: invoice?.id ?? '' };
  expect((await house.call(house.heron.buyer, getInvoice, { params })).status).toBe(404);
  expect((await house.call(house.heron.buyer, getInvoicePdf, { params })).status).toBe(404);
  expect((await invoices(house.heron.buyer)).length).toBeGreaterThan(0);
  expect(await invoices(house.heron.annexeBuyer)).toEqual([]);
});

it('is a paper of one page with searchable numbers', async () => {
  const [invoice] = await invoices(house.heron.buyer);
  const params = { invoiceId: invoice?.id ?? '' };
  const { bytes, headers } = await house.call(house.heron.buyer, getInvoicePdf, { params });
  expect(headers['content-type']).toBe('application/pdf');
  const pages = pagesOf(bytes);
  expect(pages).toHaveLength(1);
  const { body } = await house.call(house.heron.buyer, getInvoice, { params });
  for (const words of [
    `Invoice ${body.number}`,
    'The Heron Rooms',
    '2.800',
    '£24.00/kg',
    '£67.20',
    '£6.50',
    '£73.70',
    'Tax rate',
    'Alder Row Meats',
    body.reference.replace(/.{4}(?=.)/g, '$& '),
    'Please pay £73.70 by',
  ])
    expect(pages[0]).toContain(words);
});

it('goes on over as many pages as it needs, with the heads of its columns on each', async () => {
  const line = {
    orderLineId: null,
    description: 'BF-901 Striploin steak, 280 g · 6 mm fat · plain',
    packs: 5,
    pieces: 10,
    netGrams: grams(2800),
    basis: 'kg' as const,
    quantity: 2800,
    priceMinor: minorUnits(2400),
    taxPpm: ppm(0),
    netMinor: minorUnits(6720),
  };
  const lines = Array.from({ length: 90 }, (_, at) => ({ position: at + 1, ...line }));
  const paper: InvoicePaper = {
    number: 2100,
    deliveryDay: '2026-12-02',
    issuedOn: '2026-12-01',
    dueOn: '2026-12-15',
    currency: 'GBP',
    reference: 'RF712348231',
    customer: { number: 7, name: 'The Heron Rooms', billingAddress: '1 Quay Street', vatNumber: null },
    order: { number: 1001, siteName: 'Heron kitchen', customerReference: 'PO 7', settlement: 'card' },
    seller: house.parts.seller,
    lines,
    total: invoiceTotal(lines),
    fromCardMinor: 600_000,
  };
  const pages = pagesOf(await invoicePdf(paper));
  expect(pages.length).toBeGreaterThan(1);
  for (const [at, text] of pages.entries()) {
    expect(text).toContain('Description');
    expect(text).toContain(`page ${at + 1} of ${pages.length}`);
  }
  expect(pages.join(' ').match(/BF-901/g)).toHaveLength(90);
  // 90 × £67.20 = £6,048.00, of which £6,000.00 is taken.
  expect(pages.at(-1)).toContain('£6,000.00 is taken from the card');
  expect(pages.at(-1)).toContain('Please pay £48.00 by');
});
