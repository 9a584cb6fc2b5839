import { day } from './day-text';
import type { MessageTable } from './message-table';

/** Refusals of stock, put into words. */
export const stockMessages = {
  'lot-not-released': (p) =>
    $localize`Lot ${p['lot']}:lot: is not released (it is ${p['state']}:state:). Take another lot, or have it released first.`,
  'lot-not-received-yet': (p) =>
    $localize`Lot ${p['lot']}:lot: only arrives on ${day(p['day'])}:day:. Take a lot that is in the chiller.`,
  'lot-past-use-by': (p) =>
    $localize`Lot ${p['lot']}:lot: must be used by ${p['useBy']}:useBy:, before this delivery. Take a fresher lot.`,
  'lot-killed-after-arrival': () => $localize`The kill date can't be after the day of arrival.`,
  'lot-arrives-later': () => $localize`A lot can only be booked in once it is here: the day lies ahead.`,
  'lot-expired-on-arrival': () => $localize`The use-by lies before the day of arrival. Check the supplier's papers.`,
  'lot-primal-unknown': () => $localize`Choose what came in from the list of primals.`,
  'lot-code-taken': () => $localize`There is a lot with this code already. Use another code.`,
  'net-not-positive': (p) =>
    $localize`Nothing is left after the tare: ${p['gross']}:gross: g on the scale, ${p['tare']}:tare: g tare. Weigh again.`,
  'pack-out-of-limits': (p) =>
    $localize`${p['net']}:net: g is outside ${p['min']}:min: to ${p['max']}:max: g. Say why, or weigh again.`,
} satisfies MessageTable;
