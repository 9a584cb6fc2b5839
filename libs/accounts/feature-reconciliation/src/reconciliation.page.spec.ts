import { HttpEventType, provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { NEVER } from 'rxjs';
import { reconciliationEffects, reconciliationFeature } from '@seamwright/accounts/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { aWeek } from './a-week';
import { ReconciliationPage } from './reconciliation.page';

describe('the page of a week', () => {
  let http: HttpTestingController;

  async function opened(week = aWeek) {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        provideState(reconciliationFeature),
        provideEffects(reconciliationEffects),
        { provide: LiveEvents, useValue: { changes: () => NEVER } },
      ],
    });
    http = TestBed.inject(HttpTestingController);
    const fixture = TestBed.createComponent(ReconciliationPage);
    await fixture.whenStable();
    http.expectOne('/api/v1/reconciliation').flush(week);
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    Element.prototype.scrollIntoView = jest.fn();
    const words = (within: Element = page) => (within.textContent ?? '').replace(/\s+/g, ' ');
    const press = async (text: string, within: Element = page) => {
      [...within.querySelectorAll<HTMLButtonElement>('button')].find((button) => words(button).includes(text))?.click();
      await fixture.whenStable();
    };
    const giveStatement = async () => {
      await press('Import bank statement');
      const field = page.querySelector<HTMLInputElement>('sw-file-drop input');
      const file = new File(['Date,Description,Amount\n'], 'november.csv', { type: 'text/csv' });
      Object.defineProperty(field, 'files', { value: [file], configurable: true });
      field?.dispatchEvent(new Event('change'));
      await fixture.whenStable();
      return http.expectOne({ method: 'POST', url: '/api/v1/bank-statements' });
    };
    return { fixture, page, words, press, giveStatement };
  }

  it('lists what is not explained, with its cause and the act that fits', async () => {
    const { fixture, page, words, press } = await opened();
    expect(words()).toContain('2 things are not explained yet');
    const [charge, bank] = [...page.querySelectorAll('sw-week-exceptions tr.mat-mdc-row')];
    expect(charge && words(charge)).toMatch(/Missing there.*order 1032.*£212\.40.*not told of it yet/);
    expect(bank?.querySelector('a')?.getAttribute('href')).toBe('/ledger?account=bank-differences');
    if (charge) await press('Ask the processor', charge);
    http.expectOne({ method: 'POST', url: '/api/v1/reconciliation/refresh' }).flush({ transactions: 1, payouts: 0 });
    http.expectOne('/api/v1/reconciliation').flush({ ...aWeek, exceptions: [] });
    await fixture.whenStable();
    expect(words()).toContain('Every penny is explained');
  });

  it('shows every penny as a table that comes out even', async () => {
    const { page, press } = await opened();
    await press('Every penny, as a table');
    const totals = [...page.querySelectorAll('sw-week-tables tr.mat-mdc-footer-row td')].map((cell) =>
      (cell.textContent ?? '').trim(),
    );
    expect(totals).toEqual(['Total', '£18,412.60', '£18,412.60']);
  });

  it('says by how much the clearing account and the processor are apart', async () => {
    const { page, words } = await opened();
    const check = page.querySelector('sw-clearing-check');
    expect(check && words(check)).toContain('£212.40 apart');
  });

  it('goes to the week before', async () => {
    const { press } = await opened();
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    await press('Week before');
    expect(navigate).toHaveBeenCalledWith(['/reconciliation'], { queryParams: { day: '2026-11-16' } });
  });

  it('sends a statement with its progress, and fetches the week anew', async () => {
    const { fixture, page, words, giveStatement } = await opened();
    const sent = await giveStatement();
    sent.event({ type: HttpEventType.UploadProgress, loaded: 30, total: 60 });
    await fixture.whenStable();
    expect(page.querySelector('progress')?.value).toBe(50);
    sent.flush({
      id: 's',
      fileName: 'november.csv',
      importedAt: '2026-12-01T09:00:00Z',
      lines: 38,
      firstDay: '2026-11-23',
      lastDay: '2026-11-30',
      sumMinor: 1_665_117,
      matched: 1,
    });
    http.expectOne('/api/v1/reconciliation').flush(aWeek);
    await fixture.whenStable();
    expect(words()).toContain('november.csv is taken: 38 bookings');
    expect(page.querySelector('progress')).toBeNull();
  });

  it('names faults of a statement by line and column', async () => {
    const { fixture, page, words, giveStatement } = await opened();
    const errors = [{ pointer: '/lines/4/Amount', message: '“ten” is not an amount of money.' }];
    const problem = {
      type: '',
      title: 'No',
      status: 422,
      detail: '1 cells',
      instance: '',
      code: 'statement-has-faults',
    };
    (await giveStatement()).flush({ ...problem, errors }, { status: 422, statusText: 'No' });
    await fixture.whenStable();
    const row = page.querySelector('sw-statement-import tr.mat-mdc-row');
    expect(row && words(row)).toMatch(/4 ?Amount ?“ten” is not an amount/);
  });

  it('says plainly when the same statement comes twice', async () => {
    const { fixture, page, words, giveStatement } = await opened();
    const detail = 'This statement was taken already. Nothing was taken again.';
    const problem = { type: '', title: 'No', status: 409, detail, instance: '', code: 'statement-taken-already' };
    (await giveStatement()).flush({ ...problem, errors: [] }, { status: 409, statusText: 'No' });
    await fixture.whenStable();
    expect(words()).toContain(detail);
    expect(page.querySelector('sw-statement-import sw-error')).toBeNull();
  });
});
