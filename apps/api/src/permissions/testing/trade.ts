import { openDraft, submitDraft, type SpecificationDraft } from '@seamwright/catalogue/contracts';
import { addCard, listInvoices } from '@seamwright/accounts/contracts';
import { addTestSpecification } from '@seamwright/catalogue/server/testing';
import { placeOrder, uploadOrders, type OrderDetail } from '@seamwright/ordering/contracts';
import { createQuote, sendQuote, type QuoteDetail } from '@seamwright/pricing/contracts';
import type { Caller } from '@seamwright/shared/server';
import { TEST_NOW } from '@seamwright/shared/server/testing';
import { Workbook } from 'exceljs';
import { IMPORT_COLUMNS } from '@seamwright/ordering/domain';
import type { Party } from './party';
import { packWholeOrder } from './plant';
import type { World } from './world';

/** A day that is ordered for and never closed. */
export const ORDER_DAY = '2026-12-09';

export const someLines = ({ steak }: World) => [
  { specificationId: steak.specificationId, quantity: { unit: 'piece' as const, count: 4 } },
];

/** An order of four steaks on account, placed by the desk. */
export const anOrder = (world: World, party: Party, deliveryDay: string = ORDER_DAY): Promise<OrderDetail> =>
  world.deed(world.staff.admin, placeOrder, {
    body: { customerId: party.id, siteId: party.siteId, deliveryDay, settlement: 'account', lines: someLines(world) },
  });

export const quoteOf = ({ steak }: World, party: Party) => ({
  customerId: party.id,
  pricesFrom: '2027-02-01',
  pricesUntil: '2027-03-31',
  answerBy: '2026-12-18',
  notes: '',
  lines: [{ specificationId: steak.specificationId, basis: 'kg' as const, priceMinor: 2_200 }],
});

export const aDraft = (world: World, party: Party): Promise<QuoteDetail> =>
  world.deed(world.staff.rep, createQuote, { body: quoteOf(world, party) });

export async function aSentQuote(world: World, party: Party): Promise<QuoteDetail> {
  const { id, rowVersion } = await aDraft(world, party);
  return world.deed(world.staff.rep, sendQuote, { params: { quoteId: id }, ifMatch: rowVersion });
}

export async function aCard(world: World, party: Party, methodId = 'pm_card_visa'): Promise<string> {
  const { id } = await world.deed(party.buyer, addCard, { body: { methodId } });
  return id;
}

/** An order that waits for payment: its card was declined. */
export async function anUnpaidOrder(world: World, party: Party): Promise<OrderDetail> {
  const cardId = await aCard(world, party, 'pm_card_chargeCustomerFail');
  return world.deed(party.buyer, placeOrder, {
    body: { siteId: party.siteId, deliveryDay: ORDER_DAY, settlement: 'card', cardId, lines: someLines(world) },
  });
}

/** Every party's order that was paid with a card, packed and invoiced: made once. */
const invoiced = new WeakMap<World, Map<string, Promise<string>>>();

/** The id of an invoice of the customer. */
export function anInvoice(world: World, party: Party): Promise<string> {
  const known = invoiced.get(world) ?? new Map<string, Promise<string>>();
  invoiced.set(world, known);
  const made = known.get(party.id) ?? makeInvoice(world, party);
  known.set(party.id, made);
  return made;
}

async function makeInvoice(world: World, party: Party): Promise<string> {
  const deliveryDay = world.nextDay();
  const cardId = await aCard(world, party);
  const order = await world.deed(party.buyer, placeOrder, {
    body: { siteId: party.siteId, deliveryDay, settlement: 'card', cardId, lines: someLines(world) },
  });
  await packWholeOrder(world, order);
  await world.house.settle();
  const { items } = await world.deed(party.buyer, listInvoices, {});
  const [invoice] = items;
  if (!invoice) throw new Error('The packed order was not invoiced');
  return invoice.id;
}

/** A workbook that orders six steaks for the customer. */
export async function aWorkbook({ steak }: World, { name, siteName }: Party): Promise<{ bytes: Buffer; name: string }> {
  const workbook = new Workbook();
  const sheet = workbook.addWorksheet('Orders');
  const heads: Record<(typeof IMPORT_COLUMNS)[number], string> = {
    customer: 'Customer',
    site: 'Site',
    day: 'Delivery day',
    code: 'Code',
    choices: 'Choices',
    quantity: 'Quantity',
    unit: 'Unit',
    whenShort: 'When short',
    note: 'Note',
  };
  sheet.addRow(IMPORT_COLUMNS.map((column) => heads[column]));
  sheet.addRow([name, siteName, ORDER_DAY, steak.code, '', 6, 'piece', '', '']);
  return { bytes: Buffer.from(await workbook.xlsx.writeBuffer()), name: 'orders.xlsx' };
}

/** A workbook that was read, with an order for the customer in it. */
export async function anImport(world: World, party: Party, uploader: Caller): Promise<string> {
  const { id } = await world.deed(uploader, uploadOrders, { file: await aWorkbook(world, party) });
  return id;
}

/** The code of a specification in force that nobody ordered. */
export async function aSpecification({ house, authors, tree, next }: World): Promise<string> {
  const code = `BF-${String(100 + next()).padStart(3, '0')}`;
  const place = { now: TEST_NOW, people: authors, cutNodeId: tree.steakId, sourceNodeId: tree.striploinId };
  await addTestSpecification(house.database, { ...place, code });
  return code;
}

/** A draft of the next version of a specification, by the technical member of staff. */
export async function aSpecificationDraft(world: World): Promise<SpecificationDraft> {
  const code = await aSpecification(world);
  return world.deed(world.staff.technical, openDraft, { params: { code } });
}

/** A version that one of the authors sent to review, named as for its approval. */
export async function aReviewedVersion(world: World) {
  const code = await aSpecification(world);
  const draft = await world.deed(world.authors.author, openDraft, { params: { code } });
  const reviewed = await world.deed(world.authors.author, submitDraft, { params: { code }, ifMatch: draft.rowVersion });
  return { params: { code, version: reviewed.version }, ifMatch: reviewed.rowVersion };
}
