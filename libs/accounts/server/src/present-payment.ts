import type { PaymentWire } from '@seamwright/accounts/contracts';
import { letGoMinor } from '@seamwright/accounts/domain';
import type { NamedPayment } from './payments.repository';

export const presentPayment = (payment: NamedPayment): PaymentWire => ({
  id: payment.id,
  customer: { id: payment.customerId, name: payment.customerName },
  order: { id: payment.orderId, number: payment.orderNumber },
  state: payment.state,
  currency: payment.currency,
  holdMinor: payment.holdMinor,
  capturedMinor: payment.capturedMinor,
  letGoMinor: letGoMinor(payment),
  holdEndsAt: payment.holdEndsAt?.toISOString() ?? null,
  declineCode: payment.declineCode,
  actionUrl: payment.state === 'needs-action' ? payment.actionUrl : null,
  processorIntentId: payment.processorIntentId,
  processorChargeId: payment.processorChargeId,
  createdAt: payment.createdAt.toISOString(),
  capturedAt: payment.capturedAt?.toISOString() ?? null,
});
