import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { LOCALE_ID } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { EMPTY } from 'rxjs';
import { SessionApiActions, sessionFeature } from '@seamwright/identity/data-access/session';
import { cuttingDaysEffects, cuttingDaysFeature } from '@seamwright/plant/data-access';
import { aDay, somePapers } from '@seamwright/plant/data-access/testing';
import type { Role } from '@seamwright/shared/contracts';
import { LiveEvents } from '@seamwright/shared/data-access';
import { Confirm, Toast, type ConfirmQuestion } from '@seamwright/shared/ui';
import { CuttingDayPage } from './cutting-day.page';
import { CuttingDaysPage } from './cutting-days.page';

const DAY = '2026-12-04';
const base = '/api/v1/cutting-days';
let http: HttpTestingController;
let fixture: ComponentFixture<unknown>;
let asked: ConfirmQuestion[];
let told: string[];
let answer: boolean;

beforeEach(() => {
  [asked, told, answer] = [[], [], true];
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      { provide: LOCALE_ID, useValue: 'en-GB' },
      { provide: LiveEvents, useValue: { changes: () => EMPTY } },
      { provide: Confirm, useValue: { ask: async (question: ConfirmQuestion) => (asked.push(question), answer) } },
      { provide: Toast, useValue: { show: async ({ text }: { text: string }) => (told.push(text), false) } },
      provideStore(),
      provideState(cuttingDaysFeature),
      provideState(sessionFeature),
      provideEffects(cuttingDaysEffects),
    ],
  });
  http = TestBed.inject(HttpTestingController);
  signIn('planner');
});
afterEach(() => http.verify());

function signIn(role: Role): void {
  const person = { id: 'p', name: 'Petra', email: 'p@x.example', roles: [role], customerId: null, customerName: null };
  TestBed.inject(Store).dispatch(SessionApiActions.restored({ person: { ...person, sites: '*' } }));
}

const host = (): HTMLElement => fixture.nativeElement as HTMLElement;
const text = (): string => (host().textContent ?? '').replace(/\s+/g, ' ');
const press = async (words: string) => {
  const found = [...host().querySelectorAll('button')].find((each) => each.textContent?.trim() === words);
  if (!found) throw new Error(`There is no button "${words}"`);
  found.click();
  await fixture.whenStable();
};
const answerPapers = async (papers = somePapers()) => {
  http.expectOne(`${base}/${DAY}`).flush(papers.day);
  http.expectOne(`${base}/${DAY}/cutting-list`).flush(papers.cutting);
  http.expectOne(`${base}/${DAY}/pull-list`).flush(papers.pull);
  await fixture.whenStable();
};
async function open(day: Parameters<typeof somePapers>[0] = {}): Promise<void> {
  fixture = TestBed.createComponent(CuttingDayPage);
  fixture.componentRef.setInput('deliveryDay', DAY);
  await fixture.whenStable();
  await answerPapers(somePapers(day));
}

describe('a cutting day', () => {
  it('shows where it stands, on the clock of the plant', async () => {
    await open({ state: 'released', closedAt: '2026-07-01T15:00:00Z', releasedAt: '2026-07-01T15:05:00Z' });
    expect(host().querySelector('h1')?.textContent).toContain('Thursday 3 December 2026');
    expect(text()).toContain('For delivery on Friday 4 December 2026 · 2 orders, 3 lines');
    const knots = [...host().querySelectorAll('sw-seam-line li')];
    expect(knots.map((knot) => knot.className)).toEqual(['passed', 'passed', 'passed', 'now', 'ahead', 'ahead']);
    expect(knots[1]?.textContent).toContain('16:00');
  });

  it('shows the list by species and primal with its sums, the work, and the cautions', async () => {
    await open();
    const row = host().querySelector('sw-cutting-table .cut');
    expect(row?.textContent?.replace(/\s+/g, ' ')).toContain('Striploin steak');
    expect([...(row?.querySelectorAll('td.number') ?? [])].map((cell) => cell.textContent?.trim())).toEqual([
      '29',
      '2 cases + 5',
      '8.120',
      '10.358',
      '18',
    ]);
    expect(host().querySelector('sw-station-bars')?.textContent?.replace(/\s+/g, ' ')).toContain('Portions18');
    expect(text()).toContain('Knives:');
    expect(text()).toContain('trained and licensed people decide');
  });

  it('names what is short, and says why so much is needed', async () => {
    await open();
    await press('Pull list');
    const shown = [...host().querySelectorAll('section')].find((section) => !section.classList.contains('off'));
    expect(shown?.textContent?.replace(/\s+/g, ' ')).toContain('Short: 4.358 kg of Beef striploin');
    expect(shown?.textContent?.replace(/\s+/g, ' ')).toContain('B-1 · 1 piece · 6.000 kg · use by Sat 5 Dec');
    expect(shown?.querySelector('sw-why')?.textContent).toContain('why?');
  });

  it('shows what each customer gets', async () => {
    await open();
    await press('By customer');
    const shown = [...host().querySelectorAll('section')].find((section) => !section.classList.contains('off'));
    expect(shown?.textContent).toContain('The Heron');
    expect(shown?.textContent).toContain('1001');
  });

  it('is closed after asking, with the version that was seen', async () => {
    await open({ rowVersion: 7, waitingOrders: 1 });
    expect(text()).toContain('One order still waits');
    await press('Close to orders');
    expect(asked[0]?.text).toContain('1 confirmed orders are released; 1 still wait');
    const call = http.expectOne(`${base}/${DAY}/close`);
    expect(call.request.headers.get('if-match')).toBe('"7"');
    call.flush(aDay({ state: 'closed', rowVersion: 8 }));
    await answerPapers(somePapers({ state: 'closed', rowVersion: 8 }));
    expect(told).toEqual(['The day is closed to orders.']);
    await press('Send to the floor');
    http.expectOne(`${base}/${DAY}/release`).flush(aDay({ state: 'released', rowVersion: 9 }));
    await answerPapers(somePapers({ state: 'released', rowVersion: 9 }));
    expect(text()).toContain('Finish the day');
  });

  it('stays as it is when the planner thinks again', async () => {
    answer = false;
    await open();
    await press('Close to orders');
    expect(asked).toHaveLength(1);
  });

  it('is moved by planners and administrators only', async () => {
    signIn('floor');
    await open();
    expect(text()).toContain('Cutting list as workbook');
    expect(text()).not.toContain('Close to orders');
  });

  it('offers nothing more when it is over', async () => {
    await open({ state: 'locked' });
    expect(text()).not.toContain('Finish the day');
  });

  it('says what went wrong, and offers the newer state after a stale move', async () => {
    await open();
    await press('Close to orders');
    const problem = {
      type: '',
      title: 'Stale',
      status: 412,
      detail: 'Somebody changed this',
      instance: '',
      code: 'stale',
    };
    http.expectOne(`${base}/${DAY}/close`).flush(problem, { status: 412, statusText: 'x' });
    await fixture.whenStable();
    expect(host().querySelector('sw-error')?.textContent).toContain('Somebody changed this');
    host().querySelector<HTMLButtonElement>('sw-error button')?.click();
    await fixture.whenStable();
    await answerPapers();
  });

  it('says what would be here on an empty day', async () => {
    fixture = TestBed.createComponent(CuttingDayPage);
    fixture.componentRef.setInput('deliveryDay', DAY);
    await fixture.whenStable();
    expect(host().querySelector('sw-loading')).not.toBeNull();
    const papers = somePapers();
    await answerPapers({ ...papers, cutting: { ...papers.cutting, primals: [], customers: [], cautions: [] } });
    expect(text()).toContain('Nothing to cut');
  });
});

describe('the list of cutting days', () => {
  it('leads to each day and tells its state in words', async () => {
    fixture = TestBed.createComponent(CuttingDaysPage);
    await fixture.whenStable();
    http.expectOne(base).flush({ items: [aDay({ state: 'released' })], nextCursor: null });
    await fixture.whenStable();
    expect(host().querySelector('tbody a')?.getAttribute('href')).toBe(`/${DAY}`);
    expect(text()).toContain('On the floor');
  });

  it('can be tried again when it fails', async () => {
    fixture = TestBed.createComponent(CuttingDaysPage);
    await fixture.whenStable();
    http.expectOne(base).flush({}, { status: 500, statusText: 'x' });
    await fixture.whenStable();
    host().querySelector<HTMLButtonElement>('sw-error button')?.click();
    await fixture.whenStable();
    http.expectOne(base).flush({ items: [], nextCursor: null });
    await fixture.whenStable();
    expect(text()).toContain('No cutting days yet');
  });
});
