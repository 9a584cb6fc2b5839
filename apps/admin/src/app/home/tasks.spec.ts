import type { InvoiceListItem } from '@seamwright/accounts/contracts';
import type { SpecificationRow } from '@seamwright/catalogue/contracts';
import type { PersonView } from '@seamwright/identity/contracts';
import { aDay, aPackingLine, aPackingOrder } from '@seamwright/plant/data-access/testing';
import type { QuoteListItem } from '@seamwright/pricing/contracts';
import { aLotWire } from '@seamwright/stock/data-access/testing';
import { minorUnits, type PlantDate } from '@seamwright/shared/util';
import { accountsTasks, overdueTasks } from './accounts.tasks';
import { cuttingDayTasks, lastCutOff, type Vans } from './cutting-days.tasks';
import { expiringTasks, undecidedTasks } from './lots.tasks';
import { packingTasks } from './orders.tasks';
import { closureTasks, invitedTasks } from './people.tasks';
import { quoteTasks } from './quotes.tasks';
import { reviewTasks } from './versions.tasks';

const TODAY = '2026-12-01' as PlantDate;
const zone = (cutOffTime: string, ...weekdays: number[]): Vans['zones'][number] => ({
  id: cutOffTime,
  name: cutOffTime,
  weekdays,
  cutOffTime,
  leadDays: 1,
  deliveryChargeMinor: minorUnits(0),
});
// Friday 4 December 2026 has two vans, Thursday 3 the early one only.
const vans: Vans = {
  zones: [zone('15:00', 4, 5), zone('16:00', 5)],
  closures: new Set(),
  timeZone: 'Europe/London',
};
const marks = (tasks: readonly { mark?: { word: string } }[]) => tasks.map(({ mark }) => mark?.word);

describe('the next cutting days', () => {
  const at = (time: string) => new Date(`2026-12-03T${time}Z`);
  const of = (...days: Parameters<typeof aDay>) => cuttingDayTasks([aDay(...days)], vans, at('13:40:00'), 'en-GB');

  it('are open until the last van’s cut-off', () => {
    expect(lastCutOff('2026-12-04', vans)).toEqual(at('16:00:00'));
    expect(lastCutOff('2026-12-05', vans)).toBeNull();
    expect(marks(of({}))).toEqual(['2 h 20 min to cut-off']);
    expect(marks(cuttingDayTasks([aDay()], vans, at('16:00:00'), 'en-GB'))).toEqual(['Cut-off passed: close it']);
  });

  it('say what each waits for', () => {
    expect(marks(of({ state: 'closed' }))).toEqual(['Not yet on the floor']);
    expect(marks(of({ state: 'released', orders: 3, packedOrders: 1 }))).toEqual(['1 of 3 packed']);
    expect(marks(of({ state: 'released', orders: 3, packedOrders: 3 }))).toEqual(['All packed: finish it']);
    expect(of({ state: 'finished' })).toEqual([]);
  });

  it('come the next one first, with their orders and those that wait', () => {
    const later = aDay({
      id: 'later',
      deliveryDay: '2026-12-05',
      cuttingDay: '2026-12-04',
      orders: 1,
      waitingOrders: 1,
    });
    const tasks = cuttingDayTasks([later, aDay()], vans, at('09:00:00'), 'en-GB');
    expect(tasks.map(({ figure, unit, text }) => [figure, unit, text])).toEqual([
      ['2', 'orders', 'Cut Thu 3 Dec, deliver Fri 4 Dec'],
      ['1', 'order', 'Cut Fri 4 Dec, deliver Sat 5 Dec'],
    ]);
    expect(tasks[1]?.note).toContain('orders that still wait: 1');
    expect(tasks[0]?.link).toEqual(['/cutting-days', '2026-12-04']);
  });
});

describe('orders on the floor', () => {
  it('tell the pieces that are left, without what is packed or short', () => {
    const lines = [aPackingLine({ pieces: 6, packedPieces: 2, shortPieces: 1 }), aPackingLine({ pieces: 4 })];
    const [task] = packingTasks([aPackingOrder({ packedAt: '2026-12-03T10:00:00Z' }), aPackingOrder({ lines })]);
    expect(task).toMatchObject({ figure: '7', unit: 'pieces', text: 'The Heron' });
    expect(task?.link).toEqual(['/scale', '2026-12-04', aPackingOrder().id]);
  });

  it('are ready to finish when nothing is left', () => {
    expect(marks(packingTasks([aPackingOrder({ lines: [aPackingLine({ packedPieces: 6 })] })]))).toEqual([
      'Ready to finish',
    ]);
  });
});

describe('lots', () => {
  const lot = (useBy: string | null, remainingGrams = 4_605) =>
    aLotWire({ nodeId: 'leg', nodeName: 'Leg', useBy, remainingGrams });
  const primals = [{ id: 'leg', species: 'pork' as const }];

  it('are called out from two days before their use-by, while something is left', () => {
    const lots = [lot('2026-11-30'), lot('2026-12-01'), lot('2026-12-02'), lot('2026-12-03'), lot('2026-12-04')];
    expect(marks(expiringTasks(lots, primals, TODAY, 'en-GB'))).toEqual([
      'Use today',
      'Use by tomorrow',
      'Use by Thu 3 Dec',
      'Use-by passed',
    ]);
    expect(expiringTasks([lot(null), lot('2026-12-01', 0)], primals, TODAY, 'en-GB')).toEqual([]);
  });

  it('are told with their species and what is left', () => {
    const [task] = expiringTasks([lot('2026-12-01')], primals, TODAY, 'en-GB');
    expect(task).toMatchObject({ figure: '4.605', unit: 'kg', text: 'Pork leg' });
  });

  it('wait for a decision with the reason why', () => {
    const lots = [aLotWire({ state: 'on-hold', holdReason: 'Warm on arrival' }), aLotWire({ state: 'received' })];
    const tasks = undecidedTasks(lots, [], 'en-GB');
    expect(marks(tasks)).toEqual(['On hold', 'To release']);
    expect(tasks[0]?.note).toContain('Warm on arrival');
  });
});

describe('quotes that wait', () => {
  const quote = (number: number, answerBy: string): QuoteListItem => ({
    id: String(number),
    rowVersion: 1,
    number,
    customerId: 'c',
    customerName: 'The Heron',
    state: 'sent',
    currency: 'GBP',
    pricesFrom: '2026-12-01',
    pricesUntil: '2027-01-31',
    answerBy,
    createdAt: '2026-11-20T09:00:00Z',
    sentAt: '2026-11-20T09:00:00Z',
    decidedAt: null,
    lineCount: 2,
  });

  it('come those first whose time ends first', () => {
    const tasks = quoteTasks([quote(3, '2026-12-09'), quote(2, '2026-12-01'), quote(4, '2026-11-30')], TODAY, 'en-GB');
    expect(tasks.map(({ figure, mark }) => [figure, mark?.tone, mark?.word])).toEqual([
      ['4', 'bad', 'Time is over'],
      ['2', 'eye', 'Ends today'],
      ['3', 'plain', 'Ends Wed 9 Dec'],
    ]);
    expect(tasks[0]?.note).toBe('2 prices from Tue 1 Dec');
  });
});

describe('what administrators and the technical look after', () => {
  it('names who was invited and has not joined', () => {
    const person: PersonView = {
      id: 'p',
      rowVersion: 1,
      email: 'ivo@withenbeck.example',
      name: 'Ivo',
      roles: ['floor'],
      customerId: null,
      customerName: null,
      sites: '*',
      customers: '*',
      state: 'invited',
      lastSeenAt: null,
    };
    const buyer = { ...person, id: 'b', customerId: 'c', customerName: 'The Heron' };
    const tasks = invitedTasks([person, { ...person, id: 'a', state: 'active' }, buyer]);
    expect(tasks.map(({ note, link }) => [note, link])).toEqual([
      ['Floor · ivo@withenbeck.example', ['/people']],
      ['The Heron · ivo@withenbeck.example', ['/customers', 'c']],
    ]);
  });

  it('names closures from today on, the next one first', () => {
    const days = ['2026-12-28', '2026-11-30', '2026-12-25'].map((day) => ({ day, reason: day }));
    expect(closureTasks(days, TODAY, 'en-GB').map(({ figure }) => figure)).toEqual(['Fri 25 Dec', 'Mon 28 Dec']);
  });

  it('names versions in review only', () => {
    const row: SpecificationRow = {
      specificationId: 's',
      code: 'BF-901',
      name: 'Striploin steak',
      species: 'beef',
      primalName: 'Striploin',
      version: 2,
      state: 'in-review',
      standing: null,
      since: null,
    };
    const tasks = reviewTasks([row, { ...row, state: 'approved', standing: 'current' }]);
    expect(tasks.map(({ figure, link }) => [figure, link])).toEqual([['BF-901', ['/specifications', 'BF-901']]]);
    expect(marks(tasks)).toEqual(['Version 2']);
  });
});

describe('money today', () => {
  const work = (openExceptions: number, overdue: number, more = false) =>
    accountsTasks({
      openExceptions,
      overdueInvoices: { count: overdue, more },
      holdsEndingSoon: { count: 0, more: false },
    });

  it('is three counts, each leading to what it counts', () => {
    const tasks = work(2, 9);
    expect(tasks.map(({ figure }) => figure)).toEqual(['2', '9', '0']);
    expect(tasks.map(({ link, query }) => [link[0], query])).toEqual([
      ['/reconciliation', undefined],
      ['/invoices', { standing: 'overdue' }],
      ['/payments', { state: 'pre-authorised' }],
    ]);
    expect(marks(tasks)).toEqual(['Look into it', 'Remind', 'None']);
  });

  it('says when all is well, and when there are more than were counted', () => {
    expect(marks(work(0, 0))).toEqual(['Every penny is explained', 'None', 'None']);
    expect(work(0, 200, true)[1]?.figure).toBe('200+');
  });
});

it('overdue invoices come the longest overdue first, with what is left to pay', () => {
  const invoice = (number: number, dueOn: string, paidMinor = 0): InvoiceListItem => ({
    id: String(number),
    number,
    order: { id: 'o', number: 1_042 },
    customer: { id: 'c', name: 'Test pub' },
    deliveryDay: '2026-11-20',
    issuedOn: '2026-11-20',
    dueOn,
    currency: 'GBP',
    netMinor: 23_780,
    taxMinor: 0,
    totalMinor: 23_780,
    paidMinor,
    standing: 'overdue',
  });
  const tasks = overdueTasks([invoice(2_042, '2026-11-30'), invoice(2_013, '2026-11-22', 3_780)], TODAY, 'en-GB');
  expect(tasks.map(({ figure, note }) => [figure, note])).toEqual([
    ['£200.00', 'Invoice 2013 · due Sun 22 Nov'],
    ['£237.80', 'Invoice 2042 · due Mon 30 Nov'],
  ]);
  expect(marks(tasks)).toEqual(['9 days over', '1 day over']);
});
