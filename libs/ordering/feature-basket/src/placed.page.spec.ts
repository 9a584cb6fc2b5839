import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideState, provideStore, Store } from '@ngrx/store';
import { OrderCards } from '@seamwright/accounts/data-access';
import type { OrderDetail } from '@seamwright/ordering/contracts';
import { OrderPageActions, OrdersApiActions, ordersFeature } from '@seamwright/ordering/data-access';
import { PlacedPage } from './placed.page';

const total = { netMinor: 661, taxMinor: 0, totalMinor: 661 };
const placed = (stated: object) =>
  ({
    id: 'a',
    number: 1066,
    site: { id: 's', name: 'Heron kitchen' },
    deliveryDay: '2026-12-02',
    settlement: 'card',
    placedAt: '2026-12-01T12:00:00.000Z',
    releasedAt: null,
    packedAt: null,
    cancelledAt: null,
    deliveryChargeMinor: 0,
    totals: { min: total, estimate: total, max: total, packed: null },
    ...stated,
  }) as OrderDetail;

async function shown(order: OrderDetail, mayTry: boolean) {
  const payWith = jest.fn();
  const cards = {
    paying: signal({ running: false, problem: null }),
    mayTry: signal(mayTry),
    declineCode: signal(null),
    cards: signal([{ id: 'visa', brand: 'visa', last4: '4242', expires: '08/29' }]),
    confirmAt: signal(''),
    payWith,
  };
  TestBed.configureTestingModule({
    providers: [provideRouter([]), provideStore(), provideState(ordersFeature)],
  }).overrideComponent(PlacedPage, { set: { providers: [{ provide: OrderCards, useValue: cards }] } });
  const fixture = TestBed.createComponent(PlacedPage);
  fixture.componentRef.setInput('orderId', 'a');
  await fixture.whenStable();
  const store = TestBed.inject(Store);
  store.dispatch(OrderPageActions.opened({ orderId: 'a' }));
  store.dispatch(OrdersApiActions.loaded({ order }));
  await fixture.whenStable();
  const page: HTMLElement = fixture.nativeElement;
  return { fixture, page, payWith };
}

describe('the page after placing', () => {
  it('offers another card for an order that waits for one, with a way back here from adding it', async () => {
    const payment = { state: 'declined', holdMinor: 694, capturedMinor: 0, declineCode: 'card_declined' };
    const { fixture, page, payWith } = await shown(placed({ stage: 'waiting', payment }), true);
    expect(page.querySelector('h1')?.textContent).toContain('Order 1066 is placed and waits for payment');
    expect(page.querySelector('a[href^="/cards"]')?.getAttribute('href')).toBe('/cards?back=%2Fbasket%2Fplaced%2Fa');
    page.querySelector<HTMLInputElement>('input[type=radio]')?.click();
    await fixture.whenStable();
    [...page.querySelectorAll('button')].find(({ textContent }) => textContent?.includes('Pay with'))?.click();
    expect(payWith).toHaveBeenCalledWith('visa');
  });

  it('says that it is confirmed, and asks for nothing', async () => {
    const payment = { state: 'pre-authorised', holdMinor: 694, capturedMinor: 0, declineCode: null };
    const { page } = await shown(placed({ stage: 'confirmed', payment }), false);
    expect(page.querySelector('h1')?.textContent).toContain('Order 1066 is confirmed');
    expect(page.querySelector('input')).toBeNull();
  });
});
