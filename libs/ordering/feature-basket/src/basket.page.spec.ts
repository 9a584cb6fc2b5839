import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { of } from 'rxjs';
import { PaymentCards } from '@seamwright/accounts/data-access';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import {
  BasketActions,
  basketFeature,
  checkoutEffects,
  checkoutFeature,
  DeliveryDays,
  OrderPlacing,
} from '@seamwright/ordering/data-access';
import { PriceChecks, type PriceCheck } from '@seamwright/pricing/data-access';
import { QuantityHarness } from '@seamwright/shared/ui/forms';
import { BasketPage } from './basket.page';

const price = {
  basis: 'kg',
  priceMinor: 2400,
  level: 'base',
  listName: 'Base list',
  quoteNumber: null,
  parts: [{ code: 'list-price', params: {}, minor: 2400 }],
  candidates: [],
};
const days = {
  serverTime: '2026-12-01T12:00:00.000Z',
  timeZone: 'Europe/London',
  siteId: 'site-1',
  zoneName: 'Harbour',
  currency: 'GBP',
  deliveryChargeMinor: 650,
  deliveryTaxPpm: 0,
  days: [{ day: '2026-12-03', cutOffAt: '2026-12-02T14:00:00.000Z', closed: false }],
  sites: [{ id: 'site-1', name: 'Kitchen', address: '1 Quay Street', zoneName: 'Harbour' }],
  clockAheadMs: 0,
};
/** 280 g a piece (266 to 294) at £24.00 per kg. */
const check = ({ lines }: PriceCheck) =>
  of({
    lines: lines.map(({ quantity }) => {
      const pieces = quantity.unit === 'kg' ? 0 : quantity.count;
      return {
        ok: true,
        weights: { pieces, cases: null, minGrams: 266 * pieces, estimateGrams: 280 * pieces, maxGrams: 294 * pieces },
        amounts: { minMinor: 638 * pieces, estimateMinor: 672 * pieces, maxMinor: 706 * pieces },
        price,
        leadDays: 0,
      };
    }),
  });
const orders: unknown[] = [];

async function open(withLine: boolean) {
  orders.length = 0;
  TestBed.configureTestingModule({
    providers: [
      provideRouter([{ path: '**', children: [] }]),
      provideStore(),
      provideState(basketFeature),
      provideState(checkoutFeature),
      provideEffects(checkoutEffects),
      { provide: DeliveryDays, useValue: { next: () => of(days) } },
      { provide: PriceChecks, useValue: { check } },
      {
        provide: OrderPlacing,
        useValue: { place: (order: unknown) => (orders.push(order), of({ id: 'order-1' } as OrderDetail)) },
      },
      {
        provide: PaymentCards,
        useValue: { list: () => of([{ id: 'card-1', brand: 'Visa', last4: '4242', expires: '08/29' }]) },
      },
    ],
  });
  const store = TestBed.inject(Store);
  if (withLine)
    store.dispatch(
      BasketActions.lineAdded({
        specificationId: 'spec-1',
        code: 'BF-901',
        name: 'Striploin steak',
        summary: '280 g',
        chosen: {},
        quantity: { unit: 'piece', count: 10 },
        whenShort: 'ask-me',
        note: '',
      }),
    );
  const fixture = TestBed.createComponent(BasketPage);
  const page = fixture.nativeElement as HTMLElement;
  const settle = async () => {
    await new Promise((resolve) => setTimeout(resolve, 350));
    await fixture.whenStable();
  };
  await settle();
  return { fixture, page, settle, loader: TestbedHarnessEnvironment.loader(fixture) };
}
const press = (page: HTMLElement, words: string) =>
  [...page.querySelectorAll<HTMLElement>('button, label')].find((each) => each.textContent?.includes(words))?.click();

describe('the basket page', () => {
  it('says what would be here when the basket is empty', async () => {
    const { page } = await open(false);
    expect(page.textContent).toContain('Your basket is empty');
  });

  it('shows price, weight range and the total with its upper bound, and follows the quantity', async () => {
    const { page, settle, loader } = await open(true);
    expect(page.textContent).toContain('£24.00');
    expect(page.textContent).toContain('£73.70');
    const quantity = await loader.getHarness(QuantityHarness);
    await quantity.more();
    await settle();
    expect(await quantity.text()).toBe('11');
    // 11 × £6.72 + £6.50, and at most 11 × £7.06 + £6.50.
    expect(page.textContent).toContain('£80.42');
    expect(page.textContent).toContain('£84.16');
  });

  it('asks for the card before an order by card can be placed, and says what is held', async () => {
    const { page, settle } = await open(true);
    const button = () => page.querySelector<HTMLButtonElement>('button.place');
    expect(button()?.disabled).toBe(false);
    press(page, 'By card');
    await settle();
    expect(button()?.disabled).toBe(true);
    press(page, 'Visa ···· 4242');
    await settle();
    expect(page.textContent).toContain('Held on the card, at most');
    button()?.click();
    await settle();
    expect(orders).toEqual([
      expect.objectContaining({
        settlement: 'card',
        cardId: 'card-1',
        deliveryDay: '2026-12-03',
        agreedMaxMinor: 7710,
      }),
    ]);
  });
});
