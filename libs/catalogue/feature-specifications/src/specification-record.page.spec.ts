import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideState, provideStore, Store } from '@ngrx/store';
import { aPublicSpecification } from '@seamwright/catalogue/data-access/testing';
import type { StaffSpecification } from '@seamwright/catalogue/contracts';
import { SessionApiActions, sessionFeature } from '@seamwright/identity/data-access/session';
import type { Role } from '@seamwright/shared/contracts';
import { Confirm, Toast } from '@seamwright/shared/ui';
import { SpecificationRecordPage } from './specification-record.page';

const record: StaffSpecification = {
  ...aPublicSpecification(),
  rowVersion: 3,
  state: 'approved',
  standing: 'current',
  uneceFields: {},
  unece: { reading: null, faults: [] },
  sourceNodeId: '00000000-0000-7000-8000-0000000000c1',
  authorId: '00000000-0000-7000-8000-0000000000b1',
  sourceName: 'Striploin',
  tareGrams: 18,
  yieldPpm: 780_000,
  choices: [],
  choiceRules: [],
  stations: [{ station: 'trimming', setUpSeconds: 240, secondsPerKg: 32, secondsPerPiece: 0 }],
  otherOutputs: [{ name: 'Fat', kind: 'by-product', yieldPpm: 90_000, valueMinorPerKg: 12 }],
  authorName: 'Ada Author',
  approverName: 'Ben Reviewer',
  approvedAt: '2026-11-01T09:00:00.000Z',
  versions: [{ version: 4, state: 'approved', standing: 'current', since: '2026-11-01T09:00:00.000Z', reason: null }],
};

describe('the record of a specification', () => {
  const open = async (sure: boolean, role: Role = 'technical') => {
    const ask = jest.fn().mockResolvedValue(sure);
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([]),
        provideStore(),
        provideState(sessionFeature),
        { provide: Confirm, useValue: { ask } },
        { provide: Toast, useValue: { show: jest.fn() } },
      ],
    });
    const person = { id: 'p', name: 'Tamsin', email: 't@x.example', customerId: null, customerName: null };
    TestBed.inject(Store).dispatch(SessionApiActions.restored({ person: { ...person, roles: [role], sites: '*' } }));
    const fixture = TestBed.createComponent(SpecificationRecordPage);
    fixture.componentRef.setInput('code', 'BF-901');
    await fixture.whenStable();
    const http = TestBed.inject(HttpTestingController);
    http.expectOne('/api/v1/specifications/BF-901/record').flush(record);
    await fixture.whenStable();
    const host = fixture.nativeElement as HTMLElement;
    const withdraw = async (reason: string) => {
      const field = host.querySelector('sw-withdraw-form input') as HTMLInputElement;
      field.value = reason;
      field.dispatchEvent(new Event('input'));
      host.querySelector('sw-withdraw-form form')?.dispatchEvent(new Event('submit', { cancelable: true }));
      await fixture.whenStable();
    };
    return { fixture, http, host, ask, withdraw };
  };

  it('can be withdrawn by the technical only', async () => {
    const { host } = await open(true, 'rep');
    expect(host.querySelector('sw-record-numbers')).not.toBeNull();
    expect(host.querySelector('sw-withdraw-form')).toBeNull();
  });

  it('closes the outputs of the primal with the loss', async () => {
    const { host } = await open(true);
    const rows = [...host.querySelectorAll('sw-record-outputs tr')].map((row) => row.textContent ?? '');
    // 100 − 78 − 9 = 13 %.
    expect(rows.find((row) => row.includes('Cutting loss'))).toContain('13\u00a0%');
    expect(host.textContent).toContain('These dimensions imply');
  });

  it('withdraws for a reason once the person is sure, guarded by the version that was read', async () => {
    const { fixture, http, host, withdraw } = await open(true);
    await withdraw('No longer cut');
    const request = http.expectOne('/api/v1/specifications/BF-901/withdrawal');
    expect(request.request.headers.get('if-match')).toBe('"3"');
    expect(request.request.body).toEqual({ reason: 'No longer cut' });
    request.flush({ ...record, standing: 'withdrawn', rowVersion: 4 });
    await fixture.whenStable();
    expect(host.querySelector('sw-stage-chip')?.textContent).toContain('Withdrawn');
    expect(host.querySelector('sw-withdraw-form')).toBeNull();
  });

  it('sends nothing without a reason, nor when the person thinks better of it', async () => {
    const { http, ask, withdraw } = await open(false);
    await withdraw('  ');
    expect(ask).not.toHaveBeenCalled();
    await withdraw('No longer cut');
    expect(ask).toHaveBeenCalledTimes(1);
    http.expectNone('/api/v1/specifications/BF-901/withdrawal');
  });
});
