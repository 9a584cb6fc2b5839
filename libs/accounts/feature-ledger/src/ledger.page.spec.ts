import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { NEVER } from 'rxjs';
import type { AccountBalance } from '@seamwright/accounts/contracts';
import { ledgerEffects, ledgerFeature } from '@seamwright/accounts/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { DataTableHarness } from '@seamwright/shared/ui/table';
import { LedgerPage } from './ledger.page';

const balance = (account: AccountBalance['account'], debitMinor: number, creditMinor: number): AccountBalance => ({
  account,
  currency: 'GBP',
  debitMinor,
  creditMinor,
  balanceMinor: debitMinor - creditMinor,
});

async function opened(balances: AccountBalance[], account?: string) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      provideStore(),
      provideState(ledgerFeature),
      provideEffects(ledgerEffects),
      { provide: LiveEvents, useValue: { changes: () => NEVER } },
    ],
  });
  const http = TestBed.inject(HttpTestingController);
  const fixture = TestBed.createComponent(LedgerPage);
  fixture.componentRef.setInput('account', account);
  await fixture.whenStable();
  http.expectOne('/api/v1/ledger/balances').flush({ items: balances });
  const entries = http.expectOne(({ url }) => url === '/api/v1/ledger/entries');
  entries.flush({ items: [], nextCursor: null });
  await fixture.whenStable();
  const table = await TestbedHarnessEnvironment.loader(fixture).getHarness(DataTableHarness);
  const words = ((fixture.nativeElement as HTMLElement).textContent ?? '').replace(/\s+/g, ' ');
  return { table, words, asked: entries.request.urlWithParams };
}

describe('the ledger page', () => {
  it('shows what stands on each account, and that both sides are the same', async () => {
    const { table, words } = await opened([balance('receivables', 7_500, 0), balance('sales', 0, 7_500)]);
    expect(await table.rows()).toEqual([
      ['Receivables', 'What customers owe', '£75.00', '£0.00', '£75.00'],
      ['Sales', 'What was invoiced, without tax', '£0.00', '£75.00', '-£75.00'],
    ]);
    expect((await table.totals()).slice(-3)).toEqual(['£75.00', '£75.00', '£0.00']);
    expect(words).toContain('both sides are the same');
  });

  it('says so when the sides differ', async () => {
    expect((await opened([balance('bank', 100, 0)])).words).toContain('the sides differ');
  });

  it('narrows the entries to the account of the address', async () => {
    const { asked, words } = await opened([balance('card-fees', 1, 0)], 'card-fees');
    expect(asked).toBe('/api/v1/ledger/entries?account=card-fees');
    expect(words).toContain('Entries on Card fees');
  });
});
