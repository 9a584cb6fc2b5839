import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { LOCALE_ID } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { EMPTY } from 'rxjs';
import { SessionApiActions, sessionFeature } from '@seamwright/identity/data-access/session';
import type { Role } from '@seamwright/shared/contracts';
import { LiveEvents } from '@seamwright/shared/data-access';
import { Confirm, Toast } from '@seamwright/shared/ui';
import { lotsEffects, lotsFeature } from '@seamwright/stock/data-access';
import { aLotWire } from '@seamwright/stock/data-access/testing';
import { LotPage } from './lot.page';
import { LotsPage } from './lots.page';
import { ReceiveLotPage } from './receive-lot.page';

let http: HttpTestingController;
let fixture: ComponentFixture<unknown>;
const { id } = aLotWire();

beforeEach(() => {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      { provide: LOCALE_ID, useValue: 'en-GB' },
      { provide: LiveEvents, useValue: { changes: () => EMPTY } },
      { provide: Confirm, useValue: { ask: async () => true } },
      { provide: Toast, useValue: { show: async () => false } },
      provideStore(),
      provideState(lotsFeature),
      provideState(sessionFeature),
      provideEffects(lotsEffects),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  signIn('technical');
});
afterEach(() => http.verify());

function signIn(role: Role): void {
  const person = { id: 'p', name: 'Tamsin', email: 't@x.example', roles: [role], customerId: null, customerName: null };
  TestBed.inject(Store).dispatch(SessionApiActions.restored({ person: { ...person, sites: '*' } }));
}
const answerPrimals = () =>
  http
    .expectOne('/api/v1/lot-primals')
    .flush({ items: [{ id: aLotWire().nodeId, name: 'Shoulder', species: 'lamb' }] });

const host = (): HTMLElement => fixture.nativeElement as HTMLElement;
const text = (): string => (host().textContent ?? '').replace(/\s+/g, ' ');
const press = async (words: string) => {
  const found = [...host().querySelectorAll('button')].filter((each) => each.textContent?.trim() === words).at(-1);
  if (!found) throw new Error(`There is no button "${words}"`);
  found.click();
  await fixture.whenStable();
};
const fill = async (control: string, value: string) => {
  const field = host().querySelector<HTMLInputElement>(`[formControlName="${control}"]`);
  if (!field) throw new Error(`There is no field ${control}`);
  field.value = value;
  field.dispatchEvent(new Event('input'));
  await fixture.whenStable();
};

describe('the lots', () => {
  it('stand with use-by, what is left and the state in words, and can be narrowed to a state', async () => {
    fixture = TestBed.createComponent(LotsPage);
    await fixture.whenStable();
    answerPrimals();
    http.expectOne('/api/v1/lots').flush({ items: [aLotWire()], nextCursor: null });
    await fixture.whenStable();
    const row = host().querySelector('tbody tr')?.textContent?.replace(/\s+/g, ' ');
    for (const words of ['L-100', 'Lamb shoulder', 'Wed 9 Dec', 'Released', '50.000', '42.000'])
      expect(row).toContain(words);
    const select = host().querySelector('label select') as HTMLSelectElement;
    select.value = 'on-hold';
    select.dispatchEvent(new Event('change'));
    http.expectOne('/api/v1/lots?state=on-hold').flush({ items: [], nextCursor: null });
    await fixture.whenStable();
    expect(text()).toContain('No lots here');
  });

  it('say when a use-by has passed while something is left, and stay readable without the primals', async () => {
    signIn('floor');
    fixture = TestBed.createComponent(LotsPage);
    await fixture.whenStable();
    http.expectOne('/api/v1/lot-primals').error(new ProgressEvent('error'));
    const items = [aLotWire({ useBy: '2020-01-02' }), aLotWire({ id: 'b', useBy: '2020-01-02', remainingGrams: 0 })];
    http.expectOne('/api/v1/lots').flush({ items, nextCursor: null });
    await fixture.whenStable();
    expect(host().querySelectorAll('.over')).toHaveLength(1);
    expect(text()).toContain('Shoulder');
    expect(text()).not.toContain('Receive a lot');
  });
});

describe('one lot', () => {
  const open = async (stated: Parameters<typeof aLotWire>[0] = {}) => {
    fixture = TestBed.createComponent(LotPage);
    fixture.componentRef.setInput('lotId', id);
    await fixture.whenStable();
    answerPrimals();
    http.expectOne(`/api/v1/lots/${id}`).flush(aLotWire(stated));
    await fixture.whenStable();
  };

  it('is put on hold with a reason', async () => {
    await open();
    await press('Put on hold');
    await press('Put on hold');
    http.expectNone(`/api/v1/lots/${id}/hold`);
    const field = host().querySelector('form input') as HTMLInputElement;
    field.value = 'Bag leaks';
    field.dispatchEvent(new Event('input'));
    await press('Put on hold');
    const call = http.expectOne(`/api/v1/lots/${id}/hold`);
    expect(call.request.body).toEqual({ reason: 'Bag leaks' });
    call.flush(aLotWire({ state: 'on-hold', holdReason: 'Bag leaks', rowVersion: 4 }));
    await fixture.whenStable();
    expect(text()).toContain('On hold: Bag leaks');
    expect(host().querySelector('form')).toBeNull();
  });

  it('is released after asking', async () => {
    await open({ state: 'received' });
    await press('Release');
    const call = http.expectOne(`/api/v1/lots/${id}/release`);
    expect(call.request.headers.get('if-match')).toBe('"3"');
    call.flush(aLotWire({ rowVersion: 4 }));
  });

  it('is only looked at by the floor', async () => {
    signIn('floor');
    await open();
    expect(host().querySelectorAll('sw-page-head button')).toHaveLength(0);
    expect(text()).toContain('Lamb shoulder');
  });

  it('offers no move when there is none', async () => {
    await open({ state: 'recalled' });
    expect(host().querySelectorAll('sw-page-head button')).toHaveLength(0);
    expect(text()).toContain('Recalled');
  });
});

describe('receiving a lot', () => {
  let navigate: jest.SpyInstance;
  beforeEach(() => {
    navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
  });
  const open = async () => {
    fixture = TestBed.createComponent(ReceiveLotPage);
    await fixture.whenStable();
    answerPrimals();
    await fixture.whenStable();
  };
  const fillAll = async () => {
    await fill('code', 'L-100');
    await fill('supplier', 'Test Farms');
    await fill('killDate', '2026-11-25');
    await fill('receivedOn', '2026-12-01');
    await fill('receivedPieces', '10');
    await fill('receivedGrams', '50.000');
    await fill('slaughterhouse', 'UK 9999');
    const page = fixture.componentInstance as { form: { controls: { nodeId: { setValue(v: string): void } } } };
    page.form.controls.nodeId.setValue(aLotWire().nodeId);
    await fixture.whenStable();
  };

  it('sends nothing before it is filled in, and says what a weight must be', async () => {
    await open();
    await fill('receivedGrams', 'fifty');
    await press('Book it in');
    http.expectNone('/api/v1/lots');
    expect(host().querySelectorAll('mat-error').length).toBeGreaterThan(5);
  });

  it('books the lot in, in grams, and goes to it', async () => {
    await open();
    await fillAll();
    await press('Book it in');
    const call = http.expectOne('/api/v1/lots');
    expect(call.request.body).toMatchObject({ code: 'L-100', receivedGrams: 50_000, receivedPieces: 10, useBy: null });
    call.flush(aLotWire({ state: 'received' }));
    await fixture.whenStable();
    expect(navigate).toHaveBeenCalledWith(['..', id], expect.anything());
  });

  it('shows a refusal beside its field, keeps what was typed, and sends the same lot with the same key', async () => {
    await open();
    await fillAll();
    await press('Book it in');
    const first = http.expectOne('/api/v1/lots');
    const problem = {
      type: '',
      title: '',
      status: 422,
      detail: 'Taken',
      instance: '',
      code: 'lot-code-taken',
      errors: [{ pointer: '/code', message: 'There is a lot with this code already.' }],
    };
    first.flush(problem, { status: 422, statusText: 'x' });
    await fixture.whenStable();
    expect(text()).toContain('There is a lot with this code already.');
    expect(host().querySelector<HTMLInputElement>('[formControlName="supplier"]')?.value).toBe('Test Farms');
    await fill('code', 'L-101');
    await press('Book it in');
    const second = http.expectOne('/api/v1/lots');
    expect(second.request.headers.get('idempotency-key')).not.toBe(first.request.headers.get('idempotency-key'));
    second.error(new ProgressEvent('error'));
    await fixture.whenStable();
    await press('Book it in');
    const third = http.expectOne('/api/v1/lots');
    expect(third.request.headers.get('idempotency-key')).toBe(second.request.headers.get('idempotency-key'));
    third.flush(aLotWire());
  });
});
