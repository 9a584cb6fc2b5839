import type { MinorUnits } from '@seamwright/shared/util';
import type { PaymentState } from './payment.states';

/** One try to have an order paid by card. Amounts in minor units. */
export interface Payment {
  readonly id: string;
  readonly rowVersion: number;
  readonly customerId: string;
  readonly orderId: string;
  readonly processorMethodId: string;
  readonly currency: string;
  readonly holdMinor: MinorUnits;
  readonly capturedMinor: MinorUnits;
  /** What packing came to, at most the hold; null until then. */
  readonly toCaptureMinor: MinorUnits | null;
  readonly state: PaymentState;
  readonly processorIntentId: string | null;
  readonly processorChargeId: string | null;
  /** When the processor lets the hold go by itself. */
  readonly holdEndsAt: Date | null;
  /** Why it was declined, or why nothing could be taken. */
  readonly declineCode: string | null;
  readonly actionUrl: string | null;
  readonly capturedAt: Date | null;
  readonly createdAt: Date;
  readonly updatedAt: Date;
}

/** What a hold lets go: held, but not taken. Null while that is not decided. */
export function letGoMinor(payment: Pick<Payment, 'state' | 'holdMinor' | 'capturedMinor'>): number | null {
  if (payment.state === 'captured') return payment.holdMinor - payment.capturedMinor;
  return payment.state === 'released' ? payment.holdMinor : null;
}
