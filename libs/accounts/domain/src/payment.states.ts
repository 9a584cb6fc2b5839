import { stateTable } from '@seamwright/shared/util';

export const PAYMENT_STATES = [
  'started',
  'needs-action',
  'pre-authorised',
  'declined',
  'capturing',
  'captured',
  'releasing',
  'released',
  'failed',
] as const;
export type PaymentState = (typeof PAYMENT_STATES)[number];

export type PaymentMove = 'ask-holder' | 'authorise' | 'decline' | 'capture' | 'take' | 'release' | 'let-go' | 'fail';

/**
 * How a card payment moves. `capture` and `release` write down what the processor will be asked; `take` and `let-go`
 * are its answers. `let-go` also comes by itself, when a hold runs out. A hold that is gone when it is to be captured
 * fails.
 */
export const paymentStates = stateTable<PaymentState, PaymentMove>({
  started: {
    'ask-holder': 'needs-action',
    authorise: 'pre-authorised',
    decline: 'declined',
    take: 'captured',
    'let-go': 'released',
    fail: 'failed',
  },
  'needs-action': {
    authorise: 'pre-authorised',
    decline: 'declined',
    take: 'captured',
    release: 'releasing',
    'let-go': 'released',
  },
  'pre-authorised': { capture: 'capturing', take: 'captured', release: 'releasing', 'let-go': 'released' },
  declined: {},
  capturing: { take: 'captured', fail: 'failed' },
  captured: {},
  releasing: { 'let-go': 'released', take: 'captured', decline: 'declined' },
  released: {},
  failed: {},
});
