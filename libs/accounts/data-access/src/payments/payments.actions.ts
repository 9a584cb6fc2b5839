import { createActionGroup, emptyProps, props } from '@ngrx/store';
import type { PaymentWire } from '@seamwright/accounts/contracts';
import type { PaymentState } from '@seamwright/accounts/domain';
import type { Problem } from '@seamwright/shared/contracts';

/** Which card payments are shown; null for all. */
export interface PaymentSearch {
  readonly state: PaymentState | null;
  readonly customerId: string | null;
  readonly orderId: string | null;
}

export const PaymentsPageActions = createActionGroup({
  source: 'Payments Page',
  events: { Opened: props<{ search: PaymentSearch }>(), 'More Wanted': emptyProps() },
});

export const PaymentsApiActions = createActionGroup({
  source: 'Payments API',
  events: {
    Loaded: props<{ items: PaymentWire[]; nextCursor: string | null; first: boolean }>(),
    Failed: props<{ problem: Problem }>(),
  },
});

export const PaymentsLiveActions = createActionGroup({
  source: 'Payments Live',
  events: { Changed: emptyProps() },
});
