import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { DeferBlockState, TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { cardsEffects, cardsFeature } from '@seamwright/accounts/data-access';
import { Confirm } from '@seamwright/shared/ui';
import { CARD_FORM_LOADER } from './card-form-loader';
import { CardsPage } from './cards.page';

const visa = { id: 'c1', brand: 'visa', last4: '4242', expires: '08/29' };
const agreed = jest.fn();
const loader = jest.fn();

describe('the page of cards', () => {
  let http: HttpTestingController;

  async function opened(mode: 'demo' | 'live', items: object[] = [visa], back = '') {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([{ path: '**', children: [] }]),
        provideStore(),
        provideState(cardsFeature),
        provideEffects(cardsEffects),
        { provide: Confirm, useValue: { ask: agreed } },
        { provide: CARD_FORM_LOADER, useValue: loader },
      ],
    });
    http = TestBed.inject(HttpTestingController);
    const fixture = TestBed.createComponent(CardsPage);
    fixture.componentRef.setInput('back', back);
    const page: HTMLElement = fixture.nativeElement;
    const words = () => (page.textContent ?? '').replace(/\s+/g, ' ');
    const press = async (text: string) => {
      const buttons = [...page.querySelectorAll<HTMLButtonElement>('button')];
      buttons.find((button) => button.textContent?.includes(text))?.click();
      await fixture.whenStable();
    };
    http.expectOne('/api/v1/cards').flush({ items });
    http.expectOne('/api/v1/card-settings').flush({ mode, publishableKey: mode === 'live' ? 'pk_1' : null });
    await fixture.whenStable();
    return { fixture, page, words, press };
  }

  it('keeps a test card of the demo, which says what its bank does', async () => {
    const { fixture, page, words, press } = await opened('demo', []);
    expect(words()).toContain('No card is kept yet');
    await press('Add a card');
    expect(words()).toContain('This is a demo');
    expect(words()).toContain('declined: not enough money');
    page.querySelectorAll<HTMLInputElement>('input[type=radio]')[0]?.click();
    await fixture.whenStable();
    await press('Keep this card');
    const sent = http.expectOne({ method: 'POST', url: '/api/v1/cards' });
    expect(sent.request.body).toEqual({ methodId: 'pm_card_visa' });
    sent.flush(visa);
    await fixture.whenStable();
    expect(words()).toContain('Visa ···· 4242');
    expect(words()).not.toContain('This is a demo');
  });

  it.each([
    ['/orders/0f6b', '/orders/0f6b'],
    ['/basket', '/basket'],
    ['https://elsewhere.example', '/'],
    ['/orders/0f6b/../../team', '/'],
  ])('sent here from %s, leads to %s once a card is kept', async (back, url) => {
    const { fixture, page, press } = await opened('demo', [], back);
    await press('Add a card');
    page.querySelector<HTMLInputElement>('input[type=radio]')?.click();
    await fixture.whenStable();
    await press('Keep this card');
    http.expectOne({ method: 'POST', url: '/api/v1/cards' }).flush(visa);
    await fixture.whenStable();
    expect(TestBed.inject(Router).url).toBe(url);
  });

  it('sends the same key again after a lost answer, and a new one after a refusal', async () => {
    const { fixture, page, words, press } = await opened('demo');
    await press('Add a card');
    page.querySelectorAll<HTMLInputElement>('input[type=radio]')[2]?.click();
    await fixture.whenStable();
    const keys: (string | null)[] = [];
    const sendAndGet = async (status: number, body: object | null) => {
      await press('Keep this card');
      const sent = http.expectOne({ method: 'POST', url: '/api/v1/cards' });
      keys.push(sent.request.headers.get('idempotency-key'));
      sent.flush(body, { status, statusText: 'No' });
      await fixture.whenStable();
    };
    await sendAndGet(503, null);
    const refused = {
      type: '',
      title: 'Refused',
      status: 422,
      detail: 'This card was refused.',
      instance: '',
      code: 'x',
    };
    await sendAndGet(422, refused);
    expect(words()).toContain('This card was refused.');
    await sendAndGet(422, refused);
    expect(keys[1]).toBe(keys[0]);
    expect(keys[2]).not.toBe(keys[0]);
  });

  it('removes a card only after asking', async () => {
    const { fixture, words, press } = await opened('demo');
    agreed.mockResolvedValueOnce(false);
    await press('Remove');
    http.expectNone('/api/v1/cards/c1');
    agreed.mockResolvedValueOnce(true);
    await press('Remove');
    http.expectOne({ method: 'DELETE', url: '/api/v1/cards/c1' }).flush(null, { status: 204, statusText: 'Gone' });
    await fixture.whenStable();
    expect(words()).not.toContain('4242');
  });

  it('leaves a real card to the form of the processor', async () => {
    const handlers = new Map<string, () => void>();
    const form = {
      on: (event: string, heard: () => void) => handlers.set(event, heard),
      mount: jest.fn(),
      destroy: jest.fn(),
    };
    const elements = { create: () => form, getElement: () => form, submit: jest.fn().mockResolvedValue({}) };
    const createPaymentMethod = jest.fn().mockResolvedValue({ paymentMethod: { id: 'pm_real' } });
    loader.mockResolvedValueOnce({ elements: () => elements, createPaymentMethod });
    const { fixture, words, press } = await opened('live');
    await press('Add a card');
    const [block] = await fixture.getDeferBlocks();
    await block?.render(DeferBlockState.Complete);
    await fixture.whenStable();
    expect(loader).toHaveBeenCalledWith('pk_1');
    expect(words()).not.toContain('This is a demo');
    expect(form.mount).toHaveBeenCalledTimes(1);
    handlers.get('ready')?.();
    await fixture.whenStable();
    await press('Keep this card');
    await fixture.whenStable();
    expect(http.expectOne({ method: 'POST', url: '/api/v1/cards' }).request.body).toEqual({ methodId: 'pm_real' });
  });

  it('says so when that form can’t be loaded', async () => {
    loader.mockRejectedValueOnce(new Error('no network'));
    const { fixture, words, press } = await opened('live');
    await press('Add a card');
    const [block] = await fixture.getDeferBlocks();
    await block?.render(DeferBlockState.Complete);
    await fixture.whenStable();
    expect(words()).toContain('The form of the card processor could not be loaded');
  });
});
