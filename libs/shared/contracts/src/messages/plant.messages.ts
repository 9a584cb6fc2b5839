import { day } from './day-text';
import type { MessageTable } from './message-table';

/** Refusals of plant, put into words. */
export const plantMessages = {
  'day-not-packed': (p) =>
    $localize`The day can't be finished yet: ${p['orders']}:orders: released orders are not packed. Finish them at the scale first.`,
  'day-not-on-floor': (p) =>
    $localize`Nothing can be packed now: the day is ${p['state']}:state:, not on the floor. Ask the planner.`,
  'pack-over-line': (p) =>
    $localize`Line ${p['line']}:line: only waits for ${p['open']}:open: more pieces, not ${p['pieces']}:pieces:.`,
  'lot-of-another-primal': (p) =>
    $localize`Lot ${p['lot']}:lot: is not ${p['primal']}:primal:, from which this is cut. Take a lot of it.`,
  'day-being-cut': (p) =>
    $localize`The orders for ${day(p['delivery'])}:delivery: are closed and are cut on ${day(p['day'])}:day:. Finish that cutting day first, or close the plant on another day.`,
  'no-day-to-cut': (p) =>
    $localize`Orders stand for ${day(p['delivery'])}:delivery:, and no day is left to cut them when the plant is closed on ${day(p['day'])}:day:. Move or cancel them first.`,
} satisfies MessageTable;
