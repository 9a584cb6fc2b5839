import { stateTable } from '@seamwright/shared/util';

/** A quote's life. Accepted, declined and expired are ends. */
export const QUOTE_STATES = ['draft', 'sent', 'accepted', 'declined', 'expired'] as const;
export type QuoteState = (typeof QUOTE_STATES)[number];
export type QuoteMove = 'send' | 'accept' | 'decline' | 'expire';

export const quoteStates = stateTable<QuoteState, QuoteMove>({
  draft: { send: 'sent' },
  sent: { accept: 'accepted', decline: 'declined', expire: 'expired' },
  accepted: {},
  declined: {},
  expired: {},
});
