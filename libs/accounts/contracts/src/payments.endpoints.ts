import * as z from 'zod';
import { PAYMENT_STATES } from '@seamwright/accounts/domain';
import {
  currency,
  defineEndpoint,
  id,
  instant,
  line,
  minor,
  ownCustomer,
  pageOf,
  pageQuery,
} from '@seamwright/shared/contracts';

/** A card payment: what was held, taken and let go. */
export const paymentWire = z.strictObject({
  id,
  customer: z.strictObject({ id, name: line() }),
  order: z.strictObject({ id, number: z.int().positive() }),
  state: z.enum(PAYMENT_STATES),
  currency,
  holdMinor: minor,
  capturedMinor: minor,
  /** Held and let go again; null while that is not decided. */
  letGoMinor: minor.nullable(),
  holdEndsAt: instant.nullable(),
  declineCode: z.string().nullable(),
  /** Where the holder confirms with the bank; null when nothing waits for it. */
  actionUrl: z.string().nullable(),
  processorIntentId: z.string().nullable(),
  processorChargeId: z.string().nullable(),
  createdAt: instant,
  capturedAt: instant.nullable(),
});
export type PaymentWire = z.infer<typeof paymentWire>;

export const listPayments = defineEndpoint({
  id: 'payments.list',
  summary: 'Card payments, newest first',
  method: 'GET',
  path: '/payments',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'accounts', 'admin'),
  query: {
    ...pageQuery,
    state: z.enum(PAYMENT_STATES).optional(),
    customerId: id.optional(),
    orderId: id.optional(),
  },
  response: pageOf(paymentWire),
});
