import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { LOCALE_ID } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding, type Routes } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { provideEffects } from '@ngrx/effects';
import { provideStore } from '@ngrx/store';
import { aContent } from '@seamwright/catalogue/domain/testing';
import { catalogueRoutes } from './index';

const { lengthMm, widthMm, heightMm, pieceNominalGrams, pieceMinGrams, pieceMaxGrams } = aContent();
const card = {
  specificationId: 'a0',
  versionId: 'a1',
  code: 'BF-201',
  name: 'Striploin steak',
  summary: 'Cut across the grain.',
  species: 'beef',
  primalName: 'Striploin',
  boneState: 'boneless',
  fatCoverMm: 6,
  finish: 'plain',
  drawingKind: 'steak',
  ribs: null,
  pieceKind: 'steak',
  ...{ lengthMm, widthMm, heightMm, pieceNominalGrams, pieceMinGrams, pieceMaxGrams },
  piecesPerCase: 12,
  hasChoices: true,
};
const counts = {
  species: [
    { species: 'lamb', count: 0 },
    { species: 'beef', count: 1 },
  ],
  primals: [{ id: 'p1', name: 'Striploin', species: 'beef', count: 1 }],
  boneStates: [{ boneState: 'boneless', count: 1 }],
};

describe('the catalogue page', () => {
  /** Lets the page of a specification be loaded. */
  let loaded: () => void;

  const open = async (address: string) => {
    TestBed.configureTestingModule({
      providers: [
        { provide: LOCALE_ID, useValue: 'en-GB' },
        provideHttpClient(),
        provideHttpClientTesting(),
        provideStore(),
        provideEffects(),
        provideRouter(
          [
            { path: 'catalogue', pathMatch: 'full', children: catalogueRoutes },
            {
              path: 'catalogue/:code',
              loadChildren: () => new Promise<Routes>((resolve) => (loaded = () => resolve([]))),
            },
          ],
          withComponentInputBinding(),
        ),
      ],
    });
    const harness = await RouterTestingHarness.create(address);
    const http = TestBed.inject(HttpTestingController);
    const host = harness.routeNativeElement as HTMLElement;
    const link = (words: string, within = '') =>
      [...host.querySelectorAll(`${within} a`)].find((each) => each.textContent?.includes(words));
    return { harness, http, host, link };
  };

  it('asks for what its address says, and lists it with links and counts', async () => {
    const { harness, http, link } = await open('/catalogue?q=strip&species=beef&bone=nonsense');
    http.expectOne('/api/v1/specifications?q=strip&species=beef').flush({ items: [card], nextCursor: null, counts });
    await harness.fixture.whenStable();
    expect(link('Striploin steak')?.getAttribute('href')).toBe('/catalogue/BF-201');
    expect(link('Lamb')?.textContent).toContain('0');
    expect(link('Beef', '.groups')?.getAttribute('aria-current')).toBe('true');
    expect(link('Beef', '.groups')?.getAttribute('href')).toBe('/catalogue?q=strip&bone=nonsense');
  });

  it('does not call the buyer back with words that come to rest while a card is being opened', async () => {
    const { harness, http, host, link } = await open('/catalogue');
    http.expectOne('/api/v1/specifications').flush({ items: [card], nextCursor: null, counts });
    await harness.fixture.whenStable();
    const router = TestBed.inject(Router);
    jest.useFakeTimers();
    const field = host.querySelector<HTMLInputElement>('input[type=search]');
    if (field) field.value = 'strip';
    field?.dispatchEvent(new Event('input'));
    // The page that is opened takes longer to load than words take to rest.
    link('Striploin steak')?.dispatchEvent(new MouseEvent('click', { bubbles: true, cancelable: true, button: 0 }));
    await jest.advanceTimersByTimeAsync(300);
    jest.useRealTimers();
    loaded();
    await harness.fixture.whenStable();
    expect(router.url).toBe('/catalogue/BF-201');
  });

  it('folds the filters away on a small screen, with those that are on still there to take off', async () => {
    const { harness, http, host, link } = await open('/catalogue?species=beef');
    http.expectOne('/api/v1/specifications?species=beef').flush({ items: [card], nextCursor: null, counts });
    await harness.fixture.whenStable();
    expect(link('Beef', '.bar')?.getAttribute('href')).toBe('/catalogue');
    const button = host.querySelector<HTMLButtonElement>('.bar button');
    expect(button?.getAttribute('aria-expanded')).toBe('false');
    button?.click();
    await harness.fixture.whenStable();
    expect(button?.getAttribute('aria-expanded')).toBe('true');
    const show = host.querySelector<HTMLButtonElement>('.show');
    expect(show?.textContent).toContain('Show one cut');
    show?.click();
    await harness.fixture.whenStable();
    expect(button?.getAttribute('aria-expanded')).toBe('false');
  });

  it('asks once for the prices of all cards, and says where there is none', async () => {
    const { harness, http, host } = await open('/catalogue');
    const other = { ...card, specificationId: 'b0', code: 'LM-104', name: 'Shoulder of lamb' };
    http.expectOne('/api/v1/specifications').flush({ items: [card, other], nextCursor: null, counts });
    await harness.fixture.whenStable();
    http
      .expectOne(({ url }) => url === '/api/v1/delivery-days')
      .flush({
        serverTime: '2026-12-01T10:00:00Z',
        days: [
          { day: '2026-12-02', cutOffAt: '2026-12-01T16:00:00Z', closed: true },
          { day: '2026-12-04', cutOffAt: '2026-12-03T16:00:00Z', closed: false },
        ],
      });
    await harness.fixture.whenStable();
    const asked = http.expectOne('/api/v1/price-checks');
    expect(asked.request.body).toMatchObject({
      deliveryDay: '2026-12-04',
      lines: [{ specificationId: 'a0' }, { specificationId: 'b0' }],
    });
    const [price, amounts] = [{ basis: 'kg', priceMinor: 2360 }, { estimateMinor: 661 }];
    asked.flush({
      lines: [
        { ok: true, price, amounts },
        { ok: false, code: 'no-price', message: 'No price' },
      ],
    });
    await harness.fixture.whenStable();
    const shown = [...host.querySelectorAll('sw-specification-card .price')].map(({ textContent }) =>
      textContent?.replace(/\s+/g, ' ').trim(),
    );
    expect(shown).toEqual(['£23.60/kg ≈ £6.61/steak', 'Price on request']);
    expect(host.querySelector('p.count')?.textContent).toContain('Your prices for Fri 4 Dec');
  });

  it('says when nothing fits and offers the whole catalogue', async () => {
    const { harness, http, host } = await open('/catalogue?q=venison');
    http.expectOne('/api/v1/specifications?q=venison').flush({ items: [], nextCursor: null, counts });
    await harness.fixture.whenStable();
    expect(host.textContent).toContain('No cut fits that');
    host.querySelector<HTMLButtonElement>('sw-empty button')?.click();
    await harness.fixture.whenStable();
    http.expectOne('/api/v1/specifications').flush({ items: [card], nextCursor: null, counts });
  });

  it('goes to the search field on "/", but not while something is typed', async () => {
    const { http, host } = await open('/catalogue');
    http.expectOne('/api/v1/specifications').flush({ items: [card], nextCursor: null, counts });
    const field = host.querySelector('input') as HTMLInputElement;
    const press = (target: EventTarget) => {
      const event = new KeyboardEvent('keydown', { key: '/', bubbles: true, cancelable: true });
      target.dispatchEvent(event);
      return event.defaultPrevented;
    };
    expect(press(document.body)).toBe(true);
    expect(document.activeElement).toBe(field);
    expect(press(field)).toBe(false);
  });
});
