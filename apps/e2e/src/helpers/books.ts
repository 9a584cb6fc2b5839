import { randomUUID } from 'node:crypto';
import {
  getReconciliation,
  importBankStatement,
  ledgerEntries,
  listInvoices,
  refreshReconciliation,
  type BankStatement,
  type InvoiceListItem,
  type LedgerEntry,
  type ReconciliationWire,
} from '@seamwright/accounts/contracts';
import { signIn } from '@seamwright/identity/contracts';
import type { AnyEndpoint, Answer } from '@seamwright/shared/contracts';
import { addresses } from '../stack/addresses';
import { passwordOf, type Person } from './people';

/** One booking of a bank statement; pounds as the bank writes them. */
export interface Booking {
  readonly day: string;
  readonly text: string;
  readonly reference: string;
  readonly amount: string;
}

const HEAD = 'Date,Description,Reference,Amount';

/** A bank's statement as separated values. */
const statementOf = (bookings: readonly Booking[]): string =>
  [HEAD, ...bookings.map(({ day, text, reference, amount }) => [day, text, reference, amount].join(','))].join('\n');

/** The books as the accounts desk reads them, by the same declarations that its screens call. */
export class Books {
  private constructor(private readonly token: string) {}

  static async open({ email, application }: Person): Promise<Books> {
    const body = JSON.stringify({ application, email, password: passwordOf({ name: '', email, application }) });
    const { accessToken } = await answerOf(signIn, '', { body, headers: { 'content-type': 'application/json' } });
    return new Books(accessToken);
  }

  /** The week of card money that a day lies in, with what the processor has told by now. */
  async week(day: string): Promise<ReconciliationWire> {
    await this.call(refreshReconciliation, '');
    return this.call(getReconciliation, `?day=${day}`);
  }

  async takeStatement(fileName: string, bookings: readonly Booking[]): Promise<BankStatement> {
    const body = new FormData();
    body.append('file', new Blob([statementOf(bookings)], { type: 'text/csv' }), fileName);
    return this.call(importBankStatement, '', { body, headers: { 'idempotency-key': randomUUID() } });
  }

  /** The invoice of an order. */
  async invoiceOf(orderNumber: string): Promise<InvoiceListItem> {
    const { items } = await this.call(listInvoices, '?limit=50');
    const found = items.find(({ order }) => String(order.number) === orderNumber);
    if (!found) throw new Error(`There is no invoice for order ${orderNumber}`);
    return found;
  }

  /** Journal entries, the newest first. */
  async entries(query = ''): Promise<readonly LedgerEntry[]> {
    return (await this.call(ledgerEntries, `?limit=100${query}`)).items;
  }

  private call<E extends AnyEndpoint>(endpoint: E, query: string, init: RequestInit = {}): Promise<Answer<E>> {
    const headers = { ...init.headers, authorization: `Bearer ${this.token}` };
    return answerOf(endpoint, query, { ...init, headers });
  }
}

async function answerOf<E extends AnyEndpoint>(endpoint: E, query: string, init: RequestInit): Promise<Answer<E>> {
  const url = new URL(`api/v1${endpoint.path}${query}`, addresses().storefront);
  // One connection for each call: one kept open may be closed by the server just as the next call goes out.
  const headers = { ...init.headers, connection: 'close' };
  const answer = await fetch(url, { ...init, headers, method: endpoint.method });
  const text = await answer.text();
  if (!answer.ok) throw new Error(`${endpoint.id} answered ${answer.status}: ${text}`);
  return endpoint.response?.parse(JSON.parse(text)) as Answer<E>;
}

/** An entry as it is read aloud: "card-clearing 239.00 / receivables 239.00", debits first. */
export const spoken = ({ lines }: LedgerEntry): string => {
  const amount = (minor: number): string => `${Math.floor(minor / 100)}.${String(minor % 100).padStart(2, '0')}`;
  const side = (of: 'debitMinor' | 'creditMinor'): string =>
    lines
      .filter((line) => line[of] > 0)
      .map((line) => `${line.account} ${amount(line[of])}`)
      .join(' + ');
  return `${side('debitMinor')} / ${side('creditMinor')}`;
};
