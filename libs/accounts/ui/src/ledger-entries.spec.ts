import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { LedgerEntries, type ShownEntry } from './ledger-entries';

const line = { customerName: null, invoiceNumber: null, debitMinor: 0, creditMinor: 0 };
const entry: ShownEntry = {
  id: 'e',
  number: 12,
  postedOn: '2026-12-01',
  kind: 'capture',
  text: 'Order 1032',
  lines: [
    { ...line, account: 'card-clearing', debitMinor: 6_720 },
    { ...line, account: 'receivables', creditMinor: 6_720, customerName: 'Test pub', invoiceNumber: 2_291 },
  ],
};

async function shown(entries: readonly ShownEntry[]): Promise<string[]> {
  TestBed.configureTestingModule({ providers: [provideRouter([])] });
  const fixture = TestBed.createComponent(LedgerEntries);
  fixture.componentRef.setInput('entries', entries);
  fixture.componentRef.setInput('currency', 'GBP');
  await fixture.whenStable();
  const rows: HTMLElement[] = [...(fixture.nativeElement as HTMLElement).querySelectorAll<HTMLElement>('tbody tr')];
  return rows.map((row) =>
    [...row.children]
      .map((cell) => (cell.textContent ?? '').replace(/\s+/g, ' ').trim())
      .filter((text) => text !== '')
      .join(' | '),
  );
}

describe('journal entries', () => {
  it('show both sides, whom they are for, and that they are the same', async () => {
    const [debit, credit, sum] = await shown([entry]);
    expect(debit).toMatch(/^12 Taken from a card .+ Order 1032 \| Card clearing \| £67\.20$/);
    expect(credit).toBe('Receivables Test pub, invoice 2291 | £67.20');
    expect(sum).toBe('Both sides are the same | £67.20 | £67.20');
  });

  it('say so when the sides differ', async () => {
    const [first] = entry.lines;
    const rows = await shown([{ ...entry, lines: first ? [first] : [] }]);
    expect(rows.at(-1)).toBe('The sides differ | £67.20 | £0.00');
  });
});
