import {
  addDays,
  daysBetween,
  instantAt,
  ok,
  plantToday,
  refuse,
  weekdayOf,
  type PlantDate,
  type Result,
} from '@seamwright/shared/util';
import type { Closures, DeliveryZone } from './delivery-zone';

/** How far ahead an order may lie, in days. */
export const FARTHEST_DAYS = 180;
const SATURDAY = 6;

/** A day on which the zone is delivered to, with the last instant to order for it. */
export interface DeliveryDay {
  readonly day: PlantDate;
  readonly cutOffAt: Date;
}

/** Monday to Friday, unless the plant is closed. */
export function isWorkingDay(day: PlantDate, closures: Closures): boolean {
  return weekdayOf(day) < SATURDAY && !closures.has(day);
}

/** Whether the vans go to the zone on that day. */
export function isDeliveryDay(zone: DeliveryZone, day: PlantDate, closures: Closures): boolean {
  return zone.weekdays.includes(weekdayOf(day)) && !closures.has(day);
}

/** The last day to order for a delivery day: so many working days before it. */
export function lastOrderDay(day: PlantDate, leadDays: number, closures: Closures): PlantDate {
  let at = day;
  for (let left = leadDays; left > 0;) {
    at = addDays(at, -1);
    if (isWorkingDay(at, closures)) left -= 1;
    // A plant that is closed for months on end has no earlier working day worth naming.
    if (daysBetween(at, day) > 366) return at;
  }
  return at;
}

/**
 * The instant after which a delivery day is no longer taken: the zone's cut-off time, on the plant's clock, on the last
 * day to order. `extraLeadDays` are working days that the chosen goods need on top.
 */
export function cutOffOf(
  zone: DeliveryZone,
  day: PlantDate,
  closures: Closures,
  timeZone: string,
  extraLeadDays = 0,
): Date {
  return instantAt(lastOrderDay(day, zone.leadDays + extraLeadDays, closures), zone.cutOffTime, timeZone);
}

/** The next delivery days that can still be ordered for, soonest first; fewer than `count` when none lie near enough. */
export function deliveryDays(
  zone: DeliveryZone,
  closures: Closures,
  now: Date,
  timeZone: string,
  count: number,
  extraLeadDays = 0,
): DeliveryDay[] {
  const today = plantToday(now, timeZone);
  const found: DeliveryDay[] = [];
  for (let ahead = 1; ahead <= FARTHEST_DAYS && found.length < count; ahead++) {
    const day = addDays(today, ahead);
    if (!isDeliveryDay(zone, day, closures)) continue;
    const cutOffAt = cutOffOf(zone, day, closures, timeZone, extraLeadDays);
    if (now < cutOffAt) found.push({ day, cutOffAt });
  }
  return found;
}

export interface DayQuestion {
  readonly zone: DeliveryZone;
  readonly closures: Closures;
  readonly day: PlantDate;
  readonly now: Date;
  readonly timeZone: string;
  /** Working days that the slowest chosen line needs beyond the zone's own. */
  readonly extraLeadDays: number;
  /** The desk is not held to the hour of the cut-off, only to its day: the planner's closing ends it for both. */
  readonly by: 'buyer' | 'desk';
}

/**
 * Whether an order can be placed for a day. Refuses with `day-past`, `day-too-far` (most), `plant-closed`,
 * `no-delivery-that-day` (zone), `cut-off-passed` or `lead-days-short` (days), pointing at `/deliveryDay`.
 */
export function checkDeliveryDay(question: DayQuestion): Result<DeliveryDay> {
  const { zone, closures, day, now, timeZone, extraLeadDays } = question;
  const no = (code: string, params: Record<string, string | number> = {}) =>
    refuse(code, { day, ...params }, '/deliveryDay');
  const ahead = daysBetween(plantToday(now, timeZone), day);
  if (ahead < 0) return no('day-past');
  if (ahead > FARTHEST_DAYS) return no('day-too-far', { most: FARTHEST_DAYS });
  if (closures.has(day)) return no('plant-closed');
  if (!isDeliveryDay(zone, day, closures)) return no('no-delivery-that-day', { zone: zone.name });
  if (!inTime(question, 0)) return no('cut-off-passed');
  if (extraLeadDays > 0 && !inTime(question, extraLeadDays)) return no('lead-days-short', { days: extraLeadDays });
  return ok({ day, cutOffAt: cutOffOf(zone, day, closures, timeZone) });
}

function inTime({ zone, closures, day, now, timeZone, by }: DayQuestion, extraLeadDays: number): boolean {
  if (by === 'buyer') return now < cutOffOf(zone, day, closures, timeZone, extraLeadDays);
  return plantToday(now, timeZone) <= lastOrderDay(day, zone.leadDays + extraLeadDays, closures);
}
