import fc from 'fast-check';
import { DateTime } from 'luxon';
import { minorUnits, type PlantDate } from '@seamwright/shared/util';
import { checkDeliveryDay, cutOffOf, deliveryDays, lastOrderDay, type DayQuestion } from './delivery-calendar';
import type { DeliveryZone } from './delivery-zone';

const LONDON = 'Europe/London';
const day = (text: string): PlantDate => text as PlantDate;
const closed = (...days: string[]): ReadonlySet<PlantDate> => new Set(days.map(day));
const aZone = (stated: Partial<DeliveryZone> = {}): DeliveryZone => ({
  id: 'zone',
  name: 'Harbour',
  weekdays: [1, 2, 3, 4, 5],
  cutOffTime: '14:00',
  leadDays: 1,
  deliveryChargeMinor: minorUnits(650),
  ...stated,
});

/** The rule told again with an independent calendar library, by walking day after day. */
function oracleCutOff(zone: DeliveryZone, text: string, closures: ReadonlySet<string>, extra: number): Date {
  let at = DateTime.fromISO(text, { zone: 'utc' });
  for (let left = zone.leadDays + extra; left > 0;) {
    at = at.minus({ days: 1 });
    if (at.weekday <= 5 && !closures.has(at.toISODate() ?? '')) left -= 1;
  }
  return DateTime.fromISO(`${at.toISODate()}T${zone.cutOffTime}`, { zone: LONDON }).toJSDate();
}

const days = fc
  .integer({ min: 0, max: 1500 })
  .map((offset) => DateTime.fromISO('2025-01-01', { zone: 'utc' }).plus({ days: offset }).toISODate() ?? '');
const zones = fc
  .record({
    weekdays: fc.uniqueArray(fc.integer({ min: 1, max: 7 }), { minLength: 1 }),
    hour: fc.integer({ min: 0, max: 23 }),
    minute: fc.constantFrom('00', '30', '59'),
    leadDays: fc.integer({ min: 1, max: 5 }),
  })
  .map(({ weekdays, hour, minute, leadDays }) =>
    aZone({ weekdays, leadDays, cutOffTime: `${String(hour).padStart(2, '0')}:${minute}` }),
  );

describe('the cut-off of a delivery day', () => {
  it('is the time on the working day before: Friday for Monday, and before a closed day', () => {
    expect(cutOffOf(aZone(), day('2026-12-07'), closed(), LONDON)).toEqual(new Date('2026-12-04T14:00:00Z'));
    expect(cutOffOf(aZone(), day('2026-12-28'), closed('2026-12-25'), LONDON)).toEqual(
      new Date('2026-12-24T14:00:00Z'),
    );
  });

  it('keeps the plant’s clock on both nights when it changes', () => {
    // British summer time begins on Sunday 29 March 2026 at 01:00 and ends on Sunday 25 October 2026 at 02:00.
    const early = aZone({ cutOffTime: '00:30' });
    expect(cutOffOf(early, day('2026-03-30'), closed(), LONDON)).toEqual(new Date('2026-03-27T00:30:00Z'));
    expect(cutOffOf(early, day('2026-03-31'), closed(), LONDON)).toEqual(new Date('2026-03-29T23:30:00Z'));
    expect(cutOffOf(aZone(), day('2026-10-26'), closed(), LONDON)).toEqual(new Date('2026-10-23T13:00:00Z'));
    expect(cutOffOf(aZone(), day('2026-10-27'), closed(), LONDON)).toEqual(new Date('2026-10-26T14:00:00Z'));
  });

  it('agrees with luxon for any zone, day, closures and lead days', () => {
    fc.assert(
      fc.property(zones, days, fc.uniqueArray(days, { maxLength: 30 }), fc.integer({ min: 0, max: 4 }), (...given) => {
        const [zone, text, shut, extra] = given;
        const expected = oracleCutOff(zone, text, new Set(shut), extra);
        // A clock time that the change skips is taken differently; both say the same instant of the day otherwise.
        fc.pre(DateTime.fromJSDate(expected, { zone: LONDON }).toFormat('HH:mm') === zone.cutOffTime);
        expect(cutOffOf(zone, day(text), closed(...shut), LONDON, extra)).toEqual(expected);
      }),
    );
  });

  it('counts working days back over weekends', () => {
    expect(lastOrderDay(day('2026-12-07'), 3, closed())).toBe('2026-12-02');
    expect(lastOrderDay(day('2026-12-05'), 1, closed())).toBe('2026-12-04');
  });
});

describe('the next delivery days', () => {
  const at = (iso: string) => new Date(iso);

  it('offer tomorrow until the cut-off and the day after from then on', () => {
    const next = (iso: string) => deliveryDays(aZone(), closed(), at(iso), LONDON, 1)[0]?.day;
    expect(next('2026-12-01T13:59:59Z')).toBe('2026-12-02');
    expect(next('2026-12-01T14:00:00Z')).toBe('2026-12-03');
  });

  it('leave out weekdays without a van and closed days', () => {
    const zone = aZone({ weekdays: [2, 4, 6] });
    const found = deliveryDays(zone, closed('2026-12-24', '2026-12-26'), at('2026-12-21T09:00:00Z'), LONDON, 3);
    expect(found.map((each) => each.day)).toEqual(['2026-12-22', '2026-12-29', '2026-12-31']);
  });

  it('are none for a zone without a day, rather than a search without end', () => {
    expect(deliveryDays(aZone({ weekdays: [] }), closed(), at('2026-12-01T09:00:00Z'), LONDON, 5)).toEqual([]);
  });

  it('rise, lie ahead of their cut-off, and are those that an order is taken for', () => {
    const instants = fc.date({ min: at('2026-01-01T00:00:00Z'), max: at('2027-12-31T00:00:00Z'), noInvalidDate: true });
    fc.assert(
      fc.property(zones, instants, fc.uniqueArray(days, { maxLength: 10 }), (zone, now, shut) => {
        const closures = closed(...shut);
        const found = deliveryDays(zone, closures, now, LONDON, 5);
        expect(found.map((each) => each.day)).toEqual([...new Set(found.map((each) => each.day))].sort());
        for (const each of found) {
          expect(now < each.cutOffAt).toBe(true);
          const question = { zone, closures, day: each.day, now, timeZone: LONDON, extraLeadDays: 0 };
          expect(checkDeliveryDay({ ...question, by: 'buyer' })).toEqual({ ok: true, value: each });
        }
      }),
    );
  });
});

describe('placing for a day', () => {
  const check = (stated: Partial<DayQuestion>) => {
    const result = checkDeliveryDay({
      zone: aZone(),
      closures: closed('2026-12-25'),
      day: day('2026-12-03'),
      now: new Date('2026-12-01T12:00:00Z'),
      timeZone: LONDON,
      extraLeadDays: 0,
      by: 'buyer',
      ...stated,
    });
    return result.ok ? 'taken' : result.refusal.code;
  };

  it('is refused with the reason that a person can act on', () => {
    expect(check({})).toBe('taken');
    expect(check({ day: day('2026-11-30') })).toBe('day-past');
    expect(check({ day: day('2026-12-01') })).toBe('cut-off-passed');
    expect(check({ day: day('2027-08-02') })).toBe('day-too-far');
    expect(check({ day: day('2026-12-25') })).toBe('plant-closed');
    expect(check({ day: day('2026-12-05') })).toBe('no-delivery-that-day');
    expect(check({ extraLeadDays: 2 })).toBe('lead-days-short');
  });

  it('is open to the desk for the rest of the last day to order', () => {
    const afterCutOff = { day: day('2026-12-02'), now: new Date('2026-12-01T18:00:00Z') };
    expect(check(afterCutOff)).toBe('cut-off-passed');
    expect(check({ ...afterCutOff, by: 'desk' })).toBe('taken');
    expect(check({ ...afterCutOff, now: new Date('2026-12-02T00:01:00Z'), by: 'desk' })).toBe('cut-off-passed');
  });
});
