import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore } from '@ngrx/store';
import { EMPTY } from 'rxjs';
import type { PackingOrderWire } from '@seamwright/plant/contracts';
import { packingEffects, packingFeature } from '@seamwright/plant/data-access';
import { aPackingLine, aPackingOrder } from '@seamwright/plant/data-access/testing';
import { LiveEvents } from '@seamwright/shared/data-access';
import { Confirm, Toast } from '@seamwright/shared/ui';
import { ScaleOrdersPage } from './scale-orders.page';
import { ScalePage } from './scale.page';

const DAY = '2026-12-04';
let http: HttpTestingController;
let fixture: ComponentFixture<ScalePage>;
const { id: orderId } = aPackingOrder();

beforeEach(() => {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      { provide: LiveEvents, useValue: { changes: () => EMPTY } },
      { provide: Confirm, useValue: { ask: async () => true } },
      { provide: Toast, useValue: { show: async () => false } },
      provideStore(),
      provideState(packingFeature),
      provideEffects(packingEffects),
    ],
  });
  http = TestBed.inject(HttpTestingController);
});
afterEach(() => http.verify());

const host = (): HTMLElement => fixture.nativeElement as HTMLElement;
const buttons = (): HTMLButtonElement[] => [...host().querySelectorAll('button')];
const button = (words: string): HTMLButtonElement => {
  const found = buttons().find((each) => each.textContent?.trim() === words);
  if (!found) throw new Error(`There is no button "${words}"`);
  return found;
};
const press = async (...words: string[]) => {
  for (const word of words) {
    button(word).click();
    await fixture.whenStable();
  }
};
const choose = async (words: string) => {
  const label = [...host().querySelectorAll('label')].find((each) => each.textContent?.includes(words));
  label?.querySelector('input')?.click();
  await fixture.whenStable();
};

async function open(order: PackingOrderWire = aPackingOrder(), state = 'released'): Promise<void> {
  fixture = TestBed.createComponent(ScalePage);
  fixture.componentRef.setInput('deliveryDay', DAY);
  fixture.componentRef.setInput('orderId', orderId);
  await fixture.whenStable();
  http.expectOne(`/api/v1/packing-orders?deliveryDay=${DAY}`).flush({ deliveryDay: DAY, state, orders: [order] });
  await fixture.whenStable();
}

describe('the scale', () => {
  it('shows the net weight of what is keyed in, less the tare of the specification', async () => {
    await open();
    expect(button('Pack').disabled).toBe(true);
    await press('5', '7', '8');
    expect(host().querySelector('.net output')?.textContent).toBe('0.560');
    expect(host().textContent).toContain('Within its limits');
    expect(button('Pack').disabled).toBe(false);
  });

  it('sends the pack, and is ready for the next', async () => {
    await open();
    await press('5', '7', '8', 'Pack');
    const call = http.expectOne(`/api/v1/packing-orders/${orderId}/packs`);
    const line = aPackingLine();
    expect(call.request.body).toEqual({
      orderLineId: line.id,
      lotId: line.lots[0]?.id,
      pieces: 2,
      grossGrams: 578,
      tareGrams: 18,
      reason: null,
    });
    call.flush(aPackingOrder({ lines: [aPackingLine({ packedPieces: 2, packedGrams: 560 })] }));
    await fixture.whenStable();
    expect(host().querySelector('.net output')?.textContent).toBe('0.000');
    expect(host().textContent).toContain('2 of 6 packed');
  });

  it('sends the same pack with the same key after a lost answer, and another with another', async () => {
    await open();
    const key = async () => {
      await press('Pack');
      const call = http.expectOne(`/api/v1/packing-orders/${orderId}/packs`);
      call.error(new ProgressEvent('error'));
      await fixture.whenStable();
      return call.request.headers.get('idempotency-key');
    };
    await press('5', '7', '8');
    const [first, again] = [await key(), await key()];
    expect(first).not.toBeNull();
    expect(again).toBe(first);
    expect(host().textContent).toContain('What you set is kept');
    await press('Clear', '5', '7', '9');
    expect(await key()).not.toBe(first);
  });

  it('asks why when a pack is out of its limits, and forgets the answer when the weight changes', async () => {
    await open();
    await press('6', '1', '8');
    expect(host().textContent).toContain('Too heavy by 12 g');
    expect(button('Pack').disabled).toBe(true);
    await choose('Agreed with the customer');
    expect(button('Pack').disabled).toBe(false);
    await press('Clear', '6', '1', '9');
    expect(button('Pack').disabled).toBe(true);
    await choose('Trimmed closer');
    await press('Pack');
    const call = http.expectOne(`/api/v1/packing-orders/${orderId}/packs`);
    expect(call.request.body).toMatchObject({ reason: 'Trimmed closer', grossGrams: 619 });
    call.flush(aPackingOrder());
  });

  it('lets tare, pieces and lot be set by touch', async () => {
    await open();
    host().querySelector<HTMLButtonElement>('[aria-label="One less"]')?.click();
    await choose('B-2');
    [...host().querySelectorAll<HTMLButtonElement>('.set button')][1]?.click();
    await fixture.whenStable();
    await press('Clear', '2', '0');
    [...host().querySelectorAll<HTMLButtonElement>('.set button')][0]?.click();
    await fixture.whenStable();
    await press('3', '0', '0', 'Pack');
    const call = http.expectOne(`/api/v1/packing-orders/${orderId}/packs`);
    const lotId = aPackingLine().lots[1]?.id;
    expect(call.request.body).toMatchObject({ pieces: 1, tareGrams: 20, grossGrams: 300, lotId });
    call.flush(aPackingOrder());
  });

  it('marks what is open as short, with a reason', async () => {
    await open(aPackingOrder({ lines: [aPackingLine({ packedPieces: 4 })] }));
    await press('Mark short');
    expect(host().querySelector('sw-short-panel output')?.textContent).toBe('2');
    expect(button('Mark short').disabled).toBe(true);
    await choose('No primal left');
    await press('Mark short');
    const call = http.expectOne(`/api/v1/packing-orders/${orderId}/lines/${aPackingLine().id}/short`);
    expect(call.request.body).toEqual({ shortPieces: 2, reason: 'No primal left' });
    call.flush(
      aPackingOrder({ lines: [aPackingLine({ packedPieces: 4, shortPieces: 2, shortReason: 'No primal left' })] }),
    );
    await fixture.whenStable();
    expect(host().textContent).toContain('This line is done.');
  });

  it('takes a pack back after asking', async () => {
    const pack = {
      id: 'p1',
      serial: 1,
      lotCode: 'B-1',
      pieces: 2,
      netGrams: 560,
      tareGrams: 18,
      outOfLimits: true,
      reason: 'Shape of the primal',
      packedAt: '2026-12-03T09:00:00Z',
    };
    await open(aPackingOrder({ lines: [aPackingLine({ packedPieces: 2, packs: [pack] })] }));
    expect(host().textContent).toContain('Shape of the primal');
    await press('Take back');
    http.expectOne(`/api/v1/packing-orders/${orderId}/packs/p1/void`).flush(aPackingOrder());
  });

  it('does not let an order be finished while a piece is open', async () => {
    await open();
    expect(button('Finish order 1001').disabled).toBe(true);
  });

  it('finishes an order that is packed or short to the last piece, and goes back to the orders', async () => {
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    await open(aPackingOrder({ lines: [aPackingLine({ packedPieces: 5, shortPieces: 1, shortReason: 'x' })] }));
    await press('Finish order 1001');
    http
      .expectOne(`/api/v1/packing-orders/${orderId}/finish`)
      .flush(aPackingOrder({ packedAt: '2026-12-03T09:00:00Z' }));
    await fixture.whenStable();
    expect(navigate).toHaveBeenCalledWith(['../..'], expect.anything());
  });

  it('goes on with the next line when one is full', async () => {
    const second = aPackingLine({ id: 'second', position: 2, name: 'Boneless shoulder' });
    await open(aPackingOrder({ lines: [aPackingLine({ pieces: 2 }), second] }));
    await press('5', '7', '8', 'Pack');
    http
      .expectOne(`/api/v1/packing-orders/${orderId}/packs`)
      .flush(aPackingOrder({ lines: [aPackingLine({ pieces: 2, packedPieces: 2 }), second] }));
    await fixture.whenStable();
    expect(host().querySelector('.cut b')?.textContent).toBe('Boneless shoulder');
  });

  it('takes nothing while the day is not on the floor, or when the order is packed', async () => {
    await open(aPackingOrder(), 'finished');
    expect(host().textContent).toContain('not on the floor');
    expect(buttons().some((each) => each.textContent?.trim() === 'Pack')).toBe(false);
  });

  it('says when no lot fits', async () => {
    await open(aPackingOrder({ lines: [aPackingLine({ lots: [] })] }));
    await press('5', '7', '8');
    expect(host().textContent).toContain('No released lot fits');
    expect(button('Pack').disabled).toBe(true);
  });
});

describe('the orders at the scale', () => {
  it('stand with those that wait first', async () => {
    const page = TestBed.createComponent(ScaleOrdersPage);
    await page.whenStable();
    http.expectOne('/api/v1/cutting-days?state=released').flush({ items: [{ deliveryDay: DAY }], nextCursor: null });
    http.expectOne(`/api/v1/packing-orders?deliveryDay=${DAY}`).flush({
      deliveryDay: DAY,
      state: 'released',
      orders: [
        aPackingOrder({ id: 'a', number: 1001, packedAt: '2026-12-03T09:00:00Z' }),
        aPackingOrder({ id: 'b', number: 1002, lines: [aPackingLine({ packedPieces: 2 })] }),
      ],
    });
    await page.whenStable();
    const rows = [...(page.nativeElement as HTMLElement).querySelectorAll('li a')];
    expect(rows.map((row) => row.getAttribute('href'))).toEqual([`/${DAY}/b`, `/${DAY}/a`]);
    expect(rows[0]?.textContent).toContain('4 of 6 to pack');
    expect(rows[1]?.textContent).toContain('Packed');
  });

  it('say when there is nothing to pack', async () => {
    const page = TestBed.createComponent(ScaleOrdersPage);
    await page.whenStable();
    http.expectOne('/api/v1/cutting-days?state=released').flush({ items: [], nextCursor: null });
    await page.whenStable();
    expect((page.nativeElement as HTMLElement).textContent).toContain('Nothing to pack');
  });
});
