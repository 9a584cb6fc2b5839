import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter, withComponentInputBinding } from '@angular/router';
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
  const open = async (address: string) => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideStore(),
        provideEffects(),
        provideRouter([{ path: 'catalogue', children: catalogueRoutes }], withComponentInputBinding()),
      ],
    });
    const harness = await RouterTestingHarness.create(address);
    const http = TestBed.inject(HttpTestingController);
    const host = harness.routeNativeElement as HTMLElement;
    const link = (words: string) => [...host.querySelectorAll('a')].find((each) => each.textContent?.includes(words));
    return { harness, http, host, link };
  };

  it('asks for what its address says, and lists it with links and counts', async () => {
    const { harness, http, link } = await open('/catalogue?q=strip&species=beef&bone=nonsense');
    http.expectOne('/api/v1/specifications?q=strip&species=beef').flush({ items: [card], nextCursor: null, counts });
    await harness.fixture.whenStable();
    expect(link('Striploin steak')?.getAttribute('href')).toBe('/catalogue/BF-201');
    expect(link('Lamb')?.textContent).toContain('0');
    expect(link('Beef')?.getAttribute('aria-current')).toBe('true');
    expect(link('Beef')?.getAttribute('href')).toBe('/catalogue?q=strip&bone=nonsense');
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
