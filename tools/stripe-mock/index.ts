export { createStripeMock, type StripeMock, type StripeMockOptions } from './stripe-mock';
export type { FeeSchedule } from './fees';
export type { Delivery } from './webhooks';
