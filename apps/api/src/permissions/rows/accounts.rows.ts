import * as accounts from '@seamwright/accounts/contracts';
import { ofCaller, ofCustomer, ofHouse, type Row } from '../row';
import { aCard, anInvoice } from '../testing/trade';

export const accountsRows: readonly Row[] = [
  ofCaller(accounts.cardSettings, () => ({})),
  ofCustomer(
    accounts.listCards,
    async (world, party) => {
      await aCard(world, party);
      return { query: { customerId: party.id } };
    },
    'empty',
  ),
  ofCaller(accounts.addCard, () => ({ body: { methodId: 'pm_card_visa' } })),
  ofCustomer(accounts.removeCard, async (world, party) => ({ params: { cardId: await aCard(world, party) } })),
  ofCustomer(
    accounts.listInvoices,
    async (world, party) => {
      await anInvoice(world, party);
      return { query: { customerId: party.id } };
    },
    'empty',
  ),
  ofCustomer(accounts.getInvoice, async (world, party) => ({ params: { invoiceId: await anInvoice(world, party) } })),
  ofCustomer(accounts.getInvoicePdf, async (world, party) => ({
    params: { invoiceId: await anInvoice(world, party) },
  })),
  ofCustomer(
    accounts.listPayments,
    async (world, party) => {
      await anInvoice(world, party);
      return { query: { customerId: party.id } };
    },
    'empty',
  ),
  ofHouse(accounts.importBankStatement, ({ next }) => ({
    file: {
      name: 'december.csv',
      bytes: Buffer.from(`Date,Description,Reference,Amount\n2026-12-04,RENT,,-${1_000 + next()}.00\n`),
    },
  })),
  ofHouse(accounts.ledgerEntries, () => ({})),
  ofHouse(accounts.ledgerBalances, () => ({})),
  ofHouse(accounts.getReconciliation, () => ({})),
  ofHouse(accounts.refreshReconciliation, () => ({})),
];
