import type { Implementation, Subscriber } from '@seamwright/shared/server';
import { calendarImplementations } from './calendar.router';
import { confirmByMail } from './confirm-by-mail';
import { orderImportsImplementations } from './order-imports.router';
import { ordersImplementations } from './orders.router';
import type { CardPort, OrderingParts } from './ports';

export type { CardPort, CardState, DayPort, OrderingParts } from './ports';
export { countOpenOrderLines } from './count-open-lines';
export { clearWaiting, markPacked, markShort, releaseOrdersOfDay, type ShortDeed } from './move-orders';
export { closuresFor } from './calendar.repository';
export { countUnpackedOfDay, lockOrder, orderById, ordersByIds, ordersOfDay } from './orders.repository';
export { placeOrder, type OrderWanted } from './place-order';

export const orderingImplementations = (parts: OrderingParts): Implementation[] => [
  ...calendarImplementations(parts),
  ...ordersImplementations(parts),
  ...orderImportsImplementations(parts),
];

export const orderingSubscribers = ({ cards }: { readonly cards: CardPort }): Subscriber[] => [confirmByMail(cards)];
