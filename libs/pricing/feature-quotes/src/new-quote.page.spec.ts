import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatAutocompleteHarness } from '@angular/material/autocomplete/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { provideRouter, Router } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { NEVER } from 'rxjs';
import { quotesEffects, quotesFeature } from '@seamwright/pricing/data-access';
import { LiveEvents } from '@seamwright/shared/data-access';
import { aPublicSpecification } from './a-public-specification';
import { NewQuotePage } from './new-quote.page';

const pub = { id: 'pub', name: 'Test pub', number: 1001, active: true };
const shoulder = aPublicSpecification();

describe('writing a quote', () => {
  let http: HttpTestingController;

  async function opened() {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        provideState(quotesFeature),
        provideEffects(quotesEffects),
        { provide: LiveEvents, useValue: { changes: () => NEVER } },
      ],
    });
    http = TestBed.inject(HttpTestingController);
    const fixture = TestBed.createComponent(NewQuotePage);
    const loader = TestbedHarnessEnvironment.loader(fixture);
    await fixture.whenStable();
    const page: HTMLElement = fixture.nativeElement;
    return { fixture, loader, page };
  }

  /** Lets the pause after typing pass. */
  const pause = () => new Promise((resolve) => setTimeout(resolve, 300));
  const answerAll = (path: string, body: object) => {
    const requests = http.match(({ url }) => url === path);
    requests.filter(({ cancelled }) => !cancelled).forEach((request) => request.flush(body));
  };

  async function withOneLine() {
    const { fixture, loader, page } = await opened();
    await pause();
    answerAll('/api/v1/customers', { items: [pub], nextCursor: null });
    await fixture.whenStable();
    const [customers, specifications] = await loader.getAllHarnesses(MatAutocompleteHarness);
    await customers?.selectOption({ text: /Test pub/ });
    await specifications?.enterText('shoulder');
    await pause();
    answerAll('/api/v1/specifications', { items: [shoulder], nextCursor: null, counts: {} });
    // The list is drawn a turn after its options came.
    await pause();
    await specifications?.selectOption({ text: /LM-901/ });
    answerAll('/api/v1/specifications/LM-901', shoulder);
    await fixture.whenStable();
    const price = await loader.getHarness(MatInputHarness.with({ ancestor: 'sw-quote-line-editor' }));
    const save = () => {
      page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
      return fixture.whenStable();
    };
    return { fixture, page, price, save };
  }

  it('shows the price in force, the weight of a case and its amount beside the typed price', async () => {
    const { fixture, page, price } = await withOneLine();
    await price.setValue('74');
    await pause();
    const check = http.match('/api/v1/price-checks').at(-1);
    expect(check?.request.body).toMatchObject({
      customerId: 'pub',
      lines: [{ chosen: { trim: '6', finish: 'plain' }, quantity: { unit: 'case', count: 1 } }],
    });
    check?.flush({ lines: [{ ok: true, price: { priceMinor: 1_000, basis: 'kg', parts: [], candidates: [] } }] });
    await fixture.whenStable();
    const facts = page.querySelector('sw-quote-line-editor dl')?.textContent?.replace(/\s+/g, ' ') ?? '';
    expect(facts).toMatch(/Price now ?£10\.00\/kg/);
    expect(facts).toMatch(/A case weighs ≈ 8\.000.kg/);
    expect(facts).toMatch(/A case costs ?£74\.00/);
  });

  it('saves the draft and goes to it', async () => {
    const { price, save } = await withOneLine();
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    await price.setValue('74.50');
    await save();
    const sent = http.expectOne('/api/v1/quotes');
    expect(sent.request.body).toMatchObject({
      customerId: 'pub',
      lines: [{ specificationId: shoulder.specificationId, basis: 'case', priceMinor: 7_450 }],
    });
    sent.flush({ id: 'q1', number: 201 });
    expect(navigate).toHaveBeenCalledWith(['/quotes', 'q1']);
  });

  it('does not send what is not a price, and says so at the field', async () => {
    const { page, price, save } = await withOneLine();
    await price.setValue('about ten');
    await save();
    http.expectNone('/api/v1/quotes');
    expect(page.querySelector('sw-quote-line-editor mat-error')?.textContent).toContain('above zero');
  });

  it('puts what the server refuses at its field, keeps what was typed', async () => {
    const { fixture, page, price, save } = await withOneLine();
    await price.setValue('74');
    await save();
    const first = http.expectOne('/api/v1/quotes');
    first.flush(
      {
        type: '/problems/quote-answer-past',
        title: 'Unprocessable',
        status: 422,
        detail: 'The last day for an answer is past.',
        instance: '',
        code: 'quote-answer-past',
        errors: [{ pointer: '/answerBy', message: 'The last day for an answer is past.' }],
      },
      { status: 422, statusText: 'Unprocessable' },
    );
    await fixture.whenStable();
    expect(page.textContent).toContain('The last day for an answer is past.');
    expect(await price.getValue()).toBe('74');
  });
});
