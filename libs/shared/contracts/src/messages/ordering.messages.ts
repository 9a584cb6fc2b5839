import { formatKgWithUnit, formatMoney, grams, minorUnits } from '@seamwright/shared/util';
import { day } from './day-text';
import type { MessageTable } from './message-table';

const money = (minor: string | number | undefined): string => formatMoney(minorUnits(Number(minor ?? 0)), 'GBP');

/** Refusals of ordering, put into words. */
export const orderingMessages = {
  'customer-missing': () => $localize`Say which customer this is for.`,
  'customer-not-active': (p) => $localize`${p['customer']}:customer: is not an active customer. Ask the administrator.`,
  'site-not-active': (p) => $localize`${p['site']}:site: is not delivered to any more. Choose another site.`,
  'site-without-zone': (p) =>
    $localize`${p['site']}:site: is not in a delivery zone yet. Ask the desk to put it into one.`,
  'zone-unknown': () => $localize`There is no such delivery zone.`,
  'day-past': (p) => $localize`${day(p['day'])}:day: is past. Choose a later day.`,
  'day-too-far': (p) =>
    $localize`${day(p['day'])}:day: is more than ${p['most']}:days: days ahead. Choose a nearer day.`,
  'plant-closed': (p) => $localize`The plant is closed on ${day(p['day'])}:day:. Choose another day.`,
  'no-delivery-that-day': (p) =>
    $localize`There is no delivery in ${p['zone']}:zone: on ${day(p['day'])}:day:. Choose one of the days offered.`,
  'cut-off-passed': (p) => $localize`The cut-off for ${day(p['day'])}:day: has passed. Choose a later day.`,
  'lead-days-short': (p) =>
    $localize`What is chosen needs ${p['days']}:days: more working days than are left before ${day(p['day'])}:day:. Choose a later day, or choose differently.`,
  'day-closed': (p) => $localize`The list for ${day(p['day'])}:day: is closed. Choose a later day.`,
  'line-too-heavy': (p) =>
    $localize`That comes to ${formatKgWithUnit(grams(Number(p['grams'])))}:weight:; one line can be at most ${formatKgWithUnit(grams(Number(p['most'])))}:most:. Check the quantity, or ring the desk.`,
  'quantity-not-whole': () => $localize`Order whole pieces, cases or grams.`,
  'quantity-not-positive': () => $localize`The quantity must be above zero.`,
  'quantity-too-large': (p) => $localize`The quantity can be at most ${p['most']}:most:.`,
  'card-missing': () => $localize`Choose the card to pay with.`,
  'card-not-wanted': () => $localize`An order on account takes no card.`,
  'order-waits-for-no-card': (p) => $localize`This order waits for no card: it is ${p['stage']}:stage:.`,
  'card-still-asked': () =>
    $localize`The bank has not settled the last card yet. Wait a moment, then try another one if it is declined.`,
  'too-late-to-confirm': (p) =>
    $localize`The list for ${day(p['day'])}:day: is closed, so order ${p['number']}:number: can't be confirmed any more. Ring the desk.`,
  'price-moved': (p) =>
    $localize`Prices have changed: this can now come to ${money(p['now'])}:now:, you were shown at most ${money(p['shown'])}:shown:. Look at the new prices and place it again. Nothing was ordered.`,
  'order-settled': (p) => $localize`This order can't be changed any more: it is ${p['stage']}:stage:.`,
  'cut-off-passed-for-change': () =>
    $localize`The cut-off for this order has passed. Ring the desk if something must change.`,
  'reason-missing': () => $localize`Say why.`,
  'order-not-released': (p) => $localize`Order ${p['number']}:number: has not been released to the floor.`,
  'order-packed-already': (p) => $localize`Packing of order ${p['number']}:number: is finished already.`,
  'short-too-many': (p) => $localize`At most ${p['most']}:most: pieces are not packed yet.`,
  'line-not-finished': (p) =>
    $localize`${p['code']}:code: ${p['name']}:name: is not finished: pack its pieces, or mark what is short.`,
  'closure-has-orders': (p) =>
    $localize`${p['count']}:count: orders stand for ${day(p['day'])}:day:. Move or cancel them before closing the plant.`,

  'note-too-long': (p) => $localize`The note is too long: at most ${p['most']}:most: letters.`,
  'customer-unknown': (p) => $localize`There is no customer named “${p['name']}:name:”.`,
  'customer-ambiguous': (p) => $localize`More than one customer is named “${p['name']}:name:”.`,
  'site-unknown': (p) => $localize`This customer has no site named “${p['name']}:name:”.`,
  'site-needed': () => $localize`This customer has several sites: say which.`,
  'another-site-that-day': (p) =>
    $localize`A customer has one order a day: row ${p['row']}:row: names another site for the same day.`,
  'too-many-lines': (p) => $localize`One order can have at most ${p['most']}:most: lines.`,
  'choices-unreadable': (p) => $localize`“${p['part']}:part:” can't be read as a choice. Write: trim=6; portion=280`,
  'unit-unknown': (p) => $localize`“${p['text']}:text:” is not a unit. Use piece, case or kg.`,
  'quantity-unreadable': (p) => $localize`“${p['text']}:text:” is not a quantity.`,
  'when-short-unknown': (p) =>
    $localize`“${p['text']}:text:” is not known. Use leave-off, send-what-there-is or ask-me.`,
} satisfies MessageTable;
